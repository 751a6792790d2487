import { isotonicNonIncreasing, median } from './signal';

/** How many readings at a segment's ends say where it begins and ends; fewer in a short one. */
const ANCHOR = 3;
const ANCHOR_PART = 1 / 8;

/**
 * Pounds sold from each reading to the next, for one lane: the falls of the non-increasing fit between deliveries.
 * `starts` are the indices of the first reading after each delivery, or after a change of eyes. The fit's ends are
 * biased outward by noise, so they are held within the medians of the first and last readings; a segment that ends no
 * lower than it began sold nothing. Length is that of `pounds`; the first is 0.
 */
export function salesBetween(pounds: number[], starts: number[]): number[] {
  const sales = Array<number>(pounds.length).fill(0);
  const bounds = [0, ...starts, pounds.length];
  for (let n = 0; n + 1 < bounds.length; n += 1) {
    const from = bounds[n] ?? 0;
    const segment = pounds.slice(from, bounds[n + 1]);
    anchoredFalls(segment).forEach((fall, i) => (sales[from + i] = fall));
  }
  return sales;
}

function anchoredFalls(segment: number[]): number[] {
  const count = Math.max(1, Math.min(ANCHOR, Math.floor(segment.length * ANCHOR_PART)));
  const high = median(segment.slice(0, count));
  const low = median(segment.slice(-count));
  if (low >= high) return segment.map(() => 0);
  const fit = isotonicNonIncreasing(segment).map((value) => Math.min(high, Math.max(low, value)));
  // A median stands in the middle of its readings: what sells before the first and after the last is added in proportion.
  const stretch = (segment.length - 1) / (segment.length - count);
  return fit.map((value, i) => ((fit[i - 1] ?? value) - value) * stretch);
}

/** A lane's rate from its whole local days: pounds a day, one sd from day to day, and how many days that is. */
export interface DailyRate {
  poundsPerDay: number;
  sdPounds: number;
  days: number;
}

/**
 * Sales by local day. `midnights` are the starts of consecutive local days and the end of the last; a sale between two
 * readings is shared among the days its time touches. Answers pounds for each day.
 */
export function salesByDay(at: number[], sales: number[], midnights: number[]): number[] {
  const days = Array<number>(Math.max(0, midnights.length - 1)).fill(0);
  let first = 0;
  for (let i = 1; i < at.length; i += 1) {
    const from = at[i - 1] ?? 0;
    const to = at[i] ?? 0;
    while (first < days.length && (midnights[first + 1] ?? Infinity) <= from) first += 1;
    for (let day = first; day < days.length && (midnights[day] ?? Infinity) < to; day += 1) {
      const overlap = Math.min(to, midnights[day + 1] ?? to) - Math.max(from, midnights[day] ?? from);
      if (overlap > 0) days[day] = (days[day] ?? 0) + ((sales[i] ?? 0) * overlap) / (to - from);
    }
  }
  return days;
}

/** The plain rate of whole days; with one day alone, its sd is taken as half of it. */
export function dailyRate(days: number[], bagPounds: number): DailyRate {
  if (days.length === 0) return { poundsPerDay: 0, sdPounds: 0, days: 0 };
  const mean = days.reduce((total, day) => total + day, 0) / days.length;
  const squares = days.reduce((total, day) => total + (day - mean) ** 2, 0);
  const sd = days.length > 1 ? Math.sqrt(squares / (days.length - 1)) : mean / 2;
  // Ice is sold in bags, so a day is never surer than half of one.
  return { poundsPerDay: mean, sdPounds: Math.max(sd, bagPounds / 2), days: days.length };
}
