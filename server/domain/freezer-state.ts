import { midnights } from './civil';
import { coolingOf } from './cooling';
import { deliveriesSeen, type DeliverySeen } from './deliveries-seen';
import { laneViews, levelOf, poundsReader, PRIOR_K_SD, priorPoundsPerInch, setupFaults, stackSdIn } from './level';
import { firstLane, plainRunOut } from './run-out';
import { dailyRate, salesBetween, salesByDay, type DailyRate } from './sales';
import { cleanDistances, orderedReadings } from './signal';
import type { FreezerSetup, Level, Reading, RunOut } from './types';

const HOUR_MS = 3_600_000;
const DAY_MS = 24 * HOUR_MS;
/** How much of the past the ribbon shows. */
const HISTORY_MS = 4 * DAY_MS;
/** The plain run-out looks at the last seven whole days. */
const RATE_DAYS = 7;
/** A day counts when the readings reach within this of both its ends. */
const WHOLE_DAY_SLACK_MS = 2 * HOUR_MS;

/** What the readings of one freezer mean now. Times in milliseconds, pounds, °F; lists follow lanes or probes. */
export interface FreezerState {
  /** The last reading with a live probe. */
  at: number;
  level: Level;
  distancesIn: (number | null)[];
  airF: number | null;
  airAt: number | null;
  warmSince: number | null;
  supplyV: number | null;
  /** The first lane to run out, which `lane` names. */
  runOut: RunOut & { lane: number | null };
  laneRunOuts: RunOut[];
  rates: DailyRate[];
  deliveries: DeliverySeen[];
  /** Instant and share of full, about hourly. */
  history: [number, number][];
}

export interface FoldInput {
  setup: FreezerSetup;
  timeZone: string;
  /** About the last eight days, in any order, with any repeats. */
  readings: Reading[];
  /** One sd of pounds per inch, as a share. */
  kSdShare?: number;
}

/**
 * Works out the current state from a set of readings. It depends on the set alone: order and repeats do not matter.
 * Null when the setup cannot be, or no probe has told anything.
 */
export function foldState({ setup, timeZone, readings, kSdShare = PRIOR_K_SD }: FoldInput): FreezerState | null {
  if (setupFaults(setup).length > 0) return null;
  const ordered = orderedReadings(readings);
  const distances = cleanDistances(ordered, setup.mount.probesIn.length);
  const read = poundsReader(setup);
  const told = ordered.flatMap(({ at }, i) => {
    const distancesIn = distances[i] ?? [];
    const pounds = read(distancesIn);
    return pounds ? [{ at, pounds, distancesIn }] : [];
  });
  const last = told.at(-1);
  const level = last && levelOf(setup, last.distancesIn, kSdShare);
  if (!last || !level) return null;

  const at = told.map((one) => one.at);
  const pounds = told.map((one) => one.pounds);
  const sd = stackSdPounds(setup, last.distancesIn);
  const { seen, starts } = deliveriesSeen(at, pounds, sd);
  const rates = setup.lanes.map(({ bagPounds }, lane) => rateOf(at, pounds.map((lanes) => lanes[lane] ?? 0), starts, timeZone, bagPounds));
  const laneRunOuts = setup.lanes.map((_, i) => plainRunOut(last.pounds[i] ?? 0, sd[i] ?? 0, rates[i] ?? NO_RATE, last.at));
  const lane = firstLane(laneRunOuts);
  return {
    at: last.at,
    level,
    distancesIn: last.distancesIn,
    ...coolingOf(ordered),
    supplyV: ordered.findLast(({ supplyV }) => supplyV !== null)?.supplyV ?? null,
    runOut: { ...(lane === null ? NEVER : (laneRunOuts[lane] ?? NEVER)), lane },
    laneRunOuts,
    rates,
    deliveries: seen,
    history: historyOf(at, pounds.map((lanes) => total(lanes) / level.capacityPounds), starts),
  };
}

const NO_RATE: DailyRate = { poundsPerDay: 0, sdPounds: 0, days: 0 };
const NEVER: RunOut = { early: null, likely: null, late: null };

/** One sd of each lane's pounds from its stack alone. */
function stackSdPounds(setup: FreezerSetup, distancesIn: (number | null)[]): number[] {
  const views = laneViews(setup, setup.mount.probesIn.map((_, i) => typeof distancesIn[i] === 'number'));
  return setup.lanes.map((lane, i) => priorPoundsPerInch(setup, lane) * stackSdIn(setup, lane, views[i] ?? { weights: [], borrowed: true }));
}

function rateOf(at: number[], pounds: number[], starts: number[], timeZone: string, bagPounds: number): DailyRate {
  const first = at[0] ?? 0;
  const last = at.at(-1) ?? 0;
  const starting = midnights(first, last, timeZone);
  const days = salesByDay(at, salesBetween(pounds, starts), starting);
  const whole = days.filter((_, day) => {
    const from = starting[day] ?? 0;
    const to = starting[day + 1] ?? 0;
    return first <= from + WHOLE_DAY_SLACK_MS && last >= to - WHOLE_DAY_SLACK_MS;
  });
  return dailyRate(whole.slice(-RATE_DAYS), bagPounds);
}

/** The last reading of each hour, and both sides of every delivery's step. */
function historyOf(at: number[], shares: number[], starts: number[]): [number, number][] {
  const last = at.at(-1) ?? 0;
  const steps = new Set(starts.flatMap((i) => [i - 1, i]));
  return at.flatMap((instant, i): [number, number][] => {
    const next = at[i + 1];
    const closesHour = next === undefined || Math.floor(next / HOUR_MS) !== Math.floor(instant / HOUR_MS);
    const shown = instant > last - HISTORY_MS && (closesHour || steps.has(i));
    return shown ? [[instant, Math.round((shares[i] ?? 0) * 10_000) / 10_000]] : [];
  });
}

const total = (values: number[]): number => values.reduce((sum, value) => sum + value, 0);
