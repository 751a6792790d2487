import { useTranslation } from 'react-i18next';
import type { Language, Weekday } from '../../server/contract/words';
import { addDays, dayOf } from '../../server/domain/civil';

/** The only place where dates, numbers and money become text: U.S. English and U.S. Spanish, a twelve-hour clock. */
export interface FormatOptions {
  locale: Language;
  timeZone: string;
}

export interface TimeSpan {
  from: number;
  to: number;
}

export type Width = 'long' | 'short' | 'narrow';
export type PartOfDay = 'morning' | 'afternoon' | 'evening' | 'night';
export type RelativeDay = 'yesterday' | 'today' | 'tomorrow';

export type Format = ReturnType<typeof makeFormat>;

const browserZone = () => Intl.DateTimeFormat().resolvedOptions().timeZone;

/** In the language shown, and the given time zone; the device's own where none matters. */
export function useFormat(timeZone: string = browserZone()): Format {
  const { i18n } = useTranslation();
  return formatIn({ locale: i18n.language === 'es' ? 'es' : 'en', timeZone });
}

const known = new Map<string, Format>();

export function formatIn({ locale, timeZone }: FormatOptions): Format {
  const key = `${locale} ${timeZone}`;
  const format = known.get(key) ?? makeFormat({ locale, timeZone });
  known.set(key, format);
  return format;
}

/** Instants are milliseconds since 1970 UTC, civil days `YYYY-MM-DD`, money integer cents, shares 0 to 1. */
const makeFormat = (options: FormatOptions) => ({ ...options, ...clockOf(options), ...numbersOf(options), ...agesOf(options) });

const tags: Record<Language, string> = { en: 'en-US', es: 'es-US' };
const minute = 60_000;
const hour = 60 * minute;
const dayLong = 24 * hour;

function clockOf({ locale, timeZone }: FormatOptions) {
  const dates = (shape: Intl.DateTimeFormatOptions, zone = timeZone) => new Intl.DateTimeFormat(tags[locale], { ...shape, timeZone: zone });
  const twelve = dates({ hour: 'numeric', minute: '2-digit', hourCycle: 'h12' });
  const twentyFour = dates({ hour: 'numeric', hourCycle: 'h23' });
  const longDate = dates({ dateStyle: 'long' });
  const months = { local: dates({ month: 'short', day: 'numeric' }), civil: dates({ month: 'short', day: 'numeric' }, 'UTC') };
  const weekdays = weekdayNames(locale, timeZone);

  const hourOf = (at: number) => Number(partOf(twentyFour, at, 'hour'));
  const bare = (at: number) => `${partOf(twelve, at, 'hour')}:${partOf(twelve, at, 'minute')}`;
  const time = (at: number) => `${bare(at)}\u00a0${halfOfDay(partOf(twelve, at, 'dayPeriod'))}`;
  const byDay = (at: number) => hourOf(at) >= 6 && hourOf(at) < 18;
  const weekday = (at: number, width: Width = 'long') => weekdays.local[width].format(at);
  const monthAndDay = (at: number, shape: Intl.DateTimeFormat) => {
    const month = partOf(shape, at, 'month').replace('.', '');
    const day = partOf(shape, at, 'day');
    return locale === 'en' ? `${month} ${day}` : `${day} ${month}`;
  };
  /** "9:40–11:10"; says which half of the day where a truck would be a surprise. */
  const times = ({ from, to }: TimeSpan) => (byDay(from) && byDay(to) ? `${bare(from)}–${bare(to)}` : `${time(from)}–${time(to)}`);
  const date = (at: number) => `${weekday(at, 'short')} ${monthAndDay(at, months.local)}`;
  return {
    time,
    times,
    weekday,
    date,
    weekdayName: (number: Weekday, width: Width = 'long') => weekdays.civil[width].format(firstMonday + (number - 1) * dayLong),
    window: (span: TimeSpan) => `${weekday(span.from, 'short')} ${times(span)}`,
    day: (civil: string) => `${weekdays.civil.short.format(noonOf(civil))} ${monthAndDay(noonOf(civil), months.civil)}`,
    longDate: (at: number) => longDate.format(at),
    when: (at: number) => `${date(at)}, ${time(at)}`,
    partOfDay: (at: number): PartOfDay => partOfDay(hourOf(at)),
    relativeDay: (at: number, now: number): RelativeDay | null => relativeDay(dayOf(at, timeZone), dayOf(now, timeZone)),
  };
}

function numbersOf({ locale }: FormatOptions) {
  const numbers = (shape: Intl.NumberFormatOptions = {}) => new Intl.NumberFormat(tags[locale], shape);
  const whole = numbers({ maximumFractionDigits: 0 });
  const tenths = numbers({ maximumFractionDigits: 1 });
  const percents = numbers({ style: 'percent', maximumFractionDigits: 0 });
  const dollars = numbers({ style: 'currency', currency: 'USD', currencyDisplay: 'narrowSymbol' });
  const lists = new Intl.ListFormat(tags[locale], { type: 'conjunction' });
  return {
    number: (value: number) => whole.format(value),
    percent: (share: number) => percents.format(share),
    pounds: (value: number) => `${whole.format(value)}\u00a0lb`,
    /** What a bag holds, which need not be whole. */
    bagPounds: (value: number) => `${tenths.format(value)}\u00a0lb`,
    degrees: (fahrenheit: number) => `${whole.format(fahrenheit)}\u00a0°F`,
    tenths: (value: number) => tenths.format(value),
    inches: (value: number) => `${tenths.format(value)}″`,
    money: (cents: number) => dollars.format(cents / 100),
    list: (words: string[]) => lists.format(words),
  };
}

function agesOf({ locale }: FormatOptions) {
  const relative = new Intl.RelativeTimeFormat(tags[locale]);
  const rightNow = new Intl.RelativeTimeFormat(tags[locale], { numeric: 'auto' });
  const days = new Intl.NumberFormat(tags[locale], { style: 'unit', unit: 'day', unitDisplay: 'long' });
  return {
    /** "12 minutes ago"; a clock that runs ahead of ours is taken as now. */
    ago: (at: number, now: number): string => {
      const ms = Math.max(0, now - at);
      if (ms < minute) return rightNow.format(0, 'second');
      if (ms < hour) return relative.format(-Math.floor(ms / minute), 'minute');
      if (ms < 2 * dayLong) return relative.format(-Math.floor(ms / hour), 'hour');
      return relative.format(-Math.floor(ms / dayLong), 'day');
    },
    /** "48 min", "2 h 10 min", "3 days". */
    duration: (ms: number): string => {
      const minutes = Math.max(0, Math.round(ms / minute));
      if (minutes < 60) return `${minutes}\u00a0min`;
      if (minutes >= 48 * 60) return days.format(Math.round(minutes / 1440));
      const rest = minutes % 60;
      return `${Math.floor(minutes / 60)}\u00a0h${rest > 0 ? ` ${rest}\u00a0min` : ''}`;
    },
  };
}

function weekdayNames(locale: Language, timeZone: string) {
  const inZone = (zone: string) => {
    const names = (weekday: Width) => new Intl.DateTimeFormat(tags[locale], { weekday, timeZone: zone });
    return { long: names('long'), short: names('short'), narrow: names('narrow') };
  };
  return { local: inZone(timeZone), civil: inZone('UTC') };
}

/** Monday, 1970-01-05. */
const firstMonday = 4 * dayLong;
const noonOf = (civil: string) => Date.parse(`${civil}T12:00:00Z`);

const partOf = (shape: Intl.DateTimeFormat, at: number, type: Intl.DateTimeFormatPartTypes): string =>
  shape.formatToParts(at).find((part) => part.type === type)?.value ?? '';

/** Editions of the locale data differ in spaces and capitals; "am", "a. m.". */
const halfOfDay = (word: string): string => word.toLowerCase().replace(/\s/g, '').replace('.m', '.\u00a0m');

function partOfDay(hour: number): PartOfDay {
  if (hour < 5 || hour >= 21) return 'night';
  if (hour < 12) return 'morning';
  return hour < 18 ? 'afternoon' : 'evening';
}

function relativeDay(day: string, today: string): RelativeDay | null {
  if (day === today) return 'today';
  if (day === addDays(today, 1)) return 'tomorrow';
  return day === addDays(today, -1) ? 'yesterday' : null;
}
