import { addDays, dayOf, instantOf, startOfDay } from '../../server/domain/civil';

/** Instants are milliseconds since 1970 UTC, shares 0 to 1. */
export interface ForecastPoint {
  at: number;
  low: number;
  likely: number;
  high: number;
}

export interface RibbonTruck {
  from: number;
  to: number;
  /** A few words, such as "Thu truck". */
  label: string;
}

export interface RibbonData {
  now: number;
  timeZone: string;
  /** [instant, share of full], oldest first. */
  history: readonly (readonly [number, number])[];
  forecast: readonly ForecastPoint[];
  deliveries: readonly { at: number; pounds?: number }[];
  /** Null where none comes; undefined where that is not told. */
  truck: RibbonTruck | null | undefined;
  /** A likely empty stretch before the truck. */
  empty: { from: number; to: number } | null;
  /** Daily highs in °F by civil day. */
  highs?: Readonly<Record<string, number>>;
}

export interface Span {
  from: number;
  to: number;
}

export interface RibbonDay {
  day: string;
  start: number;
  middle: number;
  today: boolean;
  high: number | null;
}

/** What a chart takes: percents, one row an instant, the band as [low, high]. */
export interface RibbonRow {
  at: number;
  past?: number;
  likely?: number;
  band?: [number, number];
}

const daysBack = 4;
const daysAhead = 5;

/** Whole local days around now: as far as there is something to show, and always today and tomorrow. */
export function spanOf({ now, timeZone, history, forecast, truck }: RibbonData): Span {
  const today = dayOf(now, timeZone);
  const oldest = history[0]?.[0] ?? now;
  const furthest = Math.max(forecast.at(-1)?.at ?? now, truck?.to ?? now);
  const first = later(dayOf(oldest, timeZone), addDays(today, -daysBack));
  const last = earlier(later(dayOf(furthest, timeZone), addDays(today, 1)), addDays(today, daysAhead));
  return { from: startOfDay(earlier(first, addDays(today, -1)), timeZone), to: startOfDay(addDays(last, 1), timeZone) };
}

const later = (a: string, b: string) => (a > b ? a : b);
const earlier = (a: string, b: string) => (a < b ? a : b);

export function daysOf({ from, to }: Span, { now, timeZone, highs }: RibbonData): RibbonDay[] {
  const days: RibbonDay[] = [];
  for (let day = dayOf(from, timeZone); startOfDay(day, timeZone) < to; day = addDays(day, 1)) {
    days.push({
      day,
      start: startOfDay(day, timeZone),
      middle: instantOf(day, '12:00', timeZone),
      today: day === dayOf(now, timeZone),
      high: highs?.[day] ?? null,
    });
  }
  return days;
}

export function rowsOf({ from, to }: Span, { history, forecast }: RibbonData): RibbonRow[] {
  const past = history.filter(([at], i) => at >= from || (history[i + 1]?.[0] ?? 0) > from);
  const ahead = forecast.filter(({ at }, i) => at <= to || (forecast[i - 1]?.at ?? Infinity) < to);
  return [
    ...past.map(([at, share]) => ({ at, past: percent(share) })),
    ...ahead.map(({ at, low, likely, high }): RibbonRow => ({ at, likely: percent(likely), band: [percent(low), percent(high)] })),
  ];
}

const percent = (share: number): number => Math.min(100, Math.max(0, share * 100));

interface Word {
  centre: number;
  width: number;
}

const apart = 8;

/** The middles of two words over their marks, moved as little as keeps them apart and inside `left` to `right`. */
export function placeWords(a: Word, b: Word | null, left: number, right: number): [number, number | null] {
  const inside = ({ centre, width }: Word) => Math.min(right - width / 2, Math.max(left + width / 2, centre));
  if (!b) return [inside(a), null];
  const [first, second] = a.centre <= b.centre ? [a, b] : [b, a];
  const need = (first.width + second.width) / 2 + apart;
  const overlap = Math.max(0, need - (inside(second) - inside(first)));
  // Both give way; whoever meets an edge leaves the rest to the other.
  const leftMost = Math.min(inside({ ...first, centre: inside(first) - overlap / 2 }), right - second.width / 2 - need);
  const rightMost = Math.max(inside(second), leftMost + need);
  return first === a ? [leftMost, rightMost] : [rightMost, leftMost];
}
