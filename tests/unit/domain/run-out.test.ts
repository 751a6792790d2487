import { describe, expect, test } from 'vitest';
import { attentionOf } from '../../../server/domain/attention';
import { coolingOf } from '../../../server/domain/cooling';
import { emptyBeforeTruck, forecastCurve, shareLoad } from '../../../server/domain/forecast';
import { firstLane, plainRunOut } from '../../../server/domain/run-out';

const DAY = 86_400_000;
const at = Date.UTC(2026, 5, 1);
const days = (instant: number | null) => (instant === null ? null : (instant - at) / DAY);

describe('plain run-out', () => {
  test('without any spread all three are level over rate', () => {
    const { early, likely, late } = plainRunOut(300, 0, { poundsPerDay: 100, sdPounds: 0, days: 7 }, at);
    expect([days(early), days(likely), days(late)]).toEqual([3, 3, 3]);
  });

  test('early and late satisfy the equation they come from', () => {
    const rate = { poundsPerDay: 80, sdPounds: 20, days: 7 };
    const { early, likely, late } = plainRunOut(300, 10, rate, at);
    const odds = (t: number) => Math.abs(300 - 80 * t) / Math.sqrt(20 ** 2 * t + (20 ** 2 / 7) * t ** 2 + 10 ** 2);
    expect(days(likely)).toBeCloseTo(3.75, 6);
    expect(odds(days(early) ?? 0)).toBeCloseTo(1.281552, 5);
    expect(odds(days(late) ?? 0)).toBeCloseTo(1.281552, 5);
    expect((early ?? 0) < (likely ?? 0) && (likely ?? 0) < (late ?? 0)).toBe(true);
  });

  test('empty now, nothing sold, nothing known, beyond fourteen days', () => {
    const rate = { poundsPerDay: 80, sdPounds: 20, days: 7 };
    const never = { early: null, likely: null, late: null };
    expect(plainRunOut(0, 10, rate, at)).toEqual({ early: at, likely: at, late: at });
    expect(plainRunOut(300, 10, { poundsPerDay: 0, sdPounds: 3.5, days: 7 }, at)).toEqual(never);
    expect(plainRunOut(300, 10, { poundsPerDay: 0, sdPounds: 0, days: 0 }, at)).toEqual(never);
    expect(plainRunOut(80 * 15, 0, rate, at).likely).toBeNull();
  });

  test('a wild lane has no late time rather than a confident one', () => {
    expect(plainRunOut(300, 10, { poundsPerDay: 20, sdPounds: 60, days: 2 }, at).late).toBeNull();
  });

  test('the first lane to run out', () => {
    const out = (likely: number | null) => ({ early: null, likely, late: null });
    expect(firstLane([out(null), out(5), out(3)])).toBe(2);
    expect(firstLane([out(null)])).toBeNull();
  });
});

describe('cooling', () => {
  const air = (values: (number | null)[]) => values.map((airF, i) => ({ at: i, distancesIn: [], airF, supplyV: null }));
  test('warm after two readings above 32 °F, since the first of them', () => {
    expect(coolingOf(air([18, 33, 34])).warmSince).toBe(1);
    expect(coolingOf(air([18, 33, null, 34])).warmSince).toBe(1);
  });
  test('one is not enough, 32 is not above, and a cold one ends it', () => {
    expect(coolingOf(air([18, 33])).warmSince).toBeNull();
    expect(coolingOf(air([32, 32, 32])).warmSince).toBeNull();
    expect(coolingOf(air([33, 34, 20])).warmSince).toBeNull();
  });
  test('no thermometer', () => {
    expect(coolingOf(air([null]))).toEqual({ airF: null, airAt: null, warmSince: null });
  });
});

describe('the ribbon’s right side', () => {
  const lanes = [
    { pounds: 100, capacityPounds: 200 },
    { pounds: 150, capacityPounds: 200 },
  ];
  const rates = [
    { poundsPerDay: 50, sdPounds: 10, days: 7 },
    { poundsPerDay: 25, sdPounds: 10, days: 7 },
  ];
  const base = { at, lanes, rates, from: at, to: at + 4 * DAY, stepMs: DAY };

  test('falls to the floor and never through it', () => {
    expect(forecastCurve({ ...base, truck: null }).map(({ likely }) => likely)).toEqual([0.625, 0.4375, 0.25, 0.1875, 0.125]);
  });
  test('starts again from the planned load, held by what fits', () => {
    const curve = forecastCurve({ ...base, truck: { at: at + DAY, pounds: [500, 20] } });
    const step = curve.filter((point) => point.at === at + DAY).map(({ likely }) => likely);
    expect(step).toEqual([0.4375, (200 + 145) / 400]);
  });
  test('the band holds the line', () => {
    for (const { low, likely, high } of forecastCurve({ ...base, truck: null })) expect(low <= likely && likely <= high).toBe(true);
  });
  test('the band’s upper bound never rises by itself', () => {
    const high = forecastCurve({ ...base, to: at + 14 * DAY, truck: null }).map((point) => point.high);
    high.forEach((one, i) => expect(one).toBeLessThanOrEqual(high[i - 1] ?? 1));
    expect(high.at(-1)).toBeLessThan(0.35);
  });
  test('nothing is drawn before a whole day was seen', () => {
    expect(forecastCurve({ ...base, rates: rates.map((rate) => ({ ...rate, days: 0 })), truck: null })).toEqual([]);
  });
  test('the empty stretch before the truck', () => {
    const out = (likely: number | null) => ({ early: null, likely, late: null });
    expect(emptyBeforeTruck([out(null), out(at + DAY)], at + 2 * DAY, at)).toEqual({ from: at + DAY, to: at + 2 * DAY });
    expect(emptyBeforeTruck([out(at + 3 * DAY)], at + 2 * DAY, at)).toBeNull();
    expect(emptyBeforeTruck([out(at + DAY)], null, at)).toBeNull();
    expect(emptyBeforeTruck([out(null)], at + DAY, at)).toBeNull();
  });
  test('a load goes where its product has room', () => {
    const store = [
      { productId: 'a', pounds: 100, capacityPounds: 200 },
      { productId: 'a', pounds: 0, capacityPounds: 300 },
      { productId: 'b', pounds: 0, capacityPounds: 100 },
    ];
    expect(shareLoad(store, [{ productId: 'a', bagPounds: 10, bags: 20 }])).toEqual([50, 150, 0]);
  });
});

describe('what a store needs looked at', () => {
  const fine = { sensor: true, at, share: 0.5, warmSince: null, runOutLikely: at + 9 * DAY };
  const truck = { from: at + 3 * DAY, to: at + 3 * DAY + 1 };
  test.each([
    ['none', [fine], truck],
    ['warm', [fine, { ...fine, warmSince: at, runOutLikely: at }], truck],
    ['empty', [fine, { ...fine, runOutLikely: at }], truck],
    ['truck-late', [{ ...fine, runOutLikely: at + 1 }], { from: at - 2, to: at - 1 }],
    ['runs-out-first', [{ ...fine, runOutLikely: at + 2 * DAY }], truck],
    ['silent', [{ ...fine, at: null, share: null, runOutLikely: null }], truck],
    ['none', [{ ...fine, sensor: false, at: null, share: null, runOutLikely: null }], truck],
    ['silent', [{ ...fine, at: at - 7 * 3_600_000 }], truck],
  ] as const)('%s', (expected, freezers, next) => {
    expect(attentionOf([...freezers], next, at)).toBe(expected);
  });
  test('a level older than a day makes no promise', () => {
    expect(attentionOf([{ ...fine, at: at - 25 * 3_600_000, share: 0, warmSince: at }], truck, at)).toBe('silent');
  });
});
