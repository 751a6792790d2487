import type { Span } from '../contract/words';
import { addDays, dayOf, instantOf, weekdayOf } from './civil';

/** What a store says of when trucks come; `openHours` are hours of the day with their fractions. */
export interface UsualDays {
  timeZone: string;
  deliveryDays: number[];
  receivingHours: Span[];
  openHours: [number, number];
}

export interface TruckWindow {
  day: string;
  from: string;
  to: string;
}

/** The next window of a store's usual delivery days that has not ended; null where it has none. */
export function usualTruck(store: UsualDays, now: number): TruckWindow | null {
  const today = dayOf(now, store.timeZone);
  // Today's windows may have ended, so the same day of next week counts too.
  for (let ahead = 0; ahead <= 7; ahead += 1) {
    const day = addDays(today, ahead);
    const coming = store.deliveryDays.includes(weekdayOf(day)) && windowsOf(store, weekdayOf(day)).find(({ to }) => instantOf(day, to, store.timeZone) > now);
    if (coming) return { day, ...coming };
  }
  return null;
}

type Hours = Omit<TruckWindow, 'day'>;

/** The day's receiving hours, earliest first, else the hours in which the store is open. */
function windowsOf({ receivingHours, openHours: [opens, closes] }: UsualDays, weekday: number): Hours[] {
  const receiving = receivingHours.filter(({ days }) => days.some((day) => day === weekday)).map(({ from, to }) => ({ from, to }));
  if (receiving.length > 0) return receiving.sort((a, b) => a.from.localeCompare(b.from));
  return closes > opens ? [{ from: clock(opens), to: clock(closes) }] : [];
}

const LAST_MINUTE = 24 * 60 - 1;

/** Midnight at the end of a day is its last minute, since clocks do not show 24:00. */
function clock(hours: number): string {
  const minutes = Math.min(Math.round(hours * 60), LAST_MINUTE);
  return `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`;
}
