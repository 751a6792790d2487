import { useRef } from 'react';
import { Plus, X } from 'lucide-react';
import { useFieldArray } from 'react-hook-form';
import type { Span } from '../../server/contract/words';
import { Button, IconButton } from '../ui/button';
import { FieldError } from '../ui/field';
import { TextField } from './text-field';
import { useListFault } from './use-list-fault';
import { WeekdaysField } from './weekdays-field';

/** What the spans are called where they are asked for. */
export interface SpanLabels {
  legend: string;
  hint?: string;
  /** Said while there are none. */
  none: string;
  /** Names one of them, and the way to take it away; counted from one. */
  span: (n: number) => string;
  remove: (n: number) => string;
  days: string;
  from: string;
  to: string;
  add: string;
}

interface Props {
  /** A list of `Span` in the form's body. */
  name: string;
  labels: SpanLabels;
}

const most = 14;
const usual: Span = { days: [1, 2, 3, 4, 5], from: '07:00', to: '15:00' };

/** Hours on days of the week: as many spans as it takes, each with its days and from when to when. */
export function SpansField({ name, labels }: Props) {
  const adder = useRef<HTMLButtonElement>(null);
  const { fields, append, remove } = useFieldArray({ name });
  const { fault, faultId } = useListFault(name);
  const take = (i: number) => {
    remove(i);
    // The pressed button is gone with its span.
    adder.current?.focus();
  };
  return (
    <fieldset className="min-w-0" aria-describedby={faultId}>
      <legend className="font-semibold">{labels.legend}</legend>
      {labels.hint && <p className="text-body text-ink-3">{labels.hint}</p>}
      {faultId && <FieldError id={faultId}>{fault}</FieldError>}
      {fields.length === 0 && <p className="mt-1 text-ink-2">{labels.none}</p>}
      <div className="mt-2 grid gap-3 empty:hidden">
        {fields.map(({ id }, i) => (
          <SpanFields key={id} name={`${name}.${i}`} n={i + 1} labels={labels} onRemove={() => take(i)} />
        ))}
      </div>
      {fields.length < most && (
        <div className="mt-3">
          <Button ref={adder} variant="quiet" size="big" onClick={() => append({ ...usual, days: fields.length === 0 ? usual.days : [] })}>
            <Plus aria-hidden size={18} />
            {labels.add}
          </Button>
        </div>
      )}
    </fieldset>
  );
}

function SpanFields({ name, n, labels, onRemove }: Props & { n: number; onRemove: () => void }) {
  return (
    <div role="group" aria-label={labels.span(n)} className="rounded-card border border-rule bg-surface px-4 pt-1 pb-4">
      <div className="-mr-3 flex items-center justify-between">
        <span aria-hidden className="text-small text-ink-3">
          {labels.span(n)}
        </span>
        <IconButton label={labels.remove(n)} icon={<X aria-hidden size={20} />} onClick={onRemove} />
      </div>
      <WeekdaysField name={`${name}.days`} label={labels.days} />
      <div className="mt-3 grid grid-cols-2 gap-3 sm:max-w-md">
        <TextField name={`${name}.from`} label={labels.from} type="time" />
        <TextField name={`${name}.to`} label={labels.to} type="time" />
      </div>
    </div>
  );
}
