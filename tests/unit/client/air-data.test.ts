import { describe, expect, test } from 'vitest';
import { airDays, airRows, airTicks, airSpan } from '../../../src/features/freezers/page/air-data';

const zone = 'America/Chicago';
const hour = 3_600_000;
/** Monday, November 30, noon in Chicago. */
const monday = Date.parse('2026-11-30T18:00:00Z');

describe('the air by day', () => {
  test('has the coldest and the warmest of each local day', () => {
    const days = airDays([[monday, 18], [monday + hour, 12], [monday + 11 * hour, 25], [monday + 12 * hour, 30]], zone);
    expect(days).toEqual([
      { middle: monday, low: 12, high: 25 },
      { middle: monday + 24 * hour, low: 30, high: 30 },
    ]);
  });

  test('is nothing without readings', () => {
    expect(airDays([], zone)).toEqual([]);
  });
});

describe('the line', () => {
  test('breaks where the thermometer was silent', () => {
    expect(airRows([[monday, 18], [monday + hour, 19], [monday + 9 * hour, 20]]).map(({ degrees }) => degrees)).toEqual([18, 19, null, 20]);
  });

  test('stands in whole local days up to the end of today', () => {
    const { from, to, middles } = airSpan([[monday - 24 * hour, 18]], monday, zone);
    expect(from).toBe(monday - 36 * hour);
    expect(to).toBe(monday + 12 * hour);
    expect(middles).toEqual([monday - 24 * hour, monday]);
  });

  test('keeps the melting mark and every reading in sight', () => {
    expect(airTicks([[monday, 14], [monday, 21]], 32)).toEqual([10, 20, 30, 40]);
    const ticks = airTicks([[monday, -12], [monday, 61]], 32);
    expect(ticks[0]).toBeLessThan(-12);
    expect(ticks.at(-1)).toBeGreaterThan(61);
  });
});
