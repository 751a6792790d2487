import { useState } from 'react';
import { useMutation } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { Endpoint } from '../../server/contract/endpoint';
import type { Problem } from '../api/call';
import { invalidate } from '../api/query';
import { Button, ButtonRow } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Confirm } from './confirm';

/** What can go out of use and come back. */
export interface Retirable {
  id: string;
  name: string;
  retired: boolean;
  version: number;
}

export interface Retiring {
  thing: Retirable;
  /** What each act does. */
  words: { retire: string; restore: string };
  /** Why it has to stay in use, where that is known beforehand. */
  needed?: string | null;
  send: (id: string, body: { version: number; retired: boolean }) => Promise<unknown>;
  /** Asked anew when somebody else was faster, so that a second press has the newest version. */
  source: Endpoint;
  onDone: (words: string, retired: boolean) => void;
}

/** Takes something out of use, or back into it, after saying what that does. */
export function RetireDialog({ thing: { id, name, version, retired }, words, needed, send, source, onDone, onClose }: Retiring & { onClose: () => void }) {
  const { t } = useTranslation();
  // What was asked for stays asked, though the thing may change under the open dialog.
  const [act] = useState<keyof Retiring['words']>(retired ? 'restore' : 'retire');
  const change = useMutation<unknown, Problem>({
    mutationFn: () => send(id, { version, retired: act === 'retire' }),
    onSuccess: () => {
      onDone(t(`${act}.done`, { name }), act === 'retire');
      onClose();
    },
    onError: ({ type }) => (type === 'changed-meanwhile' ? invalidate(source) : undefined),
  });
  const title = t(`${act}.title`, { name });
  if (needed && act === 'retire')
    return (
      <Dialog open title={title} onClose={onClose}>
        <div className="grid gap-4">
          <p>{needed}</p>
          <ButtonRow>
            <Button onClick={onClose}>{t('close')}</Button>
          </ButtonRow>
        </div>
      </Dialog>
    );
  return (
    <Confirm
      title={title}
      yes={t(`${act}.button`)}
      no={t('cancel')}
      variant={act === 'retire' ? 'danger' : 'primary'}
      act={change}
      onYes={() => change.mutate()}
      onClose={onClose}
    >
      <p>{words[act]}</p>
    </Confirm>
  );
}
