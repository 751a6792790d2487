import { describe, expect, test } from 'vitest';
import { formatIn } from '../../../src/lib/format';

const zone = 'America/Chicago';
const en = formatIn({ locale: 'en', timeZone: zone });
const es = formatIn({ locale: 'es', timeZone: zone });
const at = (iso: string) => Date.parse(iso);
/** Hard spaces keep a number with its unit; here only the words matter. */
const plain = (text: string) => text.replace(/\s/g, ' ');

const morning = at('2026-11-26T15:40:00Z');
const late = at('2026-11-26T17:10:00Z');

describe('clock and calendar', () => {
  test('time of day on a twelve-hour clock', () => {
    expect(plain(en.time(morning))).toBe('9:40 am');
    expect(plain(es.time(morning))).toBe('9:40 a. m.');
    expect(plain(en.time(at('2026-11-26T06:05:00Z')))).toBe('12:05 am');
    expect(plain(es.time(at('2026-11-26T18:00:00Z')))).toBe('12:00 p. m.');
  });

  test('an arrival window', () => {
    expect(en.window({ from: morning, to: late })).toBe('Thu 9:40–11:10');
    expect(es.window({ from: morning, to: late })).toBe('jue 9:40–11:10');
    expect(en.window({ from: late, to: at('2026-11-26T19:00:00Z') })).toBe('Thu 11:10–1:00');
  });

  test('a window outside the working day says which half it means', () => {
    expect(plain(en.times({ from: at('2026-11-26T10:30:00Z'), to: at('2026-11-26T11:30:00Z') }))).toBe('4:30 am–5:30 am');
    expect(plain(es.times({ from: at('2026-11-26T23:30:00Z'), to: at('2026-11-27T01:00:00Z') }))).toBe('5:30 p. m.–7:00 p. m.');
  });

  test('dates and days', () => {
    expect(en.date(morning)).toBe('Thu Nov 26');
    expect(es.date(morning)).toBe('jue 26 nov');
    expect(en.day('2026-12-02')).toBe('Wed Dec 2');
    expect(es.day('2026-12-02')).toBe('mié 2 dic');
    expect(plain(en.when(morning))).toBe('Thu Nov 26, 9:40 am');
    expect(plain(es.when(morning))).toBe('jue 26 nov, 9:40 a. m.');
    expect(es.longDate(morning)).toBe('26 de noviembre de 2026');
    expect(en.weekdayName(1)).toBe('Monday');
    expect(es.weekdayName(7, 'short')).toBe('dom');
    expect(es.weekday(morning, 'narrow')).toBe('J');
  });

  test('an evening that is already tomorrow in UTC stays in its local day', () => {
    const evening = at('2026-11-27T02:00:00Z');
    expect(en.weekday(evening)).toBe('Thursday');
    expect(en.relativeDay(evening, morning)).toBe('today');
    expect(en.relativeDay(at('2026-11-27T06:30:00Z'), morning)).toBe('tomorrow');
    expect(en.relativeDay(at('2026-11-26T05:59:00Z'), morning)).toBe('yesterday');
    expect(en.relativeDay(at('2026-11-29T18:00:00Z'), morning)).toBeNull();
  });

  // The United States change their clocks on 2026-03-08 and 2026-11-01 at 2:00 local.
  test('across the changes of the clock', () => {
    expect(plain(en.time(at('2026-03-08T07:59:00Z')))).toBe('1:59 am');
    expect(plain(en.time(at('2026-03-08T08:00:00Z')))).toBe('3:00 am');
    expect(plain(es.time(at('2026-11-01T06:30:00Z')))).toBe('1:30 a. m.');
    expect(plain(es.time(at('2026-11-01T07:30:00Z')))).toBe('1:30 a. m.');
    expect(en.relativeDay(at('2026-11-02T05:59:00Z'), at('2026-11-01T05:00:00Z'))).toBe('today');
  });

  test.each([
    ['2026-11-26T10:59:00Z', 'night'],
    ['2026-11-26T11:00:00Z', 'morning'],
    ['2026-11-26T18:00:00Z', 'afternoon'],
    ['2026-11-27T00:00:00Z', 'evening'],
    ['2026-11-27T03:00:00Z', 'night'],
  ])('%s is in the %s', (iso, part) => {
    expect(en.partOfDay(at(iso))).toBe(part);
  });
});

describe('numbers', () => {
  test('pounds, percent, degrees, inches, money', () => {
    expect(plain(en.pounds(1506.4))).toBe('1,506 lb');
    expect(plain(es.pounds(1506))).toBe('1,506 lb');
    expect(plain(en.percent(0.62))).toBe('62%');
    expect(plain(en.degrees(17.8))).toBe('18 °F');
    expect(es.inches(11.52)).toBe('11.5″');
    expect(en.money(123456750)).toBe('$1,234,567.50');
    // Node 20's locale data (CLDR 48) writes U.S. Spanish dollars as the English do.
    expect(es.money(123456750)).toBe('$1,234,567.50');
    expect(es.list(['lunes', 'jueves'])).toBe('lunes y jueves');
  });

  test('ages and durations', () => {
    const minutes = (n: number) => morning - n * 60_000;
    expect(en.ago(minutes(12), morning)).toBe('12 minutes ago');
    expect(es.ago(minutes(12), morning)).toBe('hace 12 minutos');
    expect(es.ago(minutes(1), morning)).toBe('hace 1 minuto');
    expect(en.ago(minutes(19 * 60), morning)).toBe('19 hours ago');
    expect(en.ago(minutes(3 * 1440), morning)).toBe('3 days ago');
    expect(en.ago(morning + 5_000, morning)).toBe('now');
    expect(plain(en.duration(130 * 60_000))).toBe('2 h 10 min');
    expect(plain(es.duration(48 * 60_000))).toBe('48 min');
    expect(es.duration(3 * 86_400_000)).toBe('3 días');
  });
});
