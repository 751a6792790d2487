import { attentions, type StoreSummary } from '../../contract/stores';
import { pageOf, readCursor, type Cursor } from '../cursor';

/** A page of all the stores of somebody who has few: those that need looking at first, then by name. */
export function pageByAttention(stores: StoreSummary[], after: string | undefined, limit: number) {
  const last = readCursor(after, ['number', 'string', 'string']);
  const ordered = stores
    .map((store) => ({ store, place: [attentions.indexOf(store.attention), store.name, store.id] satisfies Cursor }))
    .filter(({ place }) => last === null || inOrder(place, last) > 0)
    .sort((a, b) => inOrder(a.place, b.place));
  const { rows, next } = pageOf(ordered, limit, ({ place }) => place);
  return { stores: rows.map(({ store }) => store), next };
}

/** By the first value that differs; both places hold the same kinds of value. */
function inOrder(a: Cursor, b: Cursor): number {
  const at = a.findIndex((value, i) => value !== b[i]);
  const [left, right] = [a[at], b[at]];
  return left === undefined || right === undefined ? 0 : left < right ? -1 : 1;
}
