import { priorPoundsPerInch, usableStackIn } from '../domain/level';
import type { FreezerSetup } from '../domain/types';
import type { Random } from './random';

/** A freezer as it really is, of which its sensor sees only some. */
export interface SimulatedFreezer {
  setup: FreezerSetup;
  /** Pounds sold on a plain day, by lane. */
  dailyPounds: number[];
  defrosts: boolean;
  outdoor: boolean;
}

/** Null while its compressor runs, or the time it stopped. */
export type Failing = SimulatedFreezer & { brokeAt: number | null };

export interface Truth {
  pounds: number[];
  /** How far the bags under each probe stand above or below their lane, in inches. */
  tops: number[];
}

export interface Seen {
  distancesIn: (number | null)[];
  airF: number;
  supplyV: number;
}

/** What a half hour is like at the store. */
export interface Moment {
  at: number;
  /** Local hour with its fraction, and ISO weekday. */
  hour: number;
  weekday: number;
  open: boolean;
}

/** Share of a plain day's sales by local hour; common practice, no published source. */
const PROFILE = [0, 0, 0, 0, 0, 1, 2, 4, 5, 5, 6, 7, 7, 7, 8, 8, 9, 9, 8, 6, 4, 2, 1, 1];
const PROFILE_SUM = PROFILE.reduce((sum, share) => sum + share, 0);
const WEEKDAY = [0.85, 0.85, 0.9, 1, 1.25, 1.35, 1.1];
const NOISE_IN = 0.3;
const TOPS_SD_IN = 0.6;

export const stocked = ({ setup, dailyPounds }: SimulatedFreezer, random: Random): Truth => ({
  pounds: dailyPounds.map((_, lane) => wholeBags(setup, lane, capacityOf(setup, lane) * random.between(0.3, 0.95))),
  tops: setup.mount.probesIn.map(() => random.normal(TOPS_SD_IN)),
});

export const capacityOf = (setup: FreezerSetup, lane: number): number => laneOf(setup, lane, (one) => priorPoundsPerInch(setup, one) * usableStackIn(setup));

const laneOf = <T>(setup: FreezerSetup, lane: number, take: (lane: FreezerSetup['lanes'][number]) => T): T => {
  const one = setup.lanes[lane];
  if (!one) throw new Error(`there is no lane ${lane}`);
  return take(one);
};

const wholeBags = (setup: FreezerSetup, lane: number, pounds: number): number =>
  laneOf(setup, lane, ({ bagPounds }) => Math.floor(pounds / bagPounds) * bagPounds);

/** Half an hour of selling: whole bags leave, and the tops shift a little. */
export function sell({ setup, dailyPounds }: SimulatedFreezer, truth: Truth, { hour, weekday, open }: Moment, random: Random): Truth {
  const share = open ? ((PROFILE[Math.floor(hour)] ?? 0) / PROFILE_SUM / 2) * (WEEKDAY[weekday - 1] ?? 1) : 0;
  const pounds = truth.pounds.map((left, lane) => {
    const bag = laneOf(setup, lane, ({ bagPounds }) => bagPounds);
    return Math.max(0, left - random.poisson(((dailyPounds[lane] ?? 0) * share) / bag) * bag);
  });
  return { pounds, tops: truth.tops.map((top) => top * 0.995 + random.normal(TOPS_SD_IN * 0.1)) };
}

/** The truck fills each lane to about nine tenths, but has no bags of the missing size; answers the bags brought, by lane. */
export function refill({ setup }: SimulatedFreezer, truth: Truth, random: Random, missing: number | null): { truth: Truth; bags: number[] } {
  const bags = truth.pounds.map((left, lane) => {
    const room = capacityOf(setup, lane) * random.between(0.86, 0.98) - left;
    return laneOf(setup, lane, ({ bagPounds }) => (bagPounds === missing ? 0 : Math.max(0, Math.floor(room / bagPounds))));
  });
  const pounds = truth.pounds.map((left, lane) => left + (bags[lane] ?? 0) * laneOf(setup, lane, ({ bagPounds }) => bagPounds));
  return { truth: { pounds, tops: truth.tops.map(() => random.normal(TOPS_SD_IN)) }, bags };
}

/** Few bags lie flat. */
const EVEN_UP_TO_IN = 6;

/** What the sensor says of it: uneven tops, probe noise, an arm or an open door now and then, a word that got lost. */
export function sense(freezer: Failing, truth: Truth, moment: Moment, random: Random): Seen {
  const { setup } = freezer;
  const { insideHeightIn, insideWidthIn } = setup.model;
  const floor = insideHeightIn - setup.mount.channelDropIn - setup.mount.rackIn;
  const distancesIn = setup.mount.probesIn.map((x, probe) => {
    const stack = Math.max(...lanesUnder(setup, x / insideWidthIn).map((lane) => (truth.pounds[lane] ?? 0) / laneOf(setup, lane, (one) => priorPoundsPerInch(setup, one))));
    if (random.chance(0.004)) return null;
    if (moment.open && random.chance(0.004)) return random.between(2, 9);
    const uneven = (truth.tops[probe] ?? 0) * Math.min(1, stack / EVEN_UP_TO_IN);
    return Math.min(floor + 0.5, Math.max(0.4, floor - stack - uneven + random.normal(NOISE_IN)));
  });
  return { distancesIn, airF: airOf(freezer, truth, moment, random), supplyV: 11.9 + random.normal(0.06) };
}

const BOUNDARY = 0.03;
/** The lanes a probe at this share of the width looks at: two near a boundary. */
function lanesUnder({ lanes }: FreezerSetup, at: number): number[] {
  let left = 0;
  return lanes.flatMap(({ widthShare }, lane) => {
    const [from, to] = [left, left + widthShare];
    left = to;
    return at >= from - (lane > 0 ? BOUNDARY : 1) && at <= to + (lane < lanes.length - 1 ? BOUNDARY : 1) ? [lane] : [];
  });
}

const SET_F = 17;
/** Hours until a dead freezer's air is most of the way to where it settles. */
const WARMING_HOURS = 2;

/** The compressor's cycle, defrosts and doors; without it, up to a little above melting ice, or the surroundings once all is gone. */
function airOf({ defrosts, outdoor, brokeAt }: Failing, { pounds }: Truth, { at, hour, open }: Moment, random: Random): number {
  const cycle = 1.4 * Math.sin((at / 3_600_000) * 2 * Math.PI * 1.7);
  const defrost = defrosts && hour % 8 < 0.5 ? 9 : 0;
  const door = open && random.chance(0.06) ? random.between(2, 7) : 0;
  const running = SET_F + cycle + defrost + door + random.normal(0.4);
  if (brokeAt === null || at < brokeAt) return running;
  const ambient = outdoor ? 78 : 72;
  const settles = pounds.some((left) => left > 0) ? 32 + 0.15 * (ambient - 32) : ambient;
  return settles - (settles - SET_F) * Math.exp(-(at - brokeAt) / (WARMING_HOURS * 3_600_000)) + random.normal(0.3);
}
