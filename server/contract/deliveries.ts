import * as z from 'zod/mini';
import { day, fault, id, instant, nextCursor, paging, timeOfDay, withProducer, words } from './common';
import { endpoint } from './endpoint';

const bags = z.int(fault('bags')).check(z.minimum(0, fault('bags')), z.maximum(2000, fault('bags')));
const load = z.strictObject({ productId: id, bags });

export const nextTruck = z.object({
  day,
  from: instant,
  to: instant,
  version: z.int(),
  load: z.array(z.object({ productId: id, product: z.string(), bagPounds: z.number(), bags: z.int() })),
});
export type NextTruck = z.output<typeof nextTruck>;

export const delivery = z.object({
  id,
  at: instant,
  /** The window the store had been told, where there was one. */
  toldFrom: z.nullable(instant),
  toldTo: z.nullable(instant),
  lines: z.array(
    z.object({
      productId: id,
      product: z.string(),
      bagPounds: z.number(),
      bags: z.int(),
      takenBack: z.int(),
      lot: z.string(),
      freezerId: z.nullable(id),
    }),
  ),
});
export type Delivery = z.output<typeof delivery>;

const storeParams = withProducer({ storeId: id });

/** Says when the next truck comes; `version` is the one seen, or null where none was set. */
export const setNextTruck = endpoint({
  id: 'deliveries.setNextTruck',
  method: 'put',
  path: '/api/:producer/stores/:storeId/next-truck',
  access: { kind: 'may', action: 'update', subject: 'NextTruck' },
  params: storeParams,
  body: z.strictObject({
    day,
    from: timeOfDay,
    to: timeOfDay,
    load: z.array(load).check(z.maxLength(20, fault('too-long'))),
    version: z.nullable(z.int()),
  }),
  result: nextTruck,
  problems: ['bad-input', 'not-found', 'not-allowed', 'day-past', 'window-backwards', 'unknown-product', 'truck-changed'],
});

export const clearNextTruck = endpoint({
  id: 'deliveries.clearNextTruck',
  method: 'delete',
  path: '/api/:producer/stores/:storeId/next-truck',
  access: { kind: 'may', action: 'delete', subject: 'NextTruck' },
  params: storeParams,
  answer: 'nothing',
  problems: ['not-found', 'not-allowed'],
});

export const listDeliveries = endpoint({
  id: 'deliveries.list',
  method: 'get',
  path: '/api/:producer/stores/:storeId/deliveries',
  access: { kind: 'may', action: 'read', subject: 'Delivery' },
  params: storeParams,
  query: z.strictObject(paging),
  result: z.object({ deliveries: z.array(delivery), next: nextCursor }),
  problems: ['bad-input', 'not-found'],
});

export const recordDelivery = endpoint({
  id: 'deliveries.record',
  method: 'post',
  path: '/api/:producer/stores/:storeId/deliveries',
  access: { kind: 'may', action: 'create', subject: 'Delivery' },
  params: storeParams,
  body: z.strictObject({
    at: instant,
    lines: z
      .array(
        z.strictObject({
          productId: id,
          bags,
          takenBack: z._default(bags, 0),
          lot: z._default(words(40), ''),
          freezerId: z._default(z.nullable(id), null),
        }),
      )
      .check(z.minLength(1, fault('lines')), z.maxLength(40, fault('too-long'))),
  }),
  status: 201,
  result: delivery,
  problems: ['bad-input', 'not-found', 'not-allowed', 'unknown-product', 'freezer-elsewhere', 'time-ahead'],
});
