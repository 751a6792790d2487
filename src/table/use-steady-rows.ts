import { useState } from 'react';

interface Steady<Row> {
  /** In the order in which they were first shown. */
  rows: Row[];
  /** The newest answer has other rows, or another order. */
  moved: boolean;
  showNewest: () => void;
}

/**
 * Rows of a list that asks again by itself do not move under the reader: cells change in place, the order only when the
 * reader asks for it or for another list. `list` names what was asked: filters and page.
 */
export function useSteadyRows<Row extends { id: string }>(newest: Row[], list: string): Steady<Row> {
  const [kept, keep] = useState(() => ({ list, newest, rows: newest }));
  const now = kept.list === list && kept.newest === newest ? kept : { list, newest, rows: settle(kept, newest, list) };
  if (now !== kept) keep(now);
  return {
    rows: now.rows,
    moved: now.rows.length !== newest.length || now.rows.some((row, i) => row.id !== newest[i]?.id),
    showNewest: () => keep({ list, newest, rows: newest }),
  };
}

/** A row that left the answer stays as it last was; where nothing was shown, nothing can move. */
function settle<Row extends { id: string }>(kept: { list: string; rows: Row[] }, newest: Row[], list: string): Row[] {
  if (kept.list !== list || kept.rows.length === 0) return newest;
  const byId = new Map(newest.map((row) => [row.id, row]));
  return kept.rows.map((row) => byId.get(row.id) ?? row);
}
