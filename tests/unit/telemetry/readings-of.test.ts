import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { liveLimits, mergeReadings, readingsOf } from '../../../server/telemetry/readings-of';
import { resolveSenml } from '../../../server/telemetry/senml';

const now = 1_796_130_000_000;
const bn = 'urn:dev:os:32473-kb-0001:';
const bt = now / 1000 - 60;
const sorted = (pack: object[]) => readingsOf(resolveSenml(pack, now / 1000), now, liveLimits);

describe('records become readings', () => {
  test('one sensor at one time is one reading', () => {
    const { readings, quarantined, ignored } = sorted([
      { bn, bt, n: 'probe1', u: 'm', v: 0.31 },
      { n: 'probe3', u: 'm', v: 0.66 },
      { n: 'air', u: 'Cel', v: -8.2 },
      { n: 'supply', u: 'V', v: 11.9 },
      { n: 'rssi', u: 'dBW', v: -80 },
    ]);
    expect(readings).toEqual([
      { serial: 'urn:dev:os:32473-kb-0001', at: bt * 1000, probes: [0.31, null, 0.66], airC: -8.2, supplyV: 11.9, conflict: false },
    ]);
    expect(quarantined).toEqual([]);
    expect(ignored).toBe(1);
  });

  test.each([
    ['with a colon', 'urn:dev:mac:0024befffe804ff1:', 'urn:dev:mac:0024befffe804ff1'],
    ['with an underscore', 'urn:dev:mac:0024befffe804ff1_', 'urn:dev:mac:0024befffe804ff1'],
    ['with a slash', 'urn:dev:mac:0024befffe804ff1/', 'urn:dev:mac:0024befffe804ff1'],
    ['without any', 'urn:dev:mac:0024befffe804ff1', 'urn:dev:mac:0024befffe804ff1'],
    ['in capitals', 'URN:DEV:mac:0024befffe804ff1:', 'urn:dev:mac:0024befffe804ff1'],
  ])('the device is named by the base name, %s', (_, base, serial) => {
    expect(sorted([{ bn: base, bt, n: 'probe1', u: 'm', v: 1 }]).readings[0]?.serial).toBe(serial);
  });

  test.each([
    ['no-device', { bn: 'freezer-7:', n: 'probe1', u: 'm', v: 1 }],
    ['no-number', { bn, n: 'probe1', u: 'm', vs: 'full' }],
    ['no-number', { bn, n: 'probe1', u: 'm', v: 'NaN' }],
    ['wrong-unit', { bn, n: 'probe1', u: 'cm', v: 31 }],
    ['wrong-unit', { bn, n: 'air', u: 'K', v: 265 }],
    ['negative-distance', { bn, n: 'probe1', u: 'm', v: -0.01 }],
    ['impossible-value', { bn, n: 'probe1', u: 'm', v: 31 }],
    ['impossible-value', { bn, n: 'air', u: 'Cel', v: 900 }],
    ['too-far-ahead', { bn, n: 'probe1', u: 'm', v: 1, t: 60 + 10 * 60 + 1 }],
    ['too-old', { bn, n: 'probe1', u: 'm', v: 1, t: -90 * 86_400 }],
  ])('%s is kept aside and loses nothing beside it', (reason, record) => {
    const good = { bn: 'urn:dev:os:32473-kb-0002:', n: 'probe1', u: 'm', v: 0.4 };
    const { readings, quarantined } = sorted([{ bt, ...record }, good]);
    expect(quarantined.map((one) => one.reason)).toEqual([reason]);
    expect(readings).toHaveLength(1);
  });

  test('ten minutes ahead and ninety days old are still believed', () => {
    const at = (t: number) => sorted([{ bn, bt: now / 1000, n: 'probe1', u: 'm', v: 1, t }]).readings.length;
    expect([at(600), at(-90 * 86_400)]).toEqual([1, 1]);
  });
});

const channel = fc.option(fc.integer({ min: 0, max: 9 }), { nil: null });
const channels = fc.record({ probes: fc.array(channel, { maxLength: 3 }), airC: channel, supplyV: channel, conflict: fc.boolean() });
const padded = <T extends { probes: (number | null)[] }>(reading: T) => ({ ...reading, probes: [0, 1, 2].map((i) => reading.probes[i] ?? null) });

describe('two readings of one moment', () => {
  test('the cautious value stands and the contradiction is counted', () => {
    const merged = mergeReadings(
      { probes: [0.3, null], airC: -8, supplyV: 12, conflict: false },
      { probes: [0.4, 0.5], airC: null, supplyV: 11, conflict: false },
    );
    expect(merged).toEqual({ probes: [0.4, 0.5], airC: -8, supplyV: 11, conflict: true });
  });

  test('the order of arrival does not matter, nor does hearing it twice', () => {
    fc.assert(
      fc.property(channels, channels, channels, (a, b, c) => {
        const left = mergeReadings(mergeReadings(a, b), c);
        const right = mergeReadings(a, mergeReadings(c, b));
        expect(padded(left)).toEqual(padded(right));
        expect(padded(mergeReadings(left, b))).toEqual(padded(left));
      }),
    );
  });
});
