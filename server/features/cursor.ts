import { problem } from '../http/problem';

/** Keyset paging: the sort values of the last row shown, opaque to the caller. */
export type Cursor = (string | number)[];

export const writeCursor = (cursor: Cursor): string => Buffer.from(JSON.stringify(cursor)).toString('base64url');

/** Refuses what this server did not write. */
export function readCursor(after: string | undefined, types: ('string' | 'number')[]): Cursor | null {
  if (after === undefined) return null;
  const cursor = parsed(after);
  const fits = Array.isArray(cursor) && cursor.length === types.length && types.every((type, i) => typeof cursor[i] === type);
  if (!fits) throw problem('bad-input', undefined, [{ pointer: '/query/after', fault: 'invalid' }]);
  return cursor as Cursor;
}

function parsed(after: string): unknown {
  try {
    return JSON.parse(Buffer.from(after, 'base64url').toString('utf8'));
  } catch {
    return null;
  }
}

/** One row more than asked says whether there is a next page. */
export function pageOf<Row>(rows: Row[], limit: number, cursorOf: (row: Row) => Cursor): { rows: Row[]; next: string | null } {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return { rows: shown, next: rows.length > limit && last ? writeCursor(cursorOf(last)) : null };
}
