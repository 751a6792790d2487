import { row, type Ability } from '../../contract/ability';
import { api } from '../../contract';
import { scopedRoles } from '../../contract/people';
import type { StoreSummary } from '../../contract/stores';
import { and, sql } from '../../db';
import { deliveriesOfStore, nextTruckOfStore } from '../../db/views/deliveries';
import { freezersOfStore } from '../../db/views/freezers';
import { readableRequests, recentRequestsOfStore } from '../../db/views/requests';
import { storesView, storeView, type StoreRow } from '../../db/views/stores';
import { attentionOf } from '../../domain/attention';
import { orNotFound } from '../../http/problem';
import { route } from '../../http/route';
import { pageOf } from '../cursor';
import { pageByAttention } from './by-attention';
import { behindByName, storesWanted } from './stores-wanted';

export const storesRoutes = [
  route(api.stores.list, (ctx, { query: { limit = 50, after, ...filter } }) => {
    const { db, ability, now, viewer } = ctx;
    const wanted = storesWanted(ctx, filter);
    const readable = readableRequests(ability);
    if (scopedRoles.some((role) => role === viewer.role)) {
      const own = storesView(db, wanted, readable, viewer.storeIds.length).map((store) => summary(store, ability, now));
      return pageByAttention(own, after, limit);
    }
    const rows = storesView(db, and(wanted, behindByName(after)) ?? sql`0`, readable, limit + 1);
    const page = pageOf(rows, limit, ({ name, id }) => [name, id]);
    return { stores: page.rows.map((store) => summary(store, ability, now)), next: page.next };
  }),

  route(api.stores.read, ({ db, ability, now }, { params }) => {
    const store = orNotFound(storeView(db, ability, params.storeId));
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

function summary({ truckFrom, truckTo, freezers, ...store }: StoreRow, ability: Ability, now: number): StoreSummary {
  const seesTruck = ability.can('read', row('NextTruck', { storeId: store.id }));
  const nextTruck = seesTruck && truckFrom !== null && truckTo !== null ? { from: truckFrom, to: truckTo } : null;
  const levels = freezers.filter((freezer) => freezer.share !== null && freezer.at !== null);
  const pounds = total(levels.map((level) => level.pounds));
  return {
    ...store,
    attention: attentionOf(freezers, nextTruck, now),
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
