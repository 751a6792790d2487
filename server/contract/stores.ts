import * as z from 'zod/mini';
import { id, instant, language, nextCursor, paging, producerParams, search, withProducer } from './common';
import { delivery, nextTruck } from './deliveries';
import { endpoint } from './endpoint';
import { freezer } from './freezers';
import { requestSummary } from './requests';

/** What a store needs looked at, worst first. */
export const attentions = ['warm', 'empty', 'runs-out-first', 'truck-late', 'silent', 'none'] as const;
export type Attention = (typeof attentions)[number];

export const storeSummary = z.object({
  id,
  name: z.string(),
  street: z.string(),
  city: z.string(),
  timeZone: z.string(),
  district: z.string(),
  account: z.string(),
  attention: z.enum(attentions),
  freezers: z.int(),
  /** Over its freezers with a believable level; null when none has one. */
  share: z.nullable(z.number()),
  pounds: z.nullable(z.number()),
  /** The oldest of the levels above. */
  at: z.nullable(instant),
  runOutLikely: z.nullable(instant),
  nextTruck: z.nullable(z.object({ from: instant, to: instant })),
  openRequests: z.int(),
});
export type StoreSummary = z.output<typeof storeSummary>;

/** By name; somebody with assigned stores gets those that need attention first. */
export const listStores = endpoint({
  id: 'stores.list',
  method: 'get',
  path: '/api/:producer/stores',
  access: { kind: 'may', action: 'read', subject: 'Store' },
  params: producerParams,
  query: z.strictObject({
    ...paging,
    q: search,
    truck: z.optional(z.enum(['today', 'late', 'none'])),
    district: z.optional(id),
    account: z.optional(id),
    retired: z.optional(z.literal('only')),
  }),
  result: z.object({ stores: z.array(storeSummary), next: nextCursor }),
  problems: ['bad-input'],
});

/** The store page in one answer: full, cold, coming, and who is fixing it. */
export const readStore = endpoint({
  id: 'stores.read',
  method: 'get',
  path: '/api/:producer/stores/:storeId',
  access: { kind: 'may', action: 'read', subject: 'Store' },
  params: withProducer({ storeId: id }),
  result: z.object({
    store: z.object({
      id,
      name: z.string(),
      kind: z.string(),
      street: z.string(),
      city: z.string(),
      region: z.string(),
      postalCode: z.string(),
      timeZone: z.string(),
      language,
      phone: z.string(),
      /** Empty is the producer's own. */
      urgentPhone: z.string(),
      account: z.string(),
      district: z.string(),
      deliveryDays: z.array(z.int()),
      receivingHours: z.array(z.object({ days: z.array(z.int()), from: z.string(), to: z.string() })),
    }),
    freezers: z.array(freezer),
    nextTruck: z.nullable(nextTruck),
    /** Live ones, and those that ended in the last fourteen days. */
    requests: z.array(requestSummary),
    /** The last five. */
    deliveries: z.array(delivery),
  }),
  problems: ['not-found'],
});
export type StorePage = z.output<(typeof readStore)['result']>;
