import fc from 'fast-check';
import { Temporal } from 'temporal-polyfill';
import { describe, expect, test } from 'vitest';
import { addDays, dayOf, hourOf, instantOf, midnights, startOfDay, weekdayOf } from '../../../server/domain/civil';

const zone = 'America/Chicago';
const HOUR = 3_600_000;
const instants = fc.integer({ min: Date.UTC(2020, 0, 1), max: Date.UTC(2035, 0, 1) });
const zones = fc.constantFrom('America/Chicago', 'America/New_York', 'America/Phoenix', 'Pacific/Honolulu', 'America/Havana', 'Asia/Kathmandu', 'Australia/Lord_Howe', 'UTC');
const zoned = (at: number, timeZone: string) => Temporal.Instant.fromEpochMilliseconds(at).toZonedDateTimeISO(timeZone);

describe('civil time against Temporal', () => {
  test('day and hour of an instant', () => {
    fc.assert(
      fc.property(instants, zones, (at, timeZone) => {
        const there = zoned(at, timeZone);
        expect(dayOf(at, timeZone)).toBe(there.toPlainDate().toString());
        expect(Math.floor(hourOf(at, timeZone))).toBe(there.hour);
      }),
    );
  });

  test('instant of a day and time', () => {
    fc.assert(
      fc.property(instants, zones, fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }), (at, timeZone, hour, minute) => {
        const day = dayOf(at, timeZone);
        const expected = Temporal.PlainDate.from(day).toZonedDateTime({ timeZone, plainTime: { hour, minute } }).epochMilliseconds;
        expect(instantOf(day, `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`, timeZone)).toBe(expected);
      }),
    );
  });

  test('days and weekdays', () => {
    fc.assert(
      fc.property(instants, fc.integer({ min: -400, max: 400 }), (at, days) => {
        const day = dayOf(at, 'UTC');
        const date = Temporal.PlainDate.from(day);
        expect(addDays(day, days)).toBe(date.add({ days }).toString());
        expect(weekdayOf(day)).toBe(date.dayOfWeek);
      }),
    );
  });
});

describe('the nights clocks change in Chicago', () => {
  test('8 March 2026 has 23 hours, 1 November 2026 has 25', () => {
    const length = (day: string) => (startOfDay(addDays(day, 1), zone) - startOfDay(day, zone)) / HOUR;
    expect([length('2026-03-08'), length('2026-11-01'), length('2026-06-01')]).toEqual([23, 25, 24]);
  });
  test('the skipped hour reads on, the doubled one means its first time', () => {
    expect(new Date(instantOf('2026-03-08', '02:30', zone)).toISOString()).toBe('2026-03-08T08:30:00.000Z');
    expect(new Date(instantOf('2026-11-01', '01:30', zone)).toISOString()).toBe('2026-11-01T06:30:00.000Z');
  });
  test('midnights reach from the first day to the one after the last', () => {
    const from = instantOf('2026-03-07', '12:00', zone);
    expect(midnights(from, from + 24 * HOUR, zone)).toEqual(['2026-03-07', '2026-03-08', '2026-03-09'].map((day) => startOfDay(day, zone)));
  });
});
