import { api } from '../../contract';
import { allowed, and, freezers, sql, stores } from '../../db';
import { freezersView } from '../../db/views/freezers';
import { problem } from '../../http/problem';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';

const columns = { id: freezers.id, storeId: freezers.storeId };

export const freezersRoutes = [
  route(api.freezers.list, ({ db, ability }, { query }) => {
    const limit = query.limit ?? 50;
    const cursor = readCursor(query.after, ['string', 'string']);
    const where = and(
      allowed(ability, 'read', 'Freezer', columns),
      cursor ? sql`(${stores.name}, ${freezers.id}) > (${cursor[0]}, ${cursor[1]})` : undefined,
    );
    const rows = freezersView(db, where ?? sql`1`, sql`${stores.name}, ${freezers.id}`, limit + 1);
    const page = pageOf(rows, limit, (row) => [row.store, row.id]);
    return { freezers: page.rows, next: page.next };
  }),

  route(api.freezers.read, ({ db, ability }, { params }) => {
    const where = and(sql`${freezers.id} = ${params.freezerId}`, allowed(ability, 'read', 'Freezer', columns));
    const [found] = freezersView(db, where ?? sql`0`, sql`${freezers.id}`, 1);
    if (!found) throw problem('not-found');
    return found;
  }),
];
