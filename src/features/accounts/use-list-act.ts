import { useState } from 'react';
import type { Retirable } from '../../form/retire-dialog';

type Act = { kind: 'add' } | { kind: 'change' | 'retire'; id: string };

/** What is being done in a list's dialogs; kept by id, so that the dialog has the newest of what it is about. */
export function useListAct<T extends Retirable>(list: T[]) {
  const [act, setAct] = useState<Act | null>(null);
  const [done, setDone] = useState<string | null>(null);
  const about = (kind: 'change' | 'retire') => (act?.kind === kind ? (list.find(({ id }) => id === act.id) ?? null) : null);
  const start = (wanted: Act) => {
    setDone(null);
    setAct(wanted);
  };
  const close = () => setAct(null);
  const finish = (words: string) => {
    setDone(words);
    close();
  };
  return { adding: act?.kind === 'add', changing: about('change'), retiring: about('retire'), done, start, close, finish };
}

export type ListAct = ReturnType<typeof useListAct>;
