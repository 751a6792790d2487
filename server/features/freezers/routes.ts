import { api } from '../../contract';
import type { Query } from '../../contract/endpoint';
import type { FleetRow, mapFreezers } from '../../contract/fleet';
import { allowed, fleetRows } from '../../db';
import { fleetDigest, fleetMap, fleetView, placed, type FleetSelection } from '../../db/views/fleet';
import { dayOf } from '../../domain/civil';
import type { ProducerContext } from '../../http/context';
import { sendCsv } from '../../http/csv';
import { madeJson } from '../../http/made-json';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';
import { fleetTable } from './fleet-table';

export const freezersRoutes = [
  route(api.freezers.list, (ctx, { query }) => {
    const limit = query.limit ?? 50;
    const cursor = readCursor(query.after, ['number', 'string']);
    const after = cursor ? ([Number(cursor[0]), String(cursor[1])] as const) : null;
    const selection = selectionOf(ctx, query);
    const page = pageOf(fleetView(ctx.db, selection, after, limit + 1), limit, (json) => [...placed(json).place]);
    const rows = selection.trucks ? page.rows : page.rows.map(untold);
    return madeJson(`{"freezers":[${rows.join(',')}],"next":${JSON.stringify(page.next)}}`);
  }),

  route(api.freezers.digest, (ctx, { query }) => fleetDigest(ctx.db, selectionOf(ctx, query))),

  route(api.freezers.csv, async (ctx, { query, res }) => {
    const { producer, now } = ctx;
    await sendCsv(res, `${producer.slug}-freezers-${dayOf(now, producer.timeZone)}.csv`, fleetTable(ctx, selectionOf(ctx, query), query.columns));
    return undefined;
  }),

  route(api.freezers.map, (ctx, { query }) => ({ stores: fleetMap(ctx.db, selectionOf(ctx, query)) })),
];

/** For whoever may not read of trucks: no truck, nor what was reckoned against one. */
const untold = (json: string): string => JSON.stringify({ ...placed(json).row, truck: null, riskAt: null } satisfies FleetRow);

/** What of the fleet this viewer asks for, within what they may see. */
export function selectionOf({ ability, now }: ProducerContext, { q, district, account, store, show }: Query<typeof mapFreezers>): FleetSelection {
  return {
    visible: allowed(ability, 'read', 'Freezer', { id: fleetRows.id, storeId: fleetRows.storeId }),
    narrow: ability.rulesFor('read', 'Freezer').every(({ conditions }) => conditions !== undefined),
    q,
    district,
    account,
    store,
    show,
    trucks: ability.can('read', 'NextTruck'),
    now,
  };
}
