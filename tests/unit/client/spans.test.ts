import { expect, test } from 'vitest';
import type { Span } from '../../../server/contract/words';
import { spansText } from '../../../src/lib/spans';

/** Hard spaces keep a time with its half of the day; here only the words matter. */
const plain = (text: string) => text.replace(/\s/g, ' ');
const weekdays: Span = { days: [1, 2, 3, 4, 5], from: '07:00', to: '17:00' };

test('days in a row become first to last, in both languages', () => {
  expect(plain(spansText([weekdays], 'en'))).toBe('Mon–Fri 7:00 am–5:00 pm');
  expect(plain(spansText([weekdays], 'es'))).toBe('lun–vie 7:00 a. m.–5:00 p. m.');
});

test('several spans stand in their order', () => {
  expect(plain(spansText([weekdays, { days: [6], from: '08:00', to: '12:00' }], 'en'))).toBe('Mon–Fri 7:00 am–5:00 pm; Sat 8:00 am–12:00 pm');
});

test('two days stay two, single days stay single, whatever order they came in', () => {
  expect(plain(spansText([{ days: [7, 6], from: '08:00', to: '12:30' }], 'en'))).toBe('Sat and Sun 8:00 am–12:30 pm');
  expect(plain(spansText([{ days: [5, 1, 3], from: '00:00', to: '06:00' }], 'es'))).toBe('lun, mié y vie 12:00 a. m.–6:00 a. m.');
  expect(plain(spansText([{ days: [4, 1, 2, 3, 6], from: '12:00', to: '13:00' }], 'en'))).toBe('Mon–Thu and Sat 12:00 pm–1:00 pm');
});

test('no hours, no words', () => expect(spansText([], 'en')).toBe(''));
