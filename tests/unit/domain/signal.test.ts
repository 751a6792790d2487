import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { instantOf, midnights } from '../../../server/domain/civil';
import { cleanDistances, isotonicNonIncreasing, median, orderedReadings } from '../../../server/domain/signal';
import { dailyRate, salesBetween, salesByDay } from '../../../server/domain/sales';

const HALF_HOUR = 1_800_000;
const reading = (i: number, distancesIn: (number | null)[]) => ({ at: i * HALF_HOUR, distancesIn, airF: null, supplyV: null });
const probe = (values: (number | null)[]) => cleanDistances(values.map((value, i) => reading(i, [value, 20])), 2).map((one) => one[0]);

describe('spikes', () => {
  test('an open door or an arm for one reading is out, and the value before it is carried', () => {
    expect(probe([20, 20.1, 20.2, 6, 20.3, 20.4, 20.5])).toEqual([20, 20.1, 20.2, 20.2, 20.3, 20.4, 20.5]);
  });

  test('a bag that goes from under a probe is a lasting step and stays', () => {
    expect(probe([20, 20, 20, 24, 24, 24, 24])).toEqual([20, 20, 20, 24, 24, 24, 24]);
  });

  test('the youngest reading of a lone probe waits for a second one', () => {
    expect(probe([20, 20, 20, 20, 6])).toEqual([20, 20, 20, 20, 20]);
    expect(probe([20, 20, 20, 20, 6, 20])).toEqual([20, 20, 20, 20, 20, 20]);
    expect(probe([20, 20, 20, 20, 6, 6])).toEqual([20, 20, 20, 20, 6, 6]);
    expect(probe([20, 20, 20, 20, 6, 6, 6])).toEqual([20, 20, 20, 20, 6, 6, 6]);
  });

  test('several probes that jump at once are believed at once, whichever way', () => {
    const readings = [20, 20, 20, 20].map((value, i) => reading(i, [value, value + 1]));
    expect(cleanDistances([...readings, reading(4, [8, 35])], 2).at(-1)).toEqual([8, 35]);
  });

  test('several probes that rise together are believed at once', () => {
    const readings = [20, 20, 20, 20].map((value, i) => reading(i, [value, value + 1]));
    const clean = cleanDistances([...readings, reading(4, [5, 6])], 2);
    expect(clean.at(-1)).toEqual([5, 6]);
  });

  test('a silent probe is carried for a while, then dead', () => {
    const clean = probe([20, 20, 20, ...Array<null>(8).fill(null)]);
    expect(clean.slice(3)).toEqual([20, 20, 20, 20, 20, 20, null, null]);
  });
});

describe('order', () => {
  test('any order and repeats give the same sequence', () => {
    const all = Array.from({ length: 20 }, (_, i) => reading(i, [20 + i]));
    fc.assert(
      fc.property(fc.shuffledSubarray([...all, ...all, ...all.slice(5, 9)], { minLength: 44, maxLength: 44 }), (shuffled) => {
        expect(orderedReadings(shuffled)).toEqual(all);
      }),
    );
  });

  test('two words about one moment: the cautious one', () => {
    const at = 5;
    const merged = orderedReadings([
      { at, distancesIn: [20, null], airF: 18, supplyV: 12 },
      { at, distancesIn: [22, 30], airF: null, supplyV: 11 },
    ]);
    expect(merged).toEqual([{ at, distancesIn: [22, 30], airF: 18, supplyV: 11 }]);
  });
});

describe('what is no reading', () => {
  test('no time, no number, an impossible distance: as if the sensor had said nothing', () => {
    const odd = { at: 7, distancesIn: [Number.NaN, Infinity, -1, 20], airF: Number.NaN, supplyV: -Infinity };
    const nowhen = [Number.NaN, -1, Infinity, 9e15].map((at) => ({ ...odd, at }));
    const possible = (distanceIn: number | null) => (distanceIn !== null && distanceIn >= 0 ? distanceIn : null);
    expect(orderedReadings([...nowhen, odd], possible)).toEqual([{ at: 7, distancesIn: [null, null, null, 20], airF: null, supplyV: null }]);
  });
});

/** Every partition of 0…n−1 into runs, each run at its mean: the best non-increasing one is the isotonic fit. */
function bruteForce(values: number[], weights: number[]): number[] {
  const weightOf = (from: number, to: number) => weights.slice(from, to).reduce((sum, one) => sum + one, 0);
  let best: { cost: number; fit: number[] } | null = null;
  for (let cuts = 0; cuts < 2 ** (values.length - 1); cuts += 1) {
    const fit: number[] = [];
    let from = 0;
    for (let i = 0; i < values.length; i += 1) {
      if (i + 1 < values.length && !(cuts & (1 << i))) continue;
      const start = from;
      const run = values.slice(start, i + 1);
      const mean = run.reduce((sum, one, j) => sum + one * (weights[start + j] ?? 0), 0) / weightOf(start, i + 1);
      fit.push(...run.map(() => mean));
      from = i + 1;
    }
    if (fit.some((one, i) => i > 0 && one > (fit[i - 1] ?? 0) + 1e-12)) continue;
    const cost = fit.reduce((sum, one, i) => sum + (weights[i] ?? 0) * (one - (values[i] ?? 0)) ** 2, 0);
    if (!best || cost < best.cost - 1e-12) best = { cost, fit };
  }
  return best?.fit ?? [];
}

describe('isotonic fit', () => {
  test('equals the best of all partitions for up to eight values', () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.integer({ min: -50, max: 50 }), fc.integer({ min: 1, max: 9 })), { minLength: 1, maxLength: 8 }), (pairs) => {
        const values = pairs.map(([value]) => value);
        const weights = pairs.map(([, weight]) => weight);
        const same = values.map(() => 1);
        for (const [fit, best] of [
          [isotonicNonIncreasing(values, weights), bruteForce(values, weights)],
          [isotonicNonIncreasing(values), bruteForce(values, same)],
        ] as const) {
          expect(fit).toHaveLength(values.length);
          best.forEach((one, i) => expect(fit[i]).toBeCloseTo(one, 9));
        }
      }),
    );
  });

  test('weights pull', () => {
    expect(isotonicNonIncreasing([1, 3], [1, 3])).toEqual([2.5, 2.5]);
  });
});

describe('sales', () => {
  test('the falls between deliveries, none at the step', () => {
    const pounds = [100, 90, 90, 70, 200, 190, 180];
    expect(salesBetween(pounds, [4]).reduce((sum, one) => sum + one, 0)).toBeCloseTo(50, 9);
    expect(salesBetween(pounds, [4])[4]).toBe(0);
  });

  /** Normal noise of one sd of 3 lb, what 0.3 in of a probe means at 10 lb an inch (Box and Muller 1958). */
  const noisy = (seed: number) => {
    let state = seed;
    const uniform = () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
    return () => 3 * Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
  };
  const week = 336;
  const soldOf = (pounds: number[]) => salesBetween(pounds, []).reduce((sum, one) => sum + one, 0);

  test('noise alone sells next to nothing: under 2 lb a week, where raw falls would make over 500', () => {
    const weeks = Array.from({ length: 100 }, (_, n) => {
      const noise = noisy(n + 1);
      return Array.from({ length: week }, () => 400 + noise());
    });
    const raw = weeks.map((pounds) => pounds.reduce((sum, one, i) => sum + Math.max(0, (pounds[i - 1] ?? one) - one), 0));
    expect(Math.min(...raw)).toBeGreaterThan(450);
    expect(weeks.reduce((sum, pounds) => sum + soldOf(pounds), 0) / weeks.length).toBeLessThan(2);
  });

  test.each([
    ['a week', week, 350, 0.005],
    ['a day', 48, 50, 0.02],
  ])('noise on real sales of %s neither adds nor takes away', (_, count, sold, tolerance) => {
    const found = Array.from({ length: 200 }, (_, n) => {
      const noise = noisy(n + 1);
      return soldOf(Array.from({ length: count }, (_, i) => 500 - (sold * i) / (count - 1) + noise()));
    });
    const mean = found.reduce((sum, one) => sum + one, 0) / found.length;
    expect(Math.abs(mean / sold - 1)).toBeLessThan(tolerance);
  });

  test('a lane that ends no lower than it began sold nothing', () => {
    expect(salesBetween([100, 90, 110], [])).toEqual([0, 0, 0]);
  });

  test('a steady 2 lb an hour over the night clocks change: days of 24, 23 and 24 hours', () => {
    const starts = midnights(instantOf('2026-03-07', '12:00', 'America/Chicago'), instantOf('2026-03-09', '12:00', 'America/Chicago'), 'America/Chicago');
    const hours = Array.from({ length: 72 }, (_, i) => (starts[0] ?? 0) + i * 3_600_000);
    expect(salesByDay(hours, hours.map((_, i) => (i === 0 ? 0 : 2)), starts)).toEqual([48, 46, 48]);
  });

  test('a sale between two readings is shared among the days it touches', () => {
    const day = 86_400_000;
    expect(salesByDay([day / 2, day * 1.5], [0, 30], [0, day, 2 * day])).toEqual([15, 15]);
  });

  test('the plain rate', () => {
    expect(dailyRate([40, 50, 60], 7)).toEqual({ poundsPerDay: 50, sdPounds: 10, days: 3 });
    expect(dailyRate([50], 7)).toEqual({ poundsPerDay: 50, sdPounds: 25, days: 1 });
    expect(dailyRate([0, 0, 0], 7)).toEqual({ poundsPerDay: 0, sdPounds: 3.5, days: 3 });
    expect(dailyRate([], 7).days).toBe(0);
  });

  test('median', () => {
    expect([median([3, 1, 2]), median([4, 1, 2, 3])]).toEqual([2, 2.5]);
  });
});
