import { describe, expect, test } from 'vitest';
import { resolveSenml, SenmlError } from '../../server/telemetry/senml';

// Source: RFC 8428 (Sensor Measurement Lists), section 5.1 examples and section 4.6 resolved records. Where an example
// has no absolute time, its time is relative to `now`, which the test gives.
const now = 1_498_780_179;

interface Twin {
  n: string;
  u?: string;
  t: number;
  v?: number;
  vs?: string;
  vb?: boolean;
  vd?: string;
}

const resolve = (pack: unknown) =>
  resolveSenml(pack, now).map(({ name, unit, time, value }) => ({ n: name, u: unit, t: Math.round(time * 1000) / 1000, value }));
const twin = ({ n, u, t, v, vs, vb, vd }: Twin) => ({ n, u: u ?? null, t, value: v ?? vs ?? vb ?? vd });
const same = (pack: unknown, twins: Twin[]) => expect(resolve(pack)).toEqual(twins.map(twin));

describe('RFC 8428 section 5', () => {
  test('a single data point (example 1)', () => {
    same([{ n: 'urn:dev:ow:10e2073a01080063', u: 'Cel', v: 23.1 }], [{ n: 'urn:dev:ow:10e2073a01080063', u: 'Cel', t: now, v: 23.1 }]);
  });

  test('two data points at one time (example 2)', () => {
    const bn = 'urn:dev:ow:10e2073a01080063:';
    same(
      [
        { bn, n: 'voltage', t: 0, u: 'V', v: 120.1 },
        { n: 'current', t: 0, u: 'A', v: 1.2 },
      ],
      [
        { n: `${bn}voltage`, u: 'V', t: now, v: 120.1 },
        { n: `${bn}current`, u: 'A', t: now, v: 1.2 },
      ],
    );
  });

  test('base time, base unit and times before it (example 3)', () => {
    const bn = 'urn:dev:ow:10e2073a0108006:';
    same(
      [
        { bn, bt: 1276020076.001, bu: 'A', bver: 5, n: 'voltage', u: 'V', v: 120.1 },
        { n: 'current', t: -5, v: 1.2 },
        { n: 'current', t: -4, v: 1.3 },
        { n: 'current', t: -3, v: 1.4 },
        { n: 'current', t: -2, v: 1.5 },
        { n: 'current', t: -1, v: 1.6 },
        { n: 'current', t: 0, v: 1.7 },
      ],
      [
        { n: `${bn}voltage`, u: 'V', t: 1276020076.001, v: 120.1 },
        { n: `${bn}current`, u: 'A', t: 1276020071.001, v: 1.2 },
        { n: `${bn}current`, u: 'A', t: 1276020072.001, v: 1.3 },
        { n: `${bn}current`, u: 'A', t: 1276020073.001, v: 1.4 },
        { n: `${bn}current`, u: 'A', t: 1276020074.001, v: 1.5 },
        { n: `${bn}current`, u: 'A', t: 1276020075.001, v: 1.6 },
        { n: `${bn}current`, u: 'A', t: 1276020076.001, v: 1.7 },
      ],
    );
  });

  test('a series of one measurement under a base name alone (example 4)', () => {
    const n = 'urn:dev:ow:10e2073a01080063';
    const series: [number, number][] = [[0, 21.2], [10, 21.3], [20, 21.4], [30, 21.4], [40, 21.5], [50, 21.5], [60, 21.5], [70, 21.6], [80, 21.7], [90, 21.5], [91, 21.5], [92, 21.5]];
    same(
      series.map(([t, v], i) => ({ ...(i === 0 ? { bn: n, bt: 1320067464, bu: '%RH' } : {}), v, t })),
      series.map(([t, v]) => ({ n, u: '%RH', t: 1320067464 + t, v })),
    );
  });

  test('units that change from record to record (example 5)', () => {
    const n = 'urn:dev:ow:10e2073a01080063';
    same(
      [
        { bn: n, bt: 1320067464, bu: '%RH', v: 20.0, t: 0 },
        { v: 24.30621, u: 'lon', t: 0 },
        { v: 60.07965, u: 'lat', t: 0 },
        { v: 20.3, t: 60 },
        { v: 98.0, u: '%EL', t: 150 },
        { v: 21.2, t: 180 },
      ],
      [
        { n, u: '%RH', t: 1320067464, v: 20 },
        { n, u: 'lon', t: 1320067464, v: 24.30621 },
        { n, u: 'lat', t: 1320067464, v: 60.07965 },
        { n, u: '%RH', t: 1320067524, v: 20.3 },
        { n, u: '%EL', t: 1320067614, v: 98 },
        { n, u: '%RH', t: 1320067644, v: 21.2 },
      ],
    );
  });

  test('the base name changes, the base time stays (example 6)', () => {
    const at = 1320078429;
    same(
      [
        { bn: '2001:db8::2/', bt: at, n: 'temperature', v: 25.2, u: 'Cel' },
        { n: 'humidity', v: 30, u: '%RH' },
        { bn: '2001:db8::1/', n: 'temperature', v: 12.3, u: 'Cel' },
        { n: 'humidity', v: 67, u: '%RH' },
      ],
      [
        { n: '2001:db8::2/temperature', u: 'Cel', t: at, v: 25.2 },
        { n: '2001:db8::2/humidity', u: '%RH', t: at, v: 30 },
        { n: '2001:db8::1/temperature', u: 'Cel', t: at, v: 12.3 },
        { n: '2001:db8::1/humidity', u: '%RH', t: at, v: 67 },
      ],
    );
  });

  test('a field that is not known is passed over (example 8, links)', () => {
    const bn = 'urn:dev:ow:10e2073a01080063:';
    same(
      [
        { bn, bt: 1320078429, l: '[{"href":"humidity","foo":"bar"}]', n: 'temperature', v: 27.2, u: 'Cel' },
        { n: 'humidity', v: 80, u: '%RH' },
      ],
      [
        { n: `${bn}temperature`, u: 'Cel', t: 1320078429, v: 27.2 },
        { n: `${bn}humidity`, u: '%RH', t: 1320078429, v: 80 },
      ],
    );
  });

  test('absolute times of one name (examples 10 and 11)', () => {
    const n = 'urn:dev:ow:10e2073a01080063';
    const twins = [{ n, u: 'Cel', t: 1276020076, v: 23.5 }, { n, u: 'Cel', t: 1276020091, v: 23.6 }];
    same(twins, twins);
    same([{ bn: n, t: 1276020076, v: 23.5, u: 'Cel' }, { t: 1276020091, v: 23.6, u: 'Cel' }], twins);
  });

  test('texts, truths and data (example 7)', () => {
    const bn = 'urn:dev:ow:10e2073a01080063:';
    same(
      [
        { bn, n: 'temp', u: 'Cel', v: 23.1 },
        { n: 'label', vs: 'Machine Room' },
        { n: 'open', vb: false },
        { n: 'nfv-reader', vd: 'aGkgCg' },
      ],
      [
        { n: `${bn}temp`, u: 'Cel', t: now, v: 23.1 },
        { n: `${bn}label`, t: now, vs: 'Machine Room' },
        { n: `${bn}open`, t: now, vb: false },
        { n: `${bn}nfv-reader`, t: now, vd: 'aGkgCg' },
      ],
    );
  });

  test('a record that only sets the base resolves to nothing (example 9)', () => {
    const bn = 'urn:dev:ow:10e2073a01080063:';
    same(
      [{ bn }, { n: 'temp', u: 'Cel', v: 23.1 }, { n: 'heat', u: '/', v: 1 }, { n: 'fan', u: '/', v: 0 }],
      [
        { n: `${bn}temp`, u: 'Cel', t: now, v: 23.1 },
        { n: `${bn}heat`, u: '/', t: now, v: 1 },
        { n: `${bn}fan`, u: '/', t: now, v: 0 },
      ],
    );
  });

  test('names in the records alone, without a base name (example 12)', () => {
    same(
      [
        { bt: 1320078429, bu: '/', n: '2001:db8::3', v: 1 },
        { n: '2001:db8::4', v: 1 },
      ],
      [
        { n: '2001:db8::3', u: '/', t: 1320078429, v: 1 },
        { n: '2001:db8::4', u: '/', t: 1320078429, v: 1 },
      ],
    );
  });
});

describe('RFC 8428 section 4', () => {
  test('4.5.3 times below 2^28 are relative to now, the rest absolute', () => {
    expect(resolve([{ n: 'a', t: -30, v: 1 }])[0]?.t).toBe(now - 30);
    expect(resolve([{ n: 'a', t: 2 ** 28 - 1, v: 1 }])[0]?.t).toBe(now + 2 ** 28 - 1);
    expect(resolve([{ n: 'a', t: 2 ** 28, v: 1 }])[0]?.t).toBe(2 ** 28);
  });

  test('4.6 the base value is added', () => {
    expect(resolve([{ n: 'a', bv: 20, v: 0.5 }, { n: 'b', v: -1 }]).map(({ value }) => value)).toEqual([20.5, 19]);
  });

  test('4.4 a field that ends in _ must be understood; others are passed over', () => {
    expect(resolve([{ n: 'a', v: 1, extra: 5 }])).toHaveLength(1);
    expect(() => resolveSenml([{ n: 'a', v: 1, extra_: 5 }], now)).toThrow(SenmlError);
  });

  test('4.4 a version above 10, or two versions in one pack, is refused', () => {
    expect(() => resolveSenml([{ n: 'a', v: 1, bver: 11 }], now)).toThrow(SenmlError);
    expect(() => resolveSenml([{ n: 'a', v: 1, bver: 10 }, { n: 'b', v: 1, bver: 9 }], now)).toThrow(SenmlError);
    expect(resolve([{ n: 'a', v: 1, bver: 10 }, { n: 'b', v: 1, bver: 10 }])).toHaveLength(2);
  });

  test('what is not a pack says where', () => {
    const pointerOf = (pack: unknown) => {
      try {
        resolveSenml(pack, now);
      } catch (error) {
        return error instanceof SenmlError ? error.pointer : 'other';
      }
      return 'none';
    };
    expect(pointerOf({})).toBe('');
    expect(pointerOf([{ n: 'a', v: 1 }, 5])).toBe('/1');
    expect(pointerOf([{ bn: 5, v: 1 }])).toBe('/0/bn');
    expect(pointerOf([{ n: 'a', v: 1, t: 'soon' }])).toBe('/0/t');
  });
});
