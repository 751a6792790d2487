import { useCallback } from 'react';

const keyOf = (name: string) => `nilas.draft.${name}`;

/** Words typed and not yet sent, kept in this tab so that a reload loses none. */
export function useDraftWords(name: string) {
  const keep = useCallback((words: string) => sessionStorage.setItem(keyOf(name), words), [name]);
  const forget = useCallback(() => sessionStorage.removeItem(keyOf(name)), [name]);
  return { kept: sessionStorage.getItem(keyOf(name)) ?? '', keep, forget };
}
