import type { Format, TimeSpan } from '../../lib/format';

const DAY_MS = 86_400_000;

/** "Thu 9:40–11:10"; a weekday says enough within a week. */
export const truckWords = (truck: TimeSpan, format: Pick<Format, 'window' | 'date' | 'times'>, now: number): string =>
  Math.abs(truck.from - now) < 6 * DAY_MS ? format.window(truck) : `${format.date(truck.from)}, ${format.times(truck)}`;
