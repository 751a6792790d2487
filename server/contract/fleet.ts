import * as z from 'zod/mini';
import { id, instant, nextCursor, paging, producerParams, search } from './common';
import { endpoint } from './endpoint';

/** What a list of freezers can be narrowed to: at risk of running out before the truck, warm, silent, without a sensor. */
export const fleetShows = ['first', 'warm', 'silent', 'unfitted'] as const;
export type FleetShow = (typeof fleetShows)[number];

/** One freezer as a list shows it; what is null is not known. Levels of a freezer without a sensor are not shown. */
export const fleetRow = z.object({
  id,
  name: z.string(),
  assetNumber: z.string(),
  storeId: id,
  store: z.string(),
  city: z.string(),
  accountNumber: z.string(),
  timeZone: z.string(),
  serial: z.nullable(z.string()),
  /** Of the level. */
  at: z.nullable(instant),
  pounds: z.nullable(z.number()),
  share: z.nullable(z.number()),
  lanes: z.array(z.object({ product: z.string(), bags: z.nullable(z.int()), share: z.nullable(z.number()) })),
  airF: z.nullable(z.number()),
  warmSince: z.nullable(instant),
  early: z.nullable(instant),
  likely: z.nullable(instant),
  late: z.nullable(instant),
  /** From when on its chance of being empty passes the producer's limit. */
  riskAt: z.nullable(instant),
  truck: z.nullable(z.object({ from: instant, to: instant })),
});
export type FleetRow = z.output<typeof fleetRow>;

/** `q` finds words that begin so in store, street, city, account number, asset number, serial and telephone. */
const selection = { q: search, district: z.optional(id), account: z.optional(id), store: z.optional(id) };
const narrowed = { ...selection, show: z.optional(z.enum(fleetShows)) };

/** The soonest likely run-out first, those without one last. */
export const listFreezers = endpoint({
  id: 'freezers.list',
  method: 'get',
  path: '/api/:producer/freezers',
  access: { kind: 'may', action: 'read', subject: 'Freezer' },
  params: producerParams,
  query: z.strictObject({ ...paging, ...narrowed }),
  result: z.object({ freezers: z.array(fleetRow), next: nextCursor }),
  problems: ['bad-input'],
});

/** How many there are of each, for a sentence. */
export const digestFreezers = endpoint({
  id: 'freezers.digest',
  method: 'get',
  path: '/api/:producer/freezer-digest',
  access: { kind: 'may', action: 'read', subject: 'Freezer' },
  params: producerParams,
  query: z.strictObject(selection),
  result: z.object({ all: z.int(), first: z.int(), warm: z.int(), silent: z.int(), unfitted: z.int() }),
  problems: ['bad-input'],
});
export type FleetDigest = z.output<(typeof digestFreezers)['result']>;

/** Worst first. */
export const mapMarks = ['warm', 'first', 'silent', 'fine'] as const;
export type MapMark = (typeof mapMarks)[number];

const mapStore = z.object({
  id,
  name: z.string(),
  city: z.string(),
  latitude: z.number(),
  longitude: z.number(),
  freezers: z.int(),
  /** The worst of its freezers in the selection. */
  mark: z.enum(mapMarks),
  likely: z.nullable(instant),
});
export type MapStore = z.output<typeof mapStore>;

/** The same selection by store, to be drawn. */
export const mapFreezers = endpoint({
  id: 'freezers.map',
  method: 'get',
  path: '/api/:producer/freezer-map',
  access: { kind: 'may', action: 'read', subject: 'Freezer' },
  params: producerParams,
  query: z.strictObject(narrowed),
  result: z.object({ stores: z.array(mapStore) }),
  problems: ['bad-input'],
});

export const fleetColumns = ['level', 'air', 'likely', 'truck', 'state', 'account', 'asset', 'serial', 'heard'] as const;
export type FleetColumn = (typeof fleetColumns)[number];

/** The whole selection, in the order of the list; `columns` are names with commas between them. */
export const freezersCsv = endpoint({
  id: 'freezers.csv',
  method: 'get',
  path: '/api/:producer/freezers.csv',
  access: { kind: 'may', action: 'read', subject: 'Freezer' },
  params: producerParams,
  query: z.strictObject({ ...narrowed, columns: z.optional(z.string().check(z.maxLength(200))) }),
  answer: 'file',
  problems: ['bad-input'],
});
