import { api } from '../../contract';
import { allowed, and, sql, stores } from '../../db';
import { trucksView, type TruckStore } from '../../db/views/trucks';
import { usualTruck } from '../../domain/usual-truck';
import { route } from '../../http/route';
import { pageOf } from '../cursor';
import { behindByName, storesWanted } from '../stores/stores-wanted';
import { setTrucks } from './actions';

export const trucksRoutes = [
  route(api.trucks.list, (ctx, { query: { limit = 50, after, ...filter } }) => {
    const settable = allowed(ctx.ability, 'update', 'NextTruck', { storeId: stores.id });
    const where = and(storesWanted(ctx, filter), settable, behindByName(after)) ?? sql`0`;
    const page = pageOf(trucksView(ctx.db, where, limit + 1), limit, ({ store }) => [store.name, store.id]);
    return { rows: page.rows.map((row) => withUsual(row, ctx.now)), next: page.next };
  }),

  route(api.trucks.set, (ctx, { body }) => setTrucks(ctx, body)),
];

const withUsual = ({ deliveryDays, receivingHours, openHours, ...row }: TruckStore, now: number) => ({
  ...row,
  usual: usualTruck({ timeZone: row.store.timeZone, deliveryDays, receivingHours, openHours }, now),
});
