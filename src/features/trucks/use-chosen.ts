import { useState } from 'react';

export type Chosen = ReturnType<typeof useChosen>;

/** Which rows of a list are chosen; a range reaches from the row pressed before. */
export function useChosen() {
  const [marked, setMarked] = useState<ReadonlySet<string>>(new Set());
  const [last, setLast] = useState<string | null>(null);
  const choose = (ids: string[], on: boolean) => setMarked((now) => new Set(on ? [...now, ...ids] : [...now].filter((id) => !ids.includes(id))));
  const press = (shown: string[], id: string, on: boolean, range: boolean) => {
    choose(range && last ? between(shown, last, id) : [id], on);
    setLast(id);
  };
  return {
    has: (id: string) => marked.has(id),
    choose,
    press,
    /** Nobody but these. */
    only: (ids: string[]) => setMarked(new Set(ids)),
  };
}

/** From one to the other in either direction; the other alone where the first is no longer shown. */
function between(ids: string[], one: string, other: string): string[] {
  const [from = 0, to = 0] = [ids.indexOf(one), ids.indexOf(other)].toSorted((a, b) => a - b);
  return from < 0 ? [other] : ids.slice(from, to + 1);
}
