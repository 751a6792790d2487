import { useEffect, useRef, useState } from 'react';
import { useMutation } from '@tanstack/react-query';
import { useFormContext, type FieldValues } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { Problem } from '../api/call';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { ProblemNote } from './problem-note';

export interface NamedField<V> {
  name: keyof V & string;
  label: string;
  /** How the field stands now, where a few words say it. */
  said?: (newest: V) => string;
}

export interface Meanwhile<V extends FieldValues> {
  /** The fields a person sees, by their names in the form. */
  fields: NamedField<V>[];
  /** Asks the server and answers as the form's `start` was made: `version` and every field. */
  onNewest: () => Promise<V>;
}

/**
 * When somebody else was faster, a button fetches their version: what was typed here stays, fields not touched here
 * take the other's words, the next sending carries the newest version number, and what they changed is said.
 */
export function ChangedMeanwhile<V extends FieldValues>({ problem, fields, onNewest }: Meanwhile<V> & { problem: Problem }) {
  const { t } = useTranslation();
  const take = useTakeOver();
  const [changes, setChanges] = useState<Change[] | null>(null);
  const ask = useMutation<V, Problem>({ mutationFn: onNewest, onSuccess: (newest) => setChanges(take(newest, fields)) });
  if (changes) return <Changes changes={changes} />;
  return (
    <>
      <ProblemNote problem={ask.error ?? problem} />
      <div>
        <Button variant="quiet" busy={ask.isPending} onClick={() => ask.mutate()}>
          {t('form.newest.get')}
        </Button>
      </div>
    </>
  );
}

interface Change {
  label: string;
  said?: string;
  kept: boolean;
}

/** Lays the newest values under what was typed; answers what somebody else changed. */
function useTakeOver() {
  const { reset, getValues, setValue, formState } = useFormContext();
  // Read while drawing, or the form does not keep them up to date.
  const { dirtyFields, defaultValues = {} } = formState;
  return <V extends FieldValues>(newest: V, fields: NamedField<V>[]): Change[] => {
    const typed = Object.entries(getValues()).filter(([name]) => anyTrue(dirtyFields[name]));
    const kept = new Set(typed.map(([name]) => name));
    const changes = fields
      .filter(({ name }) => JSON.stringify(newest[name]) !== JSON.stringify(defaultValues[name]))
      .map(({ name, label, said }) => ({ label, said: said?.(newest), kept: kept.has(name) }));
    reset(newest, { keepSubmitCount: true });
    for (const [name, value] of typed) setValue(name, value, { shouldDirty: true });
    return changes;
  };
}

/** A list's or a group's dirtiness is that of its parts. */
const anyTrue = (dirty: unknown): boolean =>
  dirty === true || (typeof dirty === 'object' && dirty !== null && Object.values(dirty).some(anyTrue));

function Changes({ changes }: { changes: Change[] }) {
  const { t } = useTranslation();
  const box = useRef<HTMLDivElement>(null);
  // The pressed button is gone.
  useEffect(() => box.current?.focus(), []);
  return (
    <div ref={box} tabIndex={-1}>
      <Notice tone="caution" role="status" title={t('form.newest.got')}>
        {changes.length === 0 ? (
          <p>{t('form.newest.nothing')}</p>
        ) : (
          <>
            <p>{t('form.newest.changed')}</p>
            <ul className="list-disc pl-5">
              {changes.map(({ label, said, kept }) => (
                <li key={label} className="wrap-anywhere">
                  {said === undefined ? label : t('form.newest.now', { field: label, words: said })}
                  {kept && ` ${t('form.newest.kept')}`}
                </li>
              ))}
            </ul>
          </>
        )}
      </Notice>
    </div>
  );
}
