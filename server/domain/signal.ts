import type { Reading } from './types';

/** An instant outside the years 1970 to 9998 is no reading's. */
const END_OF_TIME = Date.UTC(9999, 0, 1);

/**
 * The readings of one freezer in order of time, each moment once. Two words about one moment merge by the cautious
 * value (larger distance, warmer air, weaker supply), so the result depends on the set of readings alone. What is no
 * number, and a distance that `possible` refuses, is as if the sensor had said nothing.
 */
export function orderedReadings(readings: Reading[], possible: (distanceIn: number | null) => number | null = (distanceIn) => distanceIn): Reading[] {
  const byTime = new Map<number, Reading>();
  for (const raw of readings) {
    if (!(raw.at >= 0 && raw.at < END_OF_TIME)) continue;
    const distancesIn = raw.distancesIn.map((distance) => possible(numberIn(distance)));
    const reading = { at: raw.at, distancesIn, airF: numberIn(raw.airF), supplyV: numberIn(raw.supplyV) };
    const known = byTime.get(raw.at);
    byTime.set(raw.at, known ? merged(known, reading) : reading);
  }
  return [...byTime.values()].sort((a, b) => a.at - b.at);
}

const numberIn = (value: number | null): number | null => (value !== null && Number.isFinite(value) ? value : null);

function merged(a: Reading, b: Reading): Reading {
  const length = Math.max(a.distancesIn.length, b.distancesIn.length);
  return {
    at: a.at,
    distancesIn: Array.from({ length }, (_, i) => pick(Math.max, a.distancesIn[i], b.distancesIn[i])),
    airF: pick(Math.max, a.airF, b.airF),
    supplyV: pick(Math.min, a.supplyV, b.supplyV),
  };
}

const pick = (choose: (a: number, b: number) => number, a: number | null | undefined, b: number | null | undefined): number | null =>
  a === null || a === undefined ? (b ?? null) : b === null || b === undefined ? a : choose(a, b);

/** Readings looked at on either side of one. */
const HALF_WINDOW = 3;
/** A normal sd from the median absolute deviation (Hampel 1974). */
const MAD_TO_SD = 1.4826;
const HAMPEL_SD = 3;
/** Below this (in) nothing is a spike: a leaning bag or the probe's own noise. */
const LEAST_SPIKE_IN = 1.5;
/** A probe that was heard within this many readings is still there. */
const CARRY_READINGS = 6;

/**
 * Distances by reading and probe with spikes out and short gaps carried over; null where a probe is dead.
 * Hampel's rule per probe over three readings on either side. At the young end, where fewer are known, jumps
 * of several probes at once are believed at once, up or down; a lone probe's waits for a second reading that says the same.
 */
export function cleanDistances(readings: Reading[], probes: number): (number | null)[][] {
  const raw = Array.from({ length: probes }, (_, p) => readings.map(({ distancesIn }) => distancesIn[p] ?? null));
  const odd = raw.map((series) => series.map((_, i) => standsOut(series, i)));
  const young = readings.length - HALF_WINDOW;
  const carried = raw.map((series, p) => {
    const believed = (value: number | null, i: number) => {
      if (!odd[p]?.[i]) return true;
      return i >= young && (odd.filter((flags) => flags[i]).length > 1 || isConfirmed(series, i, value));
    };
    return carryOver(series.map((value, i) => (believed(value, i) ? value : null)));
  });
  return readings.map((_, i) => carried.map((series) => series[i] ?? null));
}

/** The next word of the probe says the same. */
function isConfirmed(series: (number | null)[], i: number, value: number | null): boolean {
  const next = series.slice(i + 1).find((one) => one !== null);
  return value !== null && next !== undefined && next !== null && Math.abs(next - value) <= LEAST_SPIKE_IN;
}

/** Hampel's rule: far from the median of its neighbours, by their own spread. */
function standsOut(series: (number | null)[], i: number): boolean {
  const value = series[i];
  if (value === null || value === undefined) return false;
  const around: number[] = [];
  for (let j = Math.max(0, i - HALF_WINDOW); j <= i + HALF_WINDOW && j < series.length; j += 1) {
    const one = series[j];
    if (one !== null && one !== undefined) around.push(one);
  }
  // Most of the time nothing moves, and sorting is what this costs.
  if (around.length < 3 || Math.max(...around) - Math.min(...around) <= LEAST_SPIKE_IN) return false;
  const middle = median(around);
  const off = Math.abs(value - middle);
  if (off <= LEAST_SPIKE_IN) return false;
  return off > HAMPEL_SD * MAD_TO_SD * median(around.map((one) => Math.abs(one - middle)));
}

function carryOver(series: (number | null)[]): (number | null)[] {
  let last: number | null = null;
  let age = 0;
  return series.map((value) => {
    age = value === null ? age + 1 : 0;
    last = value ?? (age <= CARRY_READINGS ? last : null);
    return last;
  });
}

export function median(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? (sorted[middle] ?? NaN) : ((sorted[middle - 1] ?? NaN) + (sorted[middle] ?? NaN)) / 2;
}

/**
 * The non-increasing sequence nearest to `values` in weighted squares, by pooling adjacent violators.
 * Source: Barlow, Bartholomew, Bremner and Brunk, Statistical Inference under Order Restrictions (1972).
 */
export function isotonicNonIncreasing(values: number[], weights: number[] = values.map(() => 1)): number[] {
  const blocks: { mean: number; weight: number; count: number }[] = [];
  values.forEach((value, i) => {
    let block = { mean: value, weight: weights[i] ?? 1, count: 1 };
    for (let before = blocks.at(-1); before && before.mean < block.mean; before = blocks.at(-1)) {
      blocks.pop();
      const weight = before.weight + block.weight;
      block = { mean: (before.mean * before.weight + block.mean * block.weight) / weight, weight, count: before.count + block.count };
    }
    blocks.push(block);
  });
  return blocks.flatMap(({ mean, count }) => Array<number>(count).fill(mean));
}
