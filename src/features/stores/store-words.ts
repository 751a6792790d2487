import type { TFunction } from 'i18next';
import type { Weekday } from '../../../server/contract/words';
import { addDays, dayOf, instantOf } from '../../../server/domain/civil';
import type { Window } from '../../../server/domain/freezer-standing';
import type { Format } from '../../lib/format';

const hour = 3_600_000;
/** Hours after midnight that people still call the night before (common practice, no published source). */
const nightHours = 5;
const nearDays = 6;

/** How the store's sentences speak of days, beside what the application's formats give. */
export function storeWords(t: TFunction<'store'>, format: Format, now: number) {
  const zone = format.timeZone;
  const today = dayOf(now, zone);

  /** "today", "Thursday", and from a week on "Dec 10", as a part of a sentence. */
  const weekday = (day: string): string => {
    const near = { [today]: 'today', [addDays(today, 1)]: 'tomorrow', [addDays(today, -1)]: 'yesterday' } as const;
    const relative = near[day];
    if (relative) return t(`when.${relative}`);
    const thisWeek = day > addDays(today, -7) && day < addDays(today, 7);
    return thisWeek ? t('when.weekday', { name: format.weekday(instantOf(day, '12:00', zone)) }) : t('when.date', { name: format.day(day) });
  };

  /** "Friday evening", and further on only the day: a run-out is not known finer. */
  const partOfDay = (at: number): string => {
    if (at - now > nearDays * 24 * hour) return weekday(dayOf(at, zone));
    const part = format.partOfDay(at);
    const shift = part === 'night' ? nightHours * hour : 0;
    const day = dayOf(at - shift, zone);
    const said = dayOf(now - shift, zone);
    const context = day === said ? 'today' : part === 'night' && day === addDays(said, -1) ? 'yesterday' : undefined;
    return t(`when.${part}`, { day: weekday(day), context });
  };

  return {
    ...format,
    weekday,
    /** "6:10 am" today, "Mon Nov 30, 6:10 am" before. */
    whenBefore: (at: number) => (dayOf(at, zone) === today ? format.time(at) : format.when(at)),
    partOfDay,
    /** The day of an instant. */
    dayName: (at: number) => weekday(dayOf(at, zone)),
    /** For a mark on a drawing: "Thu". */
    shortDay: (at: number) => format.weekday(at, 'short'),
    ago: (at: number) => format.ago(at, now),
    /** "Today 2:20–3:50", "Thu 9:40–11:10". */
    headline: (window: Window & { day: string }) => (window.day === today ? t('when.window-today', { window: format.times(window) }) : format.window(window)),
    dayAndWindow: (window: Window & { day: string }) => t('when.window', { day: weekday(window.day), window: format.times(window) }),
    weekdays: (days: number[]) => format.list(days.filter(isWeekday).map((day) => format.weekdayName(day))),
  };
}

const isWeekday = (day: number): day is Weekday => Number.isInteger(day) && day >= 1 && day <= 7;
