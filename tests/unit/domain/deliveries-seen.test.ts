import { describe, expect, test } from 'vitest';
import { foldReadings } from '../../../server/domain/freezer-state';
import type { FreezerSetup, Reading } from '../../../server/domain/types';

const HALF_HOUR = 1_800_000;
/** Midnight in Chicago. */
const start = Date.UTC(2026, 5, 1, 5);
/** 20 lb an inch over the whole width; the floor is 44.5 in below the probes. */
const oneLane: FreezerSetup = {
  model: { insideWidthIn: 58, insideDepthIn: 27, insideHeightIn: 48, ratedPounds: 830 },
  mount: { channelDropIn: 1.5, rackIn: 2, headroomIn: 3, probesIn: [10, 29, 48] },
  lanes: [{ productId: 'ten', widthShare: 1, bagPounds: 10 }],
};
const twoLanes: FreezerSetup = {
  ...oneLane,
  lanes: [
    { productId: 'seven', widthShare: 0.5, bagPounds: 7 },
    { productId: 'twenty', widthShare: 0.5, bagPounds: 20 },
  ],
};
type Distances = (number | null)[];
const fold = (setup: FreezerSetup, distances: Distances[]) => {
  const readings = distances.map((distancesIn, i): Reading => ({ at: start + i * HALF_HOUR, distancesIn, airF: 18, supplyV: 12 }));
  const state = foldReadings({ setup, timeZone: 'America/Chicago', readings })?.state;
  if (!state) throw new Error('no state');
  return { ...state, seenAt: state.deliveries.map(({ at }) => (at - start) / HALF_HOUR), soldADay: state.rates.map(({ poundsPerDay }) => poundsPerDay) };
};
const times = (count: number, distances: Distances): Distances[] => Array.from({ length: count }, () => distances);
const before = times(40, [30, 30, 30]);

describe('a delivery is seen', () => {
  test('at its first reading where several probes rise together', () => {
    for (const count of [1, 2, 3, 10]) {
      const state = fold(twoLanes, [...before, ...times(count, [10, 10, 20])]);
      expect(state.seenAt).toEqual([40]);
      // 10 lb an inch in each lane: 20 in and 10 in.
      expect(state.deliveries[0]?.pounds[0]).toBeCloseTo(200, 6);
      expect(state.deliveries[0]?.pounds[1]).toBeCloseTo(100, 6);
    }
  });

  test('by a lone probe once a second reading says the same, and from its first', () => {
    expect(fold(twoLanes, [...before, [10, 30, 30]]).seenAt).toEqual([]);
    expect(fold(twoLanes, [...before, [10, 30, 30]]).level.lanes[0]?.stackIn).toBe(14.5);
    for (const count of [2, 3, 4, 10]) expect(fold(twoLanes, [...before, ...times(count, [10, 30, 30])]).seenAt).toEqual([40]);
  });

  test('once, where a truck fills in two goes', () => {
    const state = fold(twoLanes, [...before, ...times(2, [20, 25, 30]), ...times(6, [10, 15, 20])]);
    expect(state.seenAt).toEqual([40]);
    expect(state.deliveries[0]?.pounds.map(Math.round)).toEqual([200, 100]);
  });
});

describe('no delivery is seen', () => {
  test('in a spike, of one probe or of all', () => {
    expect(fold(twoLanes, [...before, [6, 30, 30], ...times(6, [30, 30, 30])]).seenAt).toEqual([]);
    expect(fold(twoLanes, [...before, [6, 6, 6], ...times(6, [30, 30, 30])]).seenAt).toEqual([]);
    expect(fold(twoLanes, [...before, [6, 6, 6], [30, 30, 30]]).seenAt).toEqual([]);
  });

  test('in a restacked bag or two', () => {
    expect(fold(twoLanes, [...before, ...times(6, [28, 30, 30])]).seenAt).toEqual([]);
  });

  test('in noise, of which nothing much is sold either', () => {
    let seed = 7;
    const uniform = () => (seed = (seed * 48_271) % 2_147_483_647) / 2_147_483_647;
    const noise = () => 0.3 * Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
    for (let n = 0; n < 20; n += 1) {
      const state = fold(twoLanes, Array.from({ length: 8 * 48 }, () => [20 + noise(), 20 + noise(), 20 + noise()]));
      expect(state.seenAt).toEqual([]);
      // Of 245 lb in each lane.
      expect(Math.max(...state.soldADay)).toBeLessThan(1.5);
    }
  });

  test('nor a sale, in impossible words between good ones', () => {
    const state = fold(twoLanes, Array.from({ length: 60 }, (_, i) => [14.5, 24.5, [34.5, 900, -3][i % 3] ?? null]));
    expect(state.seenAt).toEqual([]);
    expect(state.soldADay).toEqual([0, 0]);
    expect(state.distancesIn).toEqual([14.5, 24.5, 34.5]);
  });
});

describe('a probe that falls silent or comes back moves no ice', () => {
  const silent = (right: number): Distances[] => [...times(100, [14.5, 24.5, right]), ...times(50, [14.5, 24.5, null]), ...times(186, [14.5, 24.5, right])];

  test('in a lane with others', () => {
    const state = fold(oneLane, silent(34.5));
    expect(state.seenAt).toEqual([]);
    expect(state.soldADay).toEqual([0]);
  });

  test('in a lane without', () => {
    const state = fold(twoLanes, silent(40));
    expect(state.seenAt).toEqual([]);
    expect(state.soldADay).toEqual([0, 0]);
  });

  test('and hides no delivery that the others see, then or before', () => {
    const truck = [...times(100, [30, 30, 30]), ...times(50, [14.5, 14.5, null]), ...times(20, [14.5, 14.5, 14.5])];
    expect(fold(oneLane, truck).seenAt).toEqual([100]);
    const deadNow = [...times(100, [30, 30, 40]), ...times(100, [30, 30, 15]), ...times(20, [30, 30, null])];
    expect(fold(twoLanes, deadNow).seenAt).toEqual([100]);
  });
});
