import { describe, expect, test } from 'vitest';
import { comingTruck, fleetStanding, levelUsable, type FleetGlance } from '../../../server/domain/fleet-standing';

const hour = 3_600_000;
const now = Date.parse('2026-12-01T19:10:00Z');
const truck = { from: now + 20 * hour, to: now + 22 * hour };

/** Heard just now, three quarters full, running out well after its truck. */
const fine: FleetGlance = {
  serial: 'NS-1',
  at: now - 10 * 60_000,
  lanes: [{ product: '7 lb', bags: 40 }, { product: '20 lb', bags: 12 }],
  warmSince: null,
  likely: now + 90 * hour,
  riskAt: now + 70 * hour,
  truck,
};
const of = (change: Partial<FleetGlance>) => fleetStanding({ ...fine, ...change }, now);

test('nothing wrong', () => {
  expect(of({})).toEqual({ kind: 'fine' });
  expect(of({ truck: null })).toEqual({ kind: 'fine' });
  expect(of({ likely: null, riskAt: null })).toEqual({ kind: 'fine' });
});

describe('nothing to go by', () => {
  test('no sensor, whatever an old row says', () => {
    expect(of({ serial: null, at: null, warmSince: now - hour })).toEqual({ kind: 'unfitted' });
  });
  test('a sensor that has not been heard', () => {
    expect(of({ at: null, likely: null })).toEqual({ kind: 'waiting' });
  });
  test('a level older than a day says only how long it is silent', () => {
    const at = now - 24 * hour - 1;
    expect(of({ at, warmSince: at, likely: now - hour, lanes: [{ product: '7 lb', bags: 0 }] })).toEqual({ kind: 'silent', since: at });
  });
});

describe('what is worse comes first', () => {
  test('warm before empty', () => {
    expect(of({ warmSince: now - 2 * hour, lanes: [{ product: '7 lb', bags: 0 }] })).toEqual({ kind: 'warm', since: now - 2 * hour });
  });
  test('empty, whole or one product, before running out', () => {
    expect(of({ lanes: [{ product: '7 lb', bags: 0 }, { product: '20 lb', bags: 0 }], likely: now - hour })).toEqual({ kind: 'empty', product: null });
    expect(of({ lanes: [{ product: '7 lb', bags: 3 }, { product: '20 lb', bags: 0 }], likely: now - hour })).toEqual({ kind: 'empty', product: '20 lb' });
  });
  test('a lane that no probe measures is not empty, nor is a freezer without lanes', () => {
    expect(of({ lanes: [{ product: '7 lb', bags: null }] })).toEqual({ kind: 'fine' });
    expect(of({ lanes: [] })).toEqual({ kind: 'fine' });
  });
  test('running out before silence of some hours', () => {
    expect(of({ at: now - 19 * hour, likely: truck.from - hour })).toEqual({ kind: 'first', ms: hour });
    expect(of({ at: now - 19 * hour })).toEqual({ kind: 'silent', since: now - 19 * hour });
  });
});

describe('against the truck', () => {
  test('likely empty before it comes, and how long before', () => {
    expect(of({ likely: truck.from - 3 * hour, riskAt: now })).toEqual({ kind: 'first', ms: 3 * hour });
    expect(of({ likely: truck.from - 1, riskAt: now })).toEqual({ kind: 'first', ms: 1 });
  });
  test('tight from the truck’s first minute on, while the risk is sooner', () => {
    expect(of({ likely: truck.from, riskAt: truck.from - 1 })).toEqual({ kind: 'tight' });
    expect(of({ likely: null, riskAt: truck.from - 1 })).toEqual({ kind: 'tight' });
    expect(of({ likely: truck.from, riskAt: truck.from })).toEqual({ kind: 'fine' });
  });
  test('a truck in its window still comes; a minute past it, it is none', () => {
    const late = { from: now - 2 * hour, to: now };
    expect(of({ likely: now + hour, riskAt: now, truck: late })).toEqual({ kind: 'fine' });
    expect(of({ likely: now + hour, riskAt: now, truck: { ...late, to: now - 1 } })).toEqual({ kind: 'soon' });
  });
  test('told of none, it is not said that there is none', () => {
    expect(of({ truck: undefined, likely: now + 48 * hour - 1, riskAt: now })).toEqual({ kind: 'soon-untold' });
    expect(of({ truck: undefined, likely: now + 48 * hour, riskAt: now })).toEqual({ kind: 'fine' });
  });
  test('without one, only within two days', () => {
    expect(of({ truck: null, likely: now + 48 * hour - 1 })).toEqual({ kind: 'soon' });
    expect(of({ truck: null, likely: now + 48 * hour })).toEqual({ kind: 'fine' });
    expect(of({ truck: null, likely: null, riskAt: now })).toEqual({ kind: 'fine' });
  });
});

describe('silence', () => {
  test('begins after six hours', () => {
    expect(of({ at: now - 6 * hour })).toEqual({ kind: 'fine' });
    expect(of({ at: now - 6 * hour - 1 })).toEqual({ kind: 'silent', since: now - 6 * hour - 1 });
  });
});

test('a level is used for a day', () => {
  expect(levelUsable({ serial: 'NS-1', at: now - 24 * hour }, now)).toBe(true);
  expect(levelUsable({ serial: 'NS-1', at: now - 24 * hour - 1 }, now)).toBe(false);
  expect(levelUsable({ serial: 'NS-1', at: null }, now)).toBe(false);
  expect(levelUsable({ serial: null, at: now }, now)).toBe(false);
});

test('a truck to come', () => {
  expect(comingTruck(truck, now)).toBe(truck);
  expect(comingTruck(truck, truck.to + 1)).toBeNull();
  expect(comingTruck(null, now)).toBeNull();
});
