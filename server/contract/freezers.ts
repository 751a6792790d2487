import * as z from 'zod/mini';
import { id, instant, nextCursor, paging, withProducer, producerParams } from './common';
import { endpoint } from './endpoint';
import { defrosts, placements } from './words';

const pounds = z.number();
const laneLevel = z.object({
  productId: id,
  pounds,
  sdPounds: pounds,
  capacityPounds: pounds,
  bags: z.int(),
  about: z.boolean(),
  stackIn: z.number(),
  borrowed: z.boolean(),
});
export const runOut = z.object({
  early: z.nullable(instant),
  likely: z.nullable(instant),
  late: z.nullable(instant),
});

/** What the readings mean now. `rates` are pounds a day by lane, with their sd; `history` is [instant, share of full]. */
export const freezerState = z.object({
  at: instant,
  level: z.object({
    pounds,
    sdPounds: pounds,
    capacityPounds: pounds,
    share: z.number(),
    lanes: z.array(laneLevel),
  }),
  distancesIn: z.array(z.nullable(z.number())),
  airF: z.nullable(z.number()),
  airAt: z.nullable(instant),
  warmSince: z.nullable(instant),
  supplyV: z.nullable(z.number()),
  runOut: z.object({ ...runOut.shape, lane: z.nullable(z.int()) }),
  laneRunOuts: z.array(runOut),
  rates: z.array(z.object({ poundsPerDay: pounds, sdPounds: pounds, days: z.int() })),
  deliveries: z.array(z.object({ at: instant, pounds: z.array(pounds) })),
  history: z.array(z.tuple([instant, z.number()])),
});

export const freezer = z.object({
  id,
  name: z.string(),
  assetNumber: z.string(),
  placement: z.enum(placements),
  condition: z.string(),
  model: z.object({
    name: z.string(),
    insideWidthIn: z.number(),
    insideDepthIn: z.number(),
    insideHeightIn: z.number(),
    doors: z.int(),
    ratedPounds: z.number(),
    defrost: z.enum(defrosts),
  }),
  mount: z.object({ channelDropIn: z.number(), rackIn: z.number(), headroomIn: z.number() }),
  lanes: z.array(z.object({ productId: id, product: z.string(), bagPounds: z.number(), widthShare: z.number() })),
  /** Null while no sensor hangs in it. */
  sensor: z.nullable(z.object({ id, serial: z.string(), since: instant, probesIn: z.array(z.number()) })),
  /** Null until a first believable reading. */
  state: z.nullable(freezerState),
});
export type Freezer = z.output<typeof freezer>;

export const listFreezers = endpoint({
  id: 'freezers.list',
  method: 'get',
  path: '/api/:producer/freezers',
  access: { kind: 'may', action: 'read', subject: 'Freezer' },
  params: producerParams,
  query: z.strictObject(paging),
  result: z.object({
    freezers: z.array(z.object({ ...freezer.shape, storeId: id, store: z.string() })),
    next: nextCursor,
  }),
  problems: ['bad-input'],
});

export const readFreezer = endpoint({
  id: 'freezers.read',
  method: 'get',
  path: '/api/:producer/freezers/:freezerId',
  access: { kind: 'may', action: 'read', subject: 'Freezer' },
  params: withProducer({ freezerId: id }),
  result: z.object({ ...freezer.shape, storeId: id }),
  problems: ['not-found'],
});
