import { api } from '../../contract';
import { deliveriesOfStore, deliveryView, nextTruckOfStore } from '../../db/views/deliveries';
import { storeView } from '../../db/views/stores';
import type { ProducerContext } from '../../http/context';
import { orNotFound } from '../../http/problem';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';
import { clearNextTruck, recordDelivery, setNextTruck } from './actions';

export const deliveriesRoutes = [
  route(api.deliveries.setNextTruck, (ctx, { params, body }) => {
    const store = storeOf(ctx, params.storeId);
    setNextTruck(ctx, store, body);
    return present(nextTruckOfStore(ctx.db, store.id));
  }),

  route(api.deliveries.clearNextTruck, (ctx, { params }) => {
    clearNextTruck(ctx, storeOf(ctx, params.storeId));
    return undefined;
  }),

  route(api.deliveries.list, (ctx, { params, query }) => {
    const store = storeOf(ctx, params.storeId);
    const limit = query.limit ?? 25;
    const cursor = readCursor(query.after, ['number', 'string']);
    const after = cursor ? ([Number(cursor[0]), String(cursor[1])] as const) : null;
    const page = pageOf(deliveriesOfStore(ctx.db, store.id, after, limit + 1), limit, (row) => [row.at, row.id]);
    return { deliveries: page.rows, next: page.next };
  }),

  route(api.deliveries.record, (ctx, { params, body }) => {
    const id = recordDelivery(ctx, storeOf(ctx, params.storeId), body);
    return present(deliveryView(ctx.db, id));
  }),
];

function storeOf({ db, ability }: ProducerContext, storeId: string) {
  return orNotFound(storeView(db, ability, storeId));
}

function present<T>(row: T | null | undefined): T {
  if (!row) throw new Error('what was just written is not there');
  return row;
}

