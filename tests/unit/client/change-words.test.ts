import { expect, test } from 'vitest';
import { numberWords, wordsOf } from '../../../src/features/audit/value-words';
import { formatIn } from '../../../src/lib/format';

/** Hard spaces keep a number with its unit; here only the words matter. */
const said = (field: string, value: number, locale: 'en' | 'es' = 'en') => numberWords(field, value, formatIn({ locale, timeZone: 'America/Chicago' })).replace(/\s/g, ' ');

test('a number is said as its field means it', () => {
  expect(said('widthShare', 0.4)).toBe('40%');
  expect(said('insideWidthIn', 58)).toBe('58″');
  expect(said('probesIn', 10.5)).toBe('10.5″');
  expect(said('bagPounds', 7)).toBe('7 lb');
  expect(said('longitude', -93.1234)).toBe('-93.1234');
  expect(said('deliveryDays', 2)).toBe('Tue');
  expect(said('deliveryDays', 2, 'es')).toBe('mar');
  expect(said('doors', 2)).toBe('2');
  expect(said('from', Date.UTC(2026, 11, 1, 13))).toBe('December 1, 2026, 7:00 am');
});

test('a kind is worded by what it is the kind of', () => {
  expect([wordsOf('Store', 'kind'), wordsOf('Request', 'kind'), wordsOf('Person', 'kind')]).toEqual(['store-form:kinds', 'requests:kinds', 'audit:scopes']);
  expect(wordsOf('Store', 'name')).toBeNull();
});
