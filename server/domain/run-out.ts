import type { DailyRate } from './sales';
import type { RunOut } from './types';

const DAY_MS = 86_400_000;
export const HORIZON_DAYS = 14;
/** Standard normal quantile of 0.90 (any table of the normal distribution). */
const Z90 = 1.281552;

const NEVER: RunOut = { early: null, likely: null, late: null };

/**
 * A plain run-out from the last days' sales. Pounds sold by day t are taken as normal with mean r·t and variance
 * s²·t + (s²/n)·t² + v, where r and s are the daily rate and its sd over n days and v is the level's variance from its
 * stack alone: pounds per inch scale level and sales alike and cancel. Times are where the level is met at 10, 50 and
 * 90 %, in closed form; null beyond fourteen days, with no whole day seen, or with no sales.
 */
export function plainRunOut(pounds: number, stackSdPounds: number, rate: DailyRate, at: number): RunOut {
  if (pounds <= 0) return { early: at, likely: at, late: at };
  if (rate.days === 0 || rate.poundsPerDay <= 0) return NEVER;
  const { early, late } = crossings(pounds, stackSdPounds, rate);
  return { early: within(early, at), likely: within(pounds / rate.poundsPerDay, at), late: within(late, at) };
}

/** Both roots of (L − r·t)² = z²·(s²·t + s²/n·t² + v): sooner and later than the likely day. */
function crossings(level: number, stackSd: number, { poundsPerDay: r, sdPounds: s, days: n }: DailyRate): { early: number; late: number | null } {
  const z2 = Z90 ** 2;
  const a = r ** 2 - (z2 * s ** 2) / n;
  const b = -(2 * level * r + z2 * s ** 2);
  const c = level ** 2 - z2 * stackSd ** 2;
  const root = Math.sqrt(Math.max(0, b ** 2 - 4 * a * c));
  // Written without dividing by `a`, which may be next to nothing.
  const early = Math.max(0, (2 * c) / (-b + root));
  return { early, late: a > 0 ? (-b + root) / (2 * a) : null };
}

const within = (days: number | null, at: number): number | null =>
  days === null || !(days <= HORIZON_DAYS) ? null : Math.round(at + days * DAY_MS);

/** The lane that runs out first, by its likely time; null when none does. */
export function firstLane(runOuts: RunOut[]): number | null {
  return runOuts.reduce<number | null>((first, { likely }, lane) => {
    if (likely === null) return first;
    const best = first === null ? null : (runOuts[first]?.likely ?? null);
    return best === null || likely < best ? lane : first;
  }, null);
}
