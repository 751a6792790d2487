import type { Language } from '../contract/words';
import { dayOf } from '../domain/civil';

/** Two federal holidays that have the same date every year (5 U.S.C. 6103). */
const fixed = [
  { date: '01-01', name: { en: 'New Year’s Day', es: 'Año Nuevo' } },
  { date: '12-25', name: { en: 'Christmas Day', es: 'Navidad' } },
];

/** The next of each, the sooner first. */
export function comingHolidays(now: number, timeZone: string, language: Language): { day: string; name: string }[] {
  const today = dayOf(now, timeZone);
  const year = Number(today.slice(0, 4));
  const next = (date: string) => (`${year}-${date}` < today ? `${year + 1}-${date}` : `${year}-${date}`);
  return fixed.map(({ date, name }) => ({ day: next(date), name: name[language] })).toSorted((a, b) => a.day.localeCompare(b.day));
}
