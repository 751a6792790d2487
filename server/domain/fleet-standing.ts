import { freshnessOf } from './freshness';

/** What a list knows of one freezer; what is null is not known. */
export interface FleetGlance {
  /** Of the sensor; null where none hangs in it. */
  serial: string | null;
  /** Of the level; null before a first believable reading. */
  at: number | null;
  lanes: { product: string; bags: number | null }[];
  warmSince: number | null;
  likely: number | null;
  riskAt: number | null;
  /** Undefined for whoever is told nothing of trucks. */
  truck: { from: number; to: number } | null | undefined;
}

export type FleetStanding =
  | { kind: 'unfitted' }
  | { kind: 'waiting' }
  | { kind: 'warm'; since: number }
  /** `product` is null where the whole freezer is empty. */
  | { kind: 'empty'; product: string | null }
  /** Likely empty `ms` before the truck comes. */
  | { kind: 'first'; ms: number }
  /** More than the producer's limit of chance to be empty before the truck, though not likely. */
  | { kind: 'tight' }
  /** Likely empty within two days, and no truck to come. */
  | { kind: 'soon' }
  /** The same for whoever is told nothing of trucks. */
  | { kind: 'soon-untold' }
  | { kind: 'silent'; since: number }
  | { kind: 'fine' };

/** The worst thing about one freezer at `now`, for whoever reads a list from top to bottom. */
export function fleetStanding(row: FleetGlance, now: number): FleetStanding {
  const { serial, at, warmSince } = row;
  if (serial === null) return { kind: 'unfitted' };
  if (at === null) return { kind: 'waiting' };
  if (!levelUsable(row, now)) return { kind: 'silent', since: at };
  if (warmSince !== null) return { kind: 'warm', since: warmSince };
  const empty = emptyLanes(row);
  if (empty[0] !== undefined) return { kind: 'empty', product: empty.length === row.lanes.length ? null : empty[0] };
  const standing = againstTruck(row, now);
  if (standing.kind !== 'fine') return standing;
  return freshnessOf(at, now) === 'silent' ? { kind: 'silent', since: at } : standing;
}

/** A level older than a day is not used, nor is what follows from it. */
export const levelUsable = ({ serial, at }: Pick<FleetGlance, 'serial' | 'at'>, now: number): boolean =>
  serial !== null && at !== null && freshnessOf(at, now) !== 'unusable';

/** A truck past its window is no promise: nobody knows when it comes. */
export const comingTruck = <T extends { to: number }>(truck: T | null, now: number): T | null => (truck && truck.to >= now ? truck : null);

/** The products of lanes without a whole bag. */
const emptyLanes = ({ lanes }: FleetGlance): string[] => lanes.flatMap(({ product, bags }) => (bags === 0 ? [product] : []));

function againstTruck({ likely, riskAt, truck }: FleetGlance, now: number): FleetStanding {
  const coming = comingTruck(truck ?? null, now);
  if (!coming) return likely !== null && likely < now + SOON_MS ? { kind: truck === undefined ? 'soon-untold' : 'soon' } : { kind: 'fine' };
  if (likely !== null && likely < coming.from) return { kind: 'first', ms: coming.from - likely };
  return riskAt !== null && riskAt < coming.from ? { kind: 'tight' } : { kind: 'fine' };
}

/** Without a truck to come, a run-out this near is trouble. */
export const SOON_MS = 48 * 3_600_000;
