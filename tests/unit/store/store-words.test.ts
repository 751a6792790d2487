import i18next from 'i18next';
import { beforeAll, describe, expect, it } from 'vitest';
import en from '../../../locales/en/store.json';
import es from '../../../locales/es/store.json';
import { storeWords } from '../../../src/features/stores/store-words';
import { formatIn } from '../../../src/lib/format';

const i18n = i18next.createInstance();
beforeAll(() => i18n.init({ resources: { en: { store: en }, es: { store: es } }, lng: 'en', interpolation: { escapeValue: false } }));

/** Chicago is UTC−6 in December; Tuesday, December 1, 2026. */
const chicago = (day: number, hour: number) => Date.UTC(2026, 11, day, hour + 6);
const words = (locale: 'en' | 'es', now = chicago(1, 7)) =>
  storeWords(i18n.getFixedT(locale, 'store'), formatIn({ locale, timeZone: 'America/Chicago' }), now);

describe('days in a sentence', () => {
  it('says near days by their names', () => {
    const { weekday } = words('en');
    expect(['2026-11-30', '2026-12-01', '2026-12-02', '2026-12-04', '2026-12-06'].map(weekday)).toEqual(['yesterday', 'today', 'tomorrow', 'Friday', 'Sunday']);
    expect(['2026-12-02', '2026-12-06'].map(words('es').weekday)).toEqual(['mañana', 'el domingo']);
  });

  it('says a day a week away by its date', () => {
    expect(words('en').weekday('2026-12-08')).toContain('Dec 8');
    expect(words('es').weekday('2026-12-08')).toContain('8 dic');
  });

  it('says a run-out by the part of the day, in the zone of the store', () => {
    const { partOfDay } = words('en');
    expect(partOfDay(chicago(4, 19))).toBe('Friday evening');
    expect(partOfDay(chicago(5, 8))).toBe('Saturday morning');
    expect(partOfDay(chicago(1, 15))).toBe('this afternoon');
    expect(partOfDay(chicago(1, 22))).toBe('tonight');
    expect(words('es').partOfDay(chicago(4, 19))).toBe('el viernes por la noche');
    expect(words('es').partOfDay(chicago(1, 15))).toBe('hoy por la tarde');
  });

  it('gives the hours after midnight to the night before', () => {
    expect(words('en').partOfDay(chicago(5, 2))).toBe('Friday night');
    expect(words('en').partOfDay(chicago(2, 2))).toBe('tonight');
    expect(words('en', chicago(2, 1)).partOfDay(chicago(2, 3))).toBe('tonight');
  });

  it('says no part of a day that is a week away', () => {
    expect(words('en').partOfDay(chicago(10, 19))).not.toContain('evening');
  });

  it('lists the usual days and leaves out what is no day', () => {
    expect(words('en').weekdays([2, 5, 9])).toBe('Tuesday and Friday');
    expect(words('es').weekdays([7])).toBe('domingo');
  });
});
