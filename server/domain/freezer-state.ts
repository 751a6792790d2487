import { midnights } from './civil';
import { coolingOf } from './cooling';
import { freezerDays, type FreezerDay } from './freezer-days';
import { deliveriesSeen, type DeliverySeen } from './deliveries-seen';
import { laneReader, type LaneReader, type Told } from './lane-reader';
import { levelOf, possibleDistance, PRIOR_K_SD, probeStacks, setupFaults } from './level';
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

/** What a set of readings means: the state at its end, and its local days. */
export interface Folded {
  state: FreezerState;
  days: FreezerDay[];
}

/**
 * Works out the current state from a set of readings. It depends on the set alone: order and repeats do not matter.
 * Null when the setup cannot be, or no probe has told anything.
 */
export function foldReadings({ setup, timeZone, readings, kSdShare = PRIOR_K_SD }: FoldInput): Folded | null {
  if (setupFaults(setup).length > 0) return null;
  const ordered = orderedReadings(readings, (distanceIn) => possibleDistance(setup, distanceIn));
  const reader = laneReader(setup);
  const told = tellings(setup, ordered, reader);
  const last = told.at(-1);
  const level = last && levelOf(setup, last.distancesIn, kSdShare);
  if (!last || !level) return null;

  const { seen, starts } = deliveriesSeen(told, reader);
  const rates = ratesOf(setup, told, starts, timeZone);
  const { sdPounds } = reader.read(last.stacks);
  // Less than a bag is nothing to sell.
  const left = level.lanes.map(({ bags, pounds }) => (bags === 0 ? 0 : pounds));
  const laneRunOuts = setup.lanes.map((_, i) => plainRunOut(left[i] ?? 0, sdPounds[i] ?? 0, rates[i] ?? NO_RATE, last.at));
  const lane = firstLane(laneRunOuts);
  const state = {
    at: last.at,
    level,
    distancesIn: last.distancesIn,
    ...coolingOf(ordered),
    supplyV: ordered.findLast(({ supplyV }) => supplyV !== null)?.supplyV ?? null,
    runOut: { ...(lane === null ? NEVER : (laneRunOuts[lane] ?? NEVER)), lane },
    laneRunOuts,
    rates,
    deliveries: seen,
    history: historyOf(told, level.capacityPounds, starts),
  };
  return { state, days: freezerDays(told, ordered, setup.lanes.map(({ bagPounds }) => bagPounds), timeZone) };
}

const NO_RATE: DailyRate = { poundsPerDay: 0, sdPounds: 0, days: 0 };
const NEVER: RunOut = { early: null, likely: null, late: null };

/** The readings in which any probe spoke, spikes out and short gaps of single probes filled. */
function tellings(setup: FreezerSetup, ordered: Reading[], reader: LaneReader): Told[] {
  const { probesIn } = setup.mount;
  const spoken = ordered.filter(({ distancesIn }) => probesIn.some((_, probe) => typeof distancesIn[probe] === 'number'));
  const distances = cleanDistances(spoken, probesIn.length);
  return spoken.flatMap(({ at }, i) => {
    const distancesIn = distances[i] ?? [];
    const stacks = probeStacks(setup, distancesIn);
    if (stacks.every((stack) => stack === null)) return [];
    const { live, pounds } = reader.read(stacks);
    return [{ at, distancesIn, stacks, live, pounds }];
  });
}

/** Each lane's rate from its last whole days. Across a change of live probes nothing is counted as sold. */
function ratesOf({ lanes }: FreezerSetup, told: Told[], deliveries: number[], timeZone: string): DailyRate[] {
  const at = told.map((one) => one.at);
  const first = at[0] ?? 0;
  const last = at.at(-1) ?? 0;
  const starting = midnights(Math.max(first, last - (RATE_DAYS + 2) * DAY_MS), last, timeZone);
  const whole = starting.slice(1).map((to, day) => first <= (starting[day] ?? 0) + WHOLE_DAY_SLACK_MS && last >= to - WHOLE_DAY_SLACK_MS);
  const delivered = new Set(deliveries);
  const breaks = told.flatMap(({ live }, i) => (i > 0 && (delivered.has(i) || live !== told[i - 1]?.live) ? [i] : []));
  return lanes.map(({ bagPounds }, lane) => {
    const sales = salesBetween(told.map(({ pounds }) => pounds[lane] ?? 0), breaks);
    const days = salesByDay(at, sales, starting).filter((_, day) => whole[day]);
    return dailyRate(days.slice(-RATE_DAYS), bagPounds);
  });
}

/** The last reading of each hour, and both sides of every delivery's step. */
function historyOf(told: Told[], capacityPounds: number, starts: number[]): [number, number][] {
  const last = told.at(-1)?.at ?? 0;
  const steps = new Set(starts.flatMap((i) => [i - 1, i]));
  return told.flatMap(({ at, pounds }, i): [number, number][] => {
    const next = told[i + 1];
    const closesHour = !next || Math.floor(next.at / HOUR_MS) !== Math.floor(at / HOUR_MS);
    const shown = at > last - HISTORY_MS && (closesHour || steps.has(i));
    return shown ? [[at, Math.round((total(pounds) / capacityPounds) * 10_000) / 10_000]] : [];
  });
}

const total = (values: number[]): number => values.reduce((sum, value) => sum + value, 0);
