import * as z from 'zod/mini';
import { id, instant, nextCursor, paging, producerParams, search } from './common';
import { endpoint } from './endpoint';

export const comparisonDays = 28;

const compared = z.object({
  id,
  name: z.string(),
  city: z.string(),
  account: z.string(),
  /** Days on which a size was out, by time: half a day is 0.5. */
  outDays: z.number(),
  warmHours: z.number(),
  /** Share of the time that the readings speak of, 0 to 1. */
  known: z.number(),
  openRequests: z.int(),
  solvedRequests: z.int(),
  deliveries: z.int(),
  /** Deliveries after the window the store had been told. */
  lateDeliveries: z.int(),
});
export type ComparedStore = z.output<typeof compared>;

const comparisonQuery = { q: search };

/** The stores a person may see over the last four weeks, by name. `since` is where they begin. */
export const readComparison = endpoint({
  id: 'comparison.read',
  method: 'get',
  path: '/api/:producer/comparison',
  access: { kind: 'may', action: 'read', subject: 'Store' },
  params: producerParams,
  query: z.strictObject({ ...paging, ...comparisonQuery }),
  result: z.object({ since: instant, stores: z.array(compared), next: nextCursor }),
  problems: ['bad-input'],
});

export const comparisonCsv = endpoint({
  id: 'comparison.csv',
  method: 'get',
  path: '/api/:producer/comparison.csv',
  access: { kind: 'may', action: 'read', subject: 'Store' },
  params: producerParams,
  query: z.strictObject(comparisonQuery),
  answer: 'file',
  problems: ['bad-input'],
});
