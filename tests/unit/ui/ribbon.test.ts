import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { daysOf, placeWords, rowsOf, spanOf, type RibbonData } from '../../../src/freezer/ribbon-data';

const at = (iso: string) => Date.parse(iso);
const day = 86_400_000;
const now = at('2026-12-01T19:10:00Z');
const data: RibbonData = {
  now,
  timeZone: 'America/Chicago',
  history: [[now - 9 * day, 0.9], [now - 2 * day, 0.6], [now, 0.5]],
  forecast: [{ at: now, low: 0.5, likely: 0.5, high: 0.5 }, { at: now + 9 * day, low: -0.1, likely: 0.1, high: 1.2 }],
  deliveries: [],
  truck: null,
  empty: null,
};

describe('the days of the ribbon', () => {
  test('whole local days, four back and five ahead at most', () => {
    const span = spanOf(data);
    // Central Standard Time is six hours behind UTC.
    expect([new Date(span.from).toISOString(), new Date(span.to).toISOString()]).toEqual(['2026-11-27T06:00:00.000Z', '2026-12-07T06:00:00.000Z']);
    expect(daysOf(span, data).map(({ day, today }) => `${day}${today ? ' today' : ''}`)).toContain('2026-12-01 today');
    expect(daysOf(span, data)).toHaveLength(10);
  });

  test('without history or forecast there are still yesterday, today and tomorrow', () => {
    const bare = { ...data, history: [], forecast: [] };
    expect(daysOf(spanOf(bare), bare).map(({ day }) => day)).toEqual(['2026-11-30', '2026-12-01', '2026-12-02']);
  });

  test('a night with 25 hours is one day', () => {
    const november = { ...data, now: at('2026-11-01T18:00:00Z'), history: [], forecast: [] };
    const days = daysOf(spanOf(november), november);
    expect(days.map(({ day }) => day)).toEqual(['2026-10-31', '2026-11-01', '2026-11-02']);
    expect((days[2]?.start ?? 0) - (days[1]?.start ?? 0)).toBe(25 * 3_600_000);
  });

  test('one point before the first day is kept so that the line enters from the edge, and shares stay in 0 to 100', () => {
    const rows = rowsOf(spanOf(data), data);
    expect(rows.map(({ past }) => past).filter((past) => past !== undefined)).toEqual([90, 60, 50]);
    expect(rows.at(-1)).toEqual({ at: now + 9 * day, likely: 10, band: [0, 100] });
  });
});

test('the words over the marks never touch and never leave the chart', () => {
  const word = fc.record({ centre: fc.integer({ min: 40, max: 300 }), width: fc.integer({ min: 20, max: 90 }) });
  fc.assert(
    fc.property(word, word, (a, b) => {
      const [atA, atB] = placeWords(a, b, 0, 310);
      expect(Math.abs(atA - (atB ?? NaN))).toBeGreaterThanOrEqual((a.width + b.width) / 2 + 7.999);
      for (const [centre, { width }] of [[atA, a], [atB ?? NaN, b]] as const) {
        expect(centre - width / 2).toBeGreaterThanOrEqual(-0.001);
        expect(centre + width / 2).toBeLessThanOrEqual(310.001);
      }
    }),
  );
});
