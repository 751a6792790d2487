import { expect, test } from 'vitest';
import { comingHolidays } from '../../../server/demo/holidays';

const days = (now: number) => comingHolidays(now, 'America/Chicago', 'en').map(({ day }) => day);

test('the coming Christmas and New Year, the sooner first, today among them', () => {
  expect(days(Date.UTC(2026, 11, 1))).toEqual(['2026-12-25', '2027-01-01']);
  // 23:30 on December 25 in Chicago.
  expect(days(Date.UTC(2026, 11, 26, 5, 30))).toEqual(['2026-12-25', '2027-01-01']);
  expect(days(Date.UTC(2026, 11, 26, 6, 30))).toEqual(['2027-01-01', '2027-12-25']);
});

test('by their names in each language', () => {
  expect(comingHolidays(Date.UTC(2026, 11, 1), 'America/Chicago', 'es').map(({ name }) => name)).toEqual(['Navidad', 'Año Nuevo']);
});
