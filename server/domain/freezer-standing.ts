import { addDays, dayOf } from './civil';
import { freshnessOf } from './freshness';
import type { RunOut } from './types';

/** Beyond this many days a run-out is said as "keeps past", without a part of the day. */
const keepsAfterDays = 5;

/** What is known of one freezer; the current-state row and a little of its setup. */
export interface FreezerNow {
  id: string;
  name: string;
  sensor: object | null;
  lanes: { bagPounds: number }[];
  state: null | {
    at: number;
    level: { pounds: number; sdPounds: number; capacityPounds: number; lanes: { bags: number }[] };
    airF: number | null;
    airAt: number | null;
    warmSince: number | null;
    laneRunOuts: RunOut[];
    rates: { days: number }[];
  };
}

export interface Window {
  from: number;
  to: number;
}

/** A run-out worth a sentence: its lane, and its likely time within the horizon. */
export interface LaneRunOut extends RunOut {
  lane: number;
  likely: number;
}

/** How a freezer's ice stands against the truck that is still to come. */
export type Standing =
  | { kind: 'no-sensor' }
  | { kind: 'waiting' }
  | { kind: 'silent'; since: number }
  /** `lane` is null where the whole freezer is empty. */
  | { kind: 'empty'; lane: number | null }
  | { kind: 'perhaps-empty'; runOut: LaneRunOut }
  | { kind: 'runs-out-first'; runOut: LaneRunOut }
  | { kind: 'may-run-out-first'; runOut: LaneRunOut }
  | { kind: 'truck-first'; runOut: LaneRunOut }
  /** No truck comes before. */
  | { kind: 'runs-out'; runOut: LaneRunOut }
  /** Whether a truck comes before is not told to whoever reads. */
  | { kind: 'runs-out-untold'; runOut: LaneRunOut }
  /** `past` is the last local day with ice on it, null where it keeps beyond the horizon. */
  | { kind: 'keeps'; past: string | null }
  | { kind: 'learning' };

/**
 * Where a freezer stands at `now`, for a store in `zone` whose next truck comes in `truck`: null where none is set,
 * undefined where whoever reads is not told of trucks.
 * A truck past its window is no promise: nobody knows when it comes.
 */
export function standingOf(freezer: FreezerNow, truck: Window | null | undefined, now: number, zone: string): Standing {
  const { state } = freezer;
  if (!freezer.sensor) return { kind: 'no-sensor' };
  if (!state) return { kind: 'waiting' };
  if (freshnessOf(state.at, now) === 'unusable') return { kind: 'silent', since: state.at };
  const empty = state.level.lanes.flatMap(({ bags }, lane) => (bags === 0 ? [lane] : []));
  if (empty[0] !== undefined) return { kind: 'empty', lane: empty.length === state.level.lanes.length ? null : empty[0] };
  if (state.rates.every(({ days }) => days === 0)) return { kind: 'learning' };
  return againstTruck(firstRunOut(state.laneRunOuts), truck, now, zone);
}

/** The lane that runs out first, by its likely time; null where none does within the horizon. */
function firstRunOut(runOuts: RunOut[]): LaneRunOut | null {
  const dated = runOuts.flatMap(({ early, likely, late }, lane) => (likely === null ? [] : [{ early, likely, late, lane }]));
  return dated.reduce<LaneRunOut | null>((first, one) => (first && first.likely <= one.likely ? first : one), null);
}

function againstTruck(runOut: LaneRunOut | null, truck: Window | null | undefined, now: number, zone: string): Standing {
  if (!runOut) return { kind: 'keeps', past: null };
  if (runOut.likely <= now) return { kind: 'perhaps-empty', runOut };
  const soonest = runOut.early ?? runOut.likely;
  const arrival = truck && truck.to >= now ? truck.to : null;
  if (arrival && runOut.likely < arrival) return { kind: 'runs-out-first', runOut };
  if (arrival && soonest < arrival) return { kind: 'may-run-out-first', runOut };
  const past = addDays(dayOf(soonest, zone), -1);
  if (past >= addDays(dayOf(now, zone), keepsAfterDays)) return { kind: 'keeps', past };
  if (truck === undefined) return { kind: 'runs-out-untold', runOut };
  return { kind: arrival ? 'truck-first' : 'runs-out', runOut };
}
