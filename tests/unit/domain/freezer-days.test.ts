import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { startOfDay } from '../../../server/domain/civil';
import { freezerDays } from '../../../server/domain/freezer-days';

const zone = 'America/Chicago';
const HALF_HOUR = 30 * 60_000;
const midnight = startOfDay('2026-07-01', zone);

/** A reading each half hour from midnight of July 1; `of` says pounds by lane and the air. */
const heard = (count: number, of: (i: number) => { pounds: number[]; airF: number | null }) =>
  Array.from({ length: count }, (_, i) => ({ at: midnight + i * HALF_HOUR, ...of(i) }));
const days = (list: { at: number; pounds: number[]; airF: number | null }[]) => freezerDays(list, list, [7, 20], zone);

describe('minutes of a local day', () => {
  test('a lane without a whole bag is out, and the days part at midnight', () => {
    // From 6 pm until 6 am the second lane holds 19 lb of 20 lb bags.
    const found = days(heard(97, (i) => ({ pounds: [100, i >= 36 && i < 60 ? 19 : 20], airF: 18 })));
    expect(found).toEqual([
      { day: '2026-07-01', out: 360, warm: 0, known: 1440 },
      { day: '2026-07-02', out: 360, warm: 0, known: 1440 },
    ]);
  });

  test('one warm reading is a door; two in a row are warm', () => {
    const [day] = days(heard(49, (i) => ({ pounds: [100, 100], airF: i === 10 || (i >= 20 && i < 24) ? 40 : 18 })));
    expect(day).toMatchObject({ warm: 90 });
  });

  test('a silence longer than six hours says nothing of what was between', () => {
    const list = heard(49, () => ({ pounds: [0, 0], airF: 40 })).filter((_, i) => i < 10 || i >= 30);
    expect(days(list)[0]).toEqual({ day: '2026-07-01', out: 270 + 540, warm: 270 + 540, known: 270 + 540 });
  });

  test('the day clocks go back has twenty-five hours', () => {
    const start = startOfDay('2026-11-01', zone);
    const list = Array.from({ length: 51 }, (_, i) => ({ at: start + i * HALF_HOUR, pounds: [0, 0], airF: 18 }));
    expect(freezerDays(list, list, [7, 20], zone)[0]).toEqual({ day: '2026-11-01', out: 1500, warm: 0, known: 1500 });
  });

  test('never more than is known, and all that is known is in some day', () => {
    const reading = fc.record({ gap: fc.integer({ min: 1, max: 9 * 60 }), pounds: fc.array(fc.double({ min: 0, max: 60, noNaN: true }), { minLength: 2, maxLength: 2 }), airF: fc.option(fc.double({ min: 0, max: 60, noNaN: true })) });
    fc.assert(
      fc.property(fc.array(reading, { maxLength: 26 }), (list) => {
        let at = midnight;
        const told = list.map(({ gap, pounds, airF }) => ({ at: (at += gap * 60_000), pounds, airF }));
        const found = days(told);
        for (const { out, warm, known } of found) {
          expect(out).toBeLessThanOrEqual(known + 1e-6);
          expect(known).toBeLessThanOrEqual(25 * 60);
          expect(warm).toBeLessThanOrEqual(25 * 60);
        }
        const between = told.slice(1).reduce((sum, one, i) => sum + (one.at - (told[i]?.at ?? 0) > 6 * 3_600_000 ? 0 : one.at - (told[i]?.at ?? 0)), 0);
        expect(found.reduce((sum, { known }) => sum + known, 0)).toBeCloseTo(between / 60_000, 3);
      }),
      { numRuns: 200 },
    );
  });
});
