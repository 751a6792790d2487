import * as z from 'zod/mini';
import { id, instant, withProducer } from './common';
import { delivery, nextTruck } from './deliveries';
import { endpoint } from './endpoint';
import { requestSummary } from './requests';
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

/** The freezer's page in one answer. What its reader may not see of it is left out. */
export const readFreezer = endpoint({
  id: 'freezers.read',
  method: 'get',
  path: '/api/:producer/freezers/:freezerId',
  access: { kind: 'may', action: 'read', subject: 'Freezer' },
  params: withProducer({ freezerId: id }),
  result: z.object({
    freezer,
    store: z.object({ id, name: z.string(), street: z.string(), city: z.string(), timeZone: z.string(), account: z.string(), district: z.string() }),
    nextTruck: z.nullable(nextTruck),
    /** The last ten about this freezer. */
    requests: z.array(requestSummary),
    /** The last ten with a line for this freezer, or for its store without saying which. */
    deliveries: z.array(delivery),
    /** Air of the last days, thinned: instant and °F. */
    air: z.array(z.tuple([instant, z.number()])),
    /** Which sensors hung in it, the youngest first; `to` is null for the one there now. */
    sensors: z.array(z.object({ serial: z.string(), from: instant, to: z.nullable(instant) })),
  }),
  problems: ['not-found'],
});
export type FreezerPage = z.output<(typeof readFreezer)['result']>;
