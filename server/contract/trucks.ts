import * as z from 'zod/mini';
import { day, fault, id, instant, nextCursor, paging, producerParams, search, timeOfDay, version } from './common';
import { endpoint } from './endpoint';

/** A window on a store's local day. */
const window = { day, from: timeOfDay, to: timeOfDay };

const truckRow = z.object({
  store: z.object({ id, name: z.string(), city: z.string(), timeZone: z.string(), district: z.string() }),
  truck: z.nullable(z.object({ day, from: instant, to: instant, version })),
  /** The next of its usual delivery days that is still to come, within its receiving hours; null where it has none. */
  usual: z.nullable(z.object(window)),
  /** When the first of its freezers is likely empty. */
  runOutLikely: z.nullable(instant),
});
export type TruckRow = z.output<typeof truckRow>;

export const listTrucks = endpoint({
  id: 'trucks.list',
  method: 'get',
  path: '/api/:producer/next-trucks',
  access: { kind: 'may', action: 'update', subject: 'NextTruck' },
  params: producerParams,
  query: z.strictObject({
    ...paging,
    q: search,
    district: z.optional(id),
    account: z.optional(id),
    truck: z.optional(z.enum(['today', 'late', 'none'])),
  }),
  result: z.object({ rows: z.array(truckRow), next: nextCursor }),
  problems: ['bad-input'],
});

/** Tells many stores at once. Each is set or refused by itself; what was to be loaded stays as it was. */
export const setTrucks = endpoint({
  id: 'trucks.set',
  method: 'put',
  path: '/api/:producer/next-trucks',
  access: { kind: 'may', action: 'update', subject: 'NextTruck' },
  params: producerParams,
  body: z.strictObject({
    trucks: z
      .array(z.strictObject({ storeId: id, ...window, version: z.nullable(version) }))
      .check(z.minLength(1, fault('stores')), z.maxLength(200, fault('too-long'))),
  }),
  result: z.object({
    set: z.array(id),
    refused: z.array(z.object({ storeId: id, problem: z.enum(['not-found', 'day-past', 'window-backwards', 'truck-changed']) })),
  }),
  problems: ['bad-input', 'not-allowed'],
});
