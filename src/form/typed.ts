import { useEffect, useId, useMemo } from 'react';

/** The forms with words somebody typed and has not sent; the leave guard asks before they are lost. */
const unsent = new Set<string>();

export const anythingUnsent = () => unsent.size > 0;

/** Counts a form as unsent while `typed` holds; `release` lets the person go at once, before the next drawing. */
export function useTyped(typed: boolean) {
  const id = useId();
  useEffect(() => {
    if (typed) unsent.add(id);
    return () => void unsent.delete(id);
  }, [id, typed]);
  return useMemo(() => ({ release: () => void unsent.delete(id) }), [id]);
}
