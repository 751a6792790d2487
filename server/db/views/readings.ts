import type { Database } from '../open';

/** A stored reading in the sensor's own units. */
export interface StoredReading {
  at: number;
  /** From the left; null where a probe said nothing. */
  probes: (number | null)[];
  airC: number | null;
  supplyV: number | null;
}

type Row = [at: number, probes: string, airC: number | null, supplyV: number | null];

const NEWEST = 'select max(at) from reading where sensor_no = ? and at <= ?';
const SINCE = 'select at, probes, air_c, supply_v from reading where sensor_no = ? and at between ? and ? order by at';

/**
 * A sensor's readings of the last `windowMs` before its newest that is no later than `until`, from `from` on. Prepared
 * once and read raw: this runs for every reading that arrives.
 */
export function recentReadings(db: Database, sensorNo: number, from: number, windowMs: number, until: number): StoredReading[] {
  const { newest, since } = statementsOf(db);
  const last = newest.get(sensorNo, until) as number | null;
  if (last === null) return [];
  // The columns of the statement above, in their order.
  return (since.all(sensorNo, Math.max(from, last - windowMs + 1), last) as Row[]).map(([at, probes, airC, supplyV]) => ({
    at,
    probes: JSON.parse(probes),
    airC,
    supplyV,
  }));
}

function prepare({ $client }: Database) {
  return { newest: $client.prepare(NEWEST).pluck(), since: $client.prepare(SINCE).raw() };
}

const prepared = new WeakMap<object, ReturnType<typeof prepare>>();

function statementsOf(db: Database): ReturnType<typeof prepare> {
  const known = prepared.get(db.$client) ?? prepare(db);
  prepared.set(db.$client, known);
  return known;
}
