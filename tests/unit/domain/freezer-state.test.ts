import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { foldReadings } from '../../../server/domain/freezer-state';
import type { FreezerSetup, Reading } from '../../../server/domain/types';

const HALF_HOUR = 1_800_000;
const DAY = 86_400_000;
const timeZone = 'America/Chicago';
/** Midnight in Chicago. */
const start = Date.UTC(2026, 5, 1, 5);
const setup: FreezerSetup = {
  model: { insideWidthIn: 58, insideDepthIn: 27, insideHeightIn: 48, ratedPounds: 830 },
  mount: { channelDropIn: 1.5, rackIn: 2, headroomIn: 3, probesIn: [10, 29, 48] },
  lanes: [
    { productId: 'seven', widthShare: 0.5, bagPounds: 7 },
    { productId: 'twenty', widthShare: 0.5, bagPounds: 20 },
  ],
};
/** 10 lb an inch in each lane; the floor is 44.5 in below the probes. */
const reading = (i: number, seven: number, twenty: number, airF: number | null = 18): Reading => ({
  at: start + i * HALF_HOUR,
  distancesIn: [44.5 - seven / 10, 44.5 - Math.max(seven, twenty) / 10, 44.5 - twenty / 10],
  airF,
  supplyV: 11.9,
});
/** Eight days of steady sales, 48 and 24 lb a day, and a truck after six that fills both lanes. */
const days = Array.from({ length: 8 * 48 }, (_, i) => {
  const truck = i >= 6 * 48 + 20;
  const since = truck ? i - (6 * 48 + 20) : i;
  return reading(i, (truck ? 400 : 390) - since, (truck ? 400 : 380) - since / 2);
});
const fold = (readings: Reading[]) => foldReadings({ setup, timeZone, readings })?.state ?? null;

describe('the state of a freezer', () => {
  test('one reading: its level, and nothing claimed that takes days', () => {
    const state = fold([reading(0, 300, 200)]);
    expect(state?.level.lanes.map(({ bags }) => bags)).toEqual([42, 10]);
    expect(state?.level.pounds).toBeCloseTo(500, 6);
    expect(state?.runOut).toEqual({ early: null, likely: null, late: null, lane: null });
    expect(state?.warmSince).toBeNull();
  });

  test('a week: rates, the truck, and the first lane to run out', () => {
    const state = fold(days);
    expect(state?.deliveries).toHaveLength(1);
    const [truck] = state?.deliveries ?? [];
    expect(truck?.at).toBe(start + (6 * 48 + 20) * HALF_HOUR);
    expect(state?.rates[0]?.poundsPerDay).toBeCloseTo(47.4, 0);
    expect(state?.rates[1]?.poundsPerDay).toBeCloseTo(23.7, 0);
    expect(state?.rates[0]?.days).toBe(7);
    expect(state?.runOut.lane).toBe(0);
    const left = state?.level.lanes[0]?.pounds ?? 0;
    expect(((state?.runOut.likely ?? 0) - (state?.at ?? 0)) / DAY).toBeCloseTo(left / 47.4, 0);
  });

  test('the ribbon’s past keeps the truck’s step whole', () => {
    const state = fold(days);
    const at = state?.deliveries[0]?.at ?? 0;
    const around = (state?.history ?? []).filter(([instant]) => Math.abs(instant - at) <= HALF_HOUR).map(([, share]) => share);
    expect(Math.max(...around) - Math.min(...around)).toBeGreaterThan(0.4);
  });

  /** A pool of few times, so that moments contradict each other; spikes, silence, and what is no number. */
  const value = fc.oneof(fc.double({ min: 0, max: 60, noNaN: true }), fc.constantFrom(10, 12, 30, null), fc.double());
  const anyReading = fc.record({
    at: fc.oneof(
      fc.integer({ min: 0, max: 60 }).map((i) => start + i * HALF_HOUR),
      fc.integer({ min: start, max: start + 9 * DAY }),
      fc.constantFrom(Number.NaN, -1, 1e300, 0, Date.UTC(2200, 0, 1)),
    ),
    distancesIn: fc.array(value, { maxLength: 5 }),
    airF: fc.oneof(fc.double({ min: -100, max: 200, noNaN: true }), fc.constantFrom(null, Number.NaN)),
    supplyV: value,
  });

  test('it depends on the set of readings alone: a week, any order, any repeats', () => {
    const some = days.slice(-100);
    const expected = fold(some);
    fc.assert(
      fc.property(fc.shuffledSubarray([...some, ...some.slice(0, 40)], { minLength: 140, maxLength: 140 }), (shuffled) => {
        expect(fold(shuffled)).toEqual(expected);
      }),
      { numRuns: 40 },
    );
  });

  test('it depends on the set of readings alone: contradictions, spikes and rubbish', () => {
    const told = fc.array(anyReading, { maxLength: 40 }).chain((list) => {
      const length = list.length * 2;
      return fc.tuple(fc.constant(list), fc.shuffledSubarray([...list, ...list], { minLength: length, maxLength: length }));
    });
    fc.assert(
      fc.property(told, ([list, shuffled]) => {
        expect(fold(shuffled)).toEqual(fold(list));
      }),
    );
  });

  const isSound = (found: unknown): boolean =>
    typeof found === 'number' ? Number.isFinite(found) : found === null || typeof found !== 'object' || Object.values(found).every(isSound);

  test('any readings in any freezer: no crash, every number finite', () => {
    const size = fc.oneof(fc.double({ min: 1, max: 100, noNaN: true }), fc.constantFrom(0, -1, Number.NaN, Infinity));
    const usual = fc.double({ min: 20, max: 60, noNaN: true });
    const drop = fc.oneof({ weight: 9, arbitrary: fc.double({ min: 0, max: 5, noNaN: true }) }, { weight: 1, arbitrary: size });
    const length = fc.oneof({ weight: 9, arbitrary: usual }, { weight: 1, arbitrary: size });
    const anySetup: fc.Arbitrary<FreezerSetup> = fc.record({
      model: fc.record({ insideWidthIn: length, insideDepthIn: length, insideHeightIn: length, ratedPounds: length }),
      mount: fc.record({ channelDropIn: drop, rackIn: drop, headroomIn: drop, probesIn: fc.array(drop, { maxLength: 4 }) }),
      lanes: fc.integer({ min: 0, max: 4 }).chain((count) =>
        fc.array(fc.record({ productId: fc.constant('ice'), widthShare: fc.constant(1 / count), bagPounds: length }), { minLength: count, maxLength: count }),
      ),
    });
    let known = 0;
    fc.assert(
      fc.property(anySetup, fc.array(anyReading, { maxLength: 60 }), (given, readings) => {
        const state = foldReadings({ setup: given, timeZone, readings })?.state ?? null;
        if (state) known += 1;
        expect(isSound(state)).toBe(true);
      }),
      { numRuns: 300 },
    );
    expect(known).toBeGreaterThan(30);
  });

  test('no readings, and readings without a live probe, are no state', () => {
    expect(fold([])).toBeNull();
    expect(fold([{ at: start, distancesIn: [null, -4, 900], airF: 18, supplyV: 12 }])).toBeNull();
  });

  test('the air goes on being heard when every probe is dead', () => {
    const silent = Array.from({ length: 20 }, (_, i) => ({ at: start + (i + 1) * HALF_HOUR, distancesIn: [null, null, null], airF: 20 + i, supplyV: null }));
    const state = fold([reading(0, 300, 200), ...silent]);
    // The level is as old as the last word of a probe.
    expect(state?.at).toBe(start);
    expect(state).toMatchObject({ airF: 39, airAt: start + 20 * HALF_HOUR, warmSince: start + 14 * HALF_HOUR, supplyV: 11.9 });
  });

  test('a setup that cannot be gives no state', () => {
    expect(foldReadings({ setup: { ...setup, lanes: [] }, timeZone, readings: days })).toBeNull();
  });
});
