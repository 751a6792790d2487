import { row, type Ability } from '../../contract/ability';
import { api } from '../../contract';
import type { Attention } from '../../contract/stores';
import { allowed, and, contains, gte, lt, nextTrucks, sql, stores, type SQL } from '../../db';
import { deliveriesOfStore, nextTruckOfStore } from '../../db/views/deliveries';
import { freezersOfStore } from '../../db/views/freezers';
import { readableRequests, recentRequestsOfStore } from '../../db/views/requests';
import { hasTruck, noTruck, storesView, storeView, type StoreRow } from '../../db/views/stores';
import { attentionOf } from '../../domain/attention';
import { addDays, dayOf, startOfDay } from '../../domain/civil';
import { problem } from '../../http/problem';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';

export const storesRoutes = [
  route(api.stores.list, ({ db, ability, now, producer }, { query }) => {
    const limit = query.limit ?? 50;
    const cursor = readCursor(query.after, ['string', 'string']);
    const where = and(
      allowed(ability, 'read', 'Store', { id: stores.id }),
      cursor ? sql`(${stores.name}, ${stores.id}) > (${cursor[0]}, ${cursor[1]})` : undefined,
      query.q ? contains(query.q, stores.name, stores.street, stores.city) : undefined,
      query.truck ? truckIs(query.truck, now, producer.timeZone) : undefined,
      query.truck ? allowed(ability, 'read', 'NextTruck', { storeId: stores.id }) : undefined,
    );
    const page = pageOf(storesView(db, where ?? sql`1`, readableRequests(ability), limit + 1), limit, ({ name, id }) => [name, id]);
    return { stores: page.rows.map((store) => summary(store, ability, now)), next: page.next };
  }),

  route(api.stores.read, ({ db, ability, now }, { params }) => {
    const store = storeView(db, ability, params.storeId);
    if (!store) throw problem('not-found');
    const sees = (type: 'NextTruck' | 'Delivery') => ability.can('read', row(type, { storeId: store.id }));
    return {
      store,
      freezers: freezersOfStore(db, store.id),
      nextTruck: sees('NextTruck') ? nextTruckOfStore(db, store.id) : null,
      requests: recentRequestsOfStore(db, ability, store.id, now),
      deliveries: sees('Delivery') ? deliveriesOfStore(db, store.id, null, 5) : [],
    };
  }),
];

function truckIs(when: 'today' | 'late' | 'none', now: number, timeZone: string): SQL {
  if (when === 'none') return noTruck;
  if (when === 'late') return hasTruck(lt(nextTrucks.to, now));
  const today = dayOf(now, timeZone);
  const within = and(gte(nextTrucks.from, startOfDay(today, timeZone)), lt(nextTrucks.from, startOfDay(addDays(today, 1), timeZone)));
  return hasTruck(within ?? sql`0`);
}

function summary({ truckFrom, truckTo, freezers, ...store }: StoreRow, ability: Ability, now: number) {
  const seesTruck = ability.can('read', row('NextTruck', { storeId: store.id }));
  const nextTruck = seesTruck && truckFrom !== null && truckTo !== null ? { from: truckFrom, to: truckTo } : null;
  const levels = freezers.filter((freezer) => freezer.share !== null && freezer.at !== null);
  const pounds = total(levels.map((level) => level.pounds));
  const attention: Attention = attentionOf(freezers, nextTruck, now);
  return {
    ...store,
    attention,
    freezers: freezers.length,
    share: levels.length > 0 ? pounds / total(levels.map((level) => level.capacityPounds)) : null,
    pounds: levels.length > 0 ? pounds : null,
    at: earliest(levels.map(({ at }) => at)),
    runOutLikely: earliest(freezers.map(({ runOutLikely }) => runOutLikely)),
    nextTruck,
  };
}

const total = (values: (number | null)[]): number => values.reduce<number>((sum, value) => sum + (value ?? 0), 0);

function earliest(times: (number | null)[]): number | null {
  const known = times.filter((time) => time !== null);
  return known.length > 0 ? Math.min(...known) : null;
}
