import { dayOf } from './civil';
import { WARM_ABOVE_F } from './cooling';
import { standingOf, type FreezerNow, type LaneRunOut, type Standing, type Window } from './freezer-standing';
import { freshnessOf, type Freshness } from './freshness';

/** What the store page knows, as far as the three answers need it. Instants in milliseconds since 1970 UTC. */
export interface StoreNow {
  timeZone: string;
  freezers: FreezerNow[];
  /** Null where none is set; undefined where whoever reads is not told of trucks. */
  nextTruck: (Window & { day: string; load: { bags: number }[] }) | null | undefined;
  /** Newest first. */
  deliveries: { at: number; lines: { bags: number }[] }[];
  /** ISO weekdays on which a truck usually comes. */
  deliveryDays: number[];
}

/** A freezer named in a sentence; `bagPounds` is the side meant, null where it is the whole freezer. */
export interface Place {
  freezer: string;
  bagPounds: number | null;
}

type RunOutKey = 'perhaps-empty' | 'runs-out-first' | 'may-run-out-first' | 'truck-first' | 'runs-out';
export type FullSaid =
  | { key: 'no-freezers' | 'learning' | 'waiting' }
  | { key: 'no-sensor'; lastDelivery: number | null }
  | { key: 'silent'; since: number }
  | { key: 'empty'; place: Place; truck: Window | null | undefined }
  | { key: RunOutKey; place: Place; runOut: LaneRunOut; truck: Window | null | undefined }
  | { key: 'keeps'; past: string | null };

export interface FullAnswer {
  /** Null where no freezer has a level to believe. `share` runs from 0 to 1; `at` is the oldest level in it. */
  value: { share: number; pounds: number; sdPounds: number; at: number; freshness: Freshness } | null;
  said: FullSaid;
  /** Freezers the value speaks of, and freezers in the store. */
  known: number;
  all: number;
}

export type ColdSaid =
  | { key: 'no-freezers' | 'no-sensor' | 'waiting' }
  | { key: 'silent'; heard: number }
  | { key: 'warm'; freezer: string; since: number; others: number }
  | { key: 'above-once'; freezer: string; heard: number }
  | { key: 'holding'; count: number; heard: number }
  | { key: 'holding-some'; count: number; unknown: number; heard: number };

export interface ColdAnswer {
  /** The warmest air among thermometers to believe; null where there is none. */
  value: { airF: number; at: number; freshness: Freshness } | null;
  said: ColdSaid;
}

export type ComingSaid =
  | { key: 'none'; deliveryDays: number[] }
  | { key: 'ahead' | 'today' | 'in-window'; bags: number }
  | { key: 'late'; bags: number; dueBy: number; lateMs: number }
  | { key: 'missed'; day: string }
  | { key: 'delivered'; at: number; bags: number; next: (Window & { day: string; bags: number }) | null };

export interface ComingAnswer {
  /** The window told, where a truck is still to come. */
  value: (Window & { day: string }) | null;
  said: ComingSaid;
}

export interface Answers {
  full: FullAnswer;
  cold: ColdAnswer;
  /** Null for whoever is not told of trucks. */
  coming: ComingAnswer | null;
}

/** Is it full, is it cold, when is the truck coming: what to say at `now`, without a language. */
export function answersFor(store: StoreNow, now: number): Answers {
  return { full: fullAnswer(store, now), cold: coldAnswer(store.freezers, now), coming: comingAnswer(store, now) };
}

/** The next truck while it is still to come, as far as it is told: none once a delivery was recorded on its day. */
export function truckToCome({ nextTruck, deliveries, timeZone }: StoreNow): StoreNow['nextTruck'] {
  return nextTruck && deliveries.some(({ at }) => dayOf(at, timeZone) === nextTruck.day) ? null : nextTruck;
}

function fullAnswer(store: StoreNow, now: number): FullAnswer {
  const { freezers } = store;
  const levels = freezers.flatMap(({ sensor, state }) => (sensor && state && freshnessOf(state.at, now) !== 'unusable' ? [state] : []));
  const sum = (of: (state: (typeof levels)[number]) => number) => levels.reduce((total, state) => total + of(state), 0);
  const pounds = sum(({ level }) => level.pounds);
  const capacity = sum(({ level }) => level.capacityPounds);
  const at = Math.min(...levels.map((state) => state.at));
  return {
    value: capacity > 0 ? { share: pounds / capacity, pounds, sdPounds: Math.sqrt(sum(({ level }) => level.sdPounds ** 2)), at, freshness: freshnessOf(at, now) } : null,
    said: fullSaid(store, now),
    known: levels.length,
    all: freezers.length,
  };
}

/** Worst first: the standing a store is told of. */
const worstFirst: Standing['kind'][] = [
  'empty',
  'perhaps-empty',
  'runs-out-first',
  'may-run-out-first',
  'runs-out',
  'runs-out-untold',
  'truck-first',
  'keeps',
  'learning',
  'silent',
  'waiting',
  'no-sensor',
];

function fullSaid(store: StoreNow, now: number): FullSaid {
  const truck = truckToCome(store);
  const standings = store.freezers.map((freezer) => ({ freezer, standing: standingOf(freezer, truck, now, store.timeZone) }));
  const [worst] = standings.sort((a, b) => worstFirst.indexOf(a.standing.kind) - worstFirst.indexOf(b.standing.kind) || soonness(a.standing) - soonness(b.standing));
  if (!worst) return { key: 'no-freezers' };
  return sayStanding(worst.standing, worst.freezer, truck && { from: truck.from, to: truck.to }, store.deliveries[0]?.at ?? null);
}

/** Among alike standings the one that comes first. */
function soonness(standing: Standing): number {
  if ('runOut' in standing) return standing.runOut.likely;
  if (standing.kind === 'keeps') return standing.past === null ? Infinity : Date.parse(standing.past);
  return 0;
}

function sayStanding(standing: Standing, freezer: FreezerNow, truck: Window | null | undefined, lastDelivery: number | null): FullSaid {
  switch (standing.kind) {
    case 'no-sensor':
      return { key: 'no-sensor', lastDelivery };
    case 'waiting':
    case 'learning':
      return { key: standing.kind };
    case 'silent':
      return { key: 'silent', since: standing.since };
    case 'keeps':
      return { key: 'keeps', past: standing.past };
    case 'empty':
      return { key: 'empty', place: placeOf(freezer, standing.lane), truck };
    case 'perhaps-empty':
    case 'runs-out-first':
    case 'may-run-out-first':
    case 'runs-out':
    case 'truck-first':
    case 'runs-out-untold': {
      const key = standing.kind === 'runs-out-untold' ? 'runs-out' : standing.kind;
      return { key, place: placeOf(freezer, standing.runOut.lane), runOut: standing.runOut, truck };
    }
  }
}

const placeOf = ({ name, lanes }: FreezerNow, lane: number | null): Place => ({
  freezer: name,
  bagPounds: lane === null || lanes.length < 2 ? null : (lanes[lane]?.bagPounds ?? null),
});

function coldAnswer(freezers: FreezerNow[], now: number): ColdAnswer {
  const felt = freezers.flatMap(({ name, sensor, state }) =>
    sensor && state && state.airF !== null && state.airAt !== null ? [{ name, airF: state.airF, at: state.airAt, warmSince: state.warmSince }] : [],
  );
  const believed = felt.filter(({ at }) => freshnessOf(at, now) !== 'unusable').sort((a, b) => b.airF - a.airF);
  const [warmest] = believed;
  if (!warmest) return { value: null, said: nothingFelt(freezers, felt) };
  const heard = Math.min(...believed.map(({ at }) => at));
  const value = { airF: warmest.airF, at: warmest.at, freshness: freshnessOf(warmest.at, now) };
  const warm = believed.filter(({ warmSince }) => warmSince !== null);
  const [first] = warm;
  if (first && first.warmSince !== null)
    return { value: { airF: first.airF, at: first.at, freshness: freshnessOf(first.at, now) }, said: { key: 'warm', freezer: first.name, since: first.warmSince, others: warm.length - 1 } };
  if (warmest.airF > WARM_ABOVE_F) return { value, said: { key: 'above-once', freezer: warmest.name, heard: warmest.at } };
  const unknown = freezers.length - believed.length;
  const count = believed.length;
  return { value, said: unknown > 0 ? { key: 'holding-some', count, unknown, heard } : { key: 'holding', count, heard } };
}

function nothingFelt(freezers: FreezerNow[], felt: { at: number }[]): ColdSaid {
  if (freezers.length === 0) return { key: 'no-freezers' };
  if (felt.length > 0) return { key: 'silent', heard: Math.max(...felt.map(({ at }) => at)) };
  return { key: freezers.some(({ sensor }) => sensor) ? 'waiting' : 'no-sensor' };
}

function comingAnswer(store: StoreNow, now: number): ComingAnswer | null {
  const today = dayOf(now, store.timeZone);
  const truck = truckToCome(store);
  if (truck === undefined) return null;
  const next = truck && { day: truck.day, from: truck.from, to: truck.to, bags: bagsOf(truck.load) };
  const delivered = store.deliveries.find(({ at }) => dayOf(at, store.timeZone) === today);
  if (delivered) return { value: null, said: { key: 'delivered', at: delivered.at, bags: bagsOf(delivered.lines), next } };
  if (!next) return { value: null, said: { key: 'none', deliveryDays: store.deliveryDays } };
  const value = { day: next.day, from: next.from, to: next.to };
  const { bags } = next;
  if (next.day > today) return { value, said: { key: 'ahead', bags } };
  if (next.day < today) return { value: null, said: { key: 'missed', day: next.day } };
  if (now > next.to) return { value, said: { key: 'late', bags, dueBy: next.to, lateMs: now - next.to } };
  return { value, said: { key: now >= next.from ? 'in-window' : 'today', bags } };
}

const bagsOf = (lines: { bags: number }[]): number => lines.reduce((total, { bags }) => total + bags, 0);
