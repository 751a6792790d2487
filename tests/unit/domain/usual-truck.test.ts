import { describe, expect, test } from 'vitest';
import type { Span } from '../../../server/contract/words';
import { instantOf } from '../../../server/domain/civil';
import { usualTruck, type UsualDays } from '../../../server/domain/usual-truck';

const timeZone = 'America/Chicago';
const at = (day: string, time: string): number => instantOf(day, time, timeZone);
const weekdays: Span[] = [{ days: [1, 2, 3, 4, 5], from: '07:00', to: '11:00' }];
const store = (over: Partial<UsualDays> = {}): UsualDays => ({ timeZone, deliveryDays: [2, 4], receivingHours: weekdays, openHours: [6, 22], ...over });

describe('the usual truck', () => {
  test('is today’s until its window ends, then the next day’s', () => {
    const today = { day: '2026-12-01', from: '07:00', to: '11:00' };
    expect(usualTruck(store(), at('2026-12-01', '00:00'))).toEqual(today);
    expect(usualTruck(store(), at('2026-12-01', '11:00') - 1)).toEqual(today);
    expect(usualTruck(store(), at('2026-12-01', '11:00'))).toEqual({ ...today, day: '2026-12-03' });
  });

  test('of a day with two spans is the first that has not ended', () => {
    const receivingHours: Span[] = [{ days: [2], from: '14:00', to: '16:00' }, { days: [2], from: '06:00', to: '08:00' }];
    expect(usualTruck(store({ receivingHours }), at('2026-12-01', '07:00'))?.from).toBe('06:00');
    expect(usualTruck(store({ receivingHours }), at('2026-12-01', '10:00'))).toEqual({ day: '2026-12-01', from: '14:00', to: '16:00' });
  });

  test('of a store with one day a week is next week’s once today’s has been', () => {
    expect(usualTruck(store({ deliveryDays: [2] }), at('2026-12-01', '12:00'))?.day).toBe('2026-12-08');
  });

  test.each([
    [[1], '2026-12-07'],
    [[7], '2026-12-06'],
    [[6], '2026-12-12'],
    [[1, 7], '2026-12-06'],
  ])('seen on a Sunday morning, of days %j is %s', (deliveryDays, day) => {
    // December 6, 2026 is a Sunday: the last day of its week, and Monday the first of the next.
    expect(usualTruck(store({ deliveryDays }), at('2026-12-06', '08:00'))?.day).toBe(day);
  });

  test('goes by the store’s own day, not by UTC', () => {
    // 23:30 on Monday in Chicago is Tuesday in UTC.
    expect(usualTruck(store({ deliveryDays: [1], receivingHours: [], openHours: [0, 24] }), at('2026-11-30', '23:30'))).toEqual({
      day: '2026-11-30',
      from: '00:00',
      to: '23:59',
    });
  });

  test('ends when the clocks of that day say so, in spring and in autumn', () => {
    const early = store({ deliveryDays: [7], receivingHours: [{ days: [7], from: '01:00', to: '04:00' }] });
    // March 14, 2027: 2:00 is skipped, so 4:00 is three hours after midnight. November 1, 2026: 1:00 comes twice.
    const spring = Date.UTC(2027, 2, 14, 9);
    expect([spring - 1, spring].map((now) => usualTruck(early, now)?.day)).toEqual(['2027-03-14', '2027-03-21']);
    const autumn = Date.UTC(2026, 10, 1, 10);
    expect([autumn - 1, autumn].map((now) => usualTruck(early, now)?.day)).toEqual(['2026-11-01', '2026-11-08']);
  });

  test('comes within the first receiving hours of its weekday', () => {
    const receivingHours: Span[] = [
      { days: [1, 2], from: '14:00', to: '16:00' },
      { days: [2], from: '06:30', to: '08:00' },
      { days: [3], from: '01:00', to: '02:00' },
    ];
    expect(usualTruck(store({ receivingHours }), at('2026-12-01', '05:00'))).toEqual({ day: '2026-12-01', from: '06:30', to: '08:00' });
  });

  test('comes while the store is open where it has no receiving hours that day', () => {
    expect(usualTruck(store({ deliveryDays: [6], openHours: [6.5, 21.25] }), at('2026-12-01', '05:00'))).toEqual({ day: '2026-12-05', from: '06:30', to: '21:15' });
  });

  test('is none for a store without days, or one that is never open', () => {
    expect(usualTruck(store({ deliveryDays: [] }), at('2026-12-01', '05:00'))).toBeNull();
    expect(usualTruck(store({ receivingHours: [], openHours: [0, 0] }), at('2026-12-01', '05:00'))).toBeNull();
  });
});
