/** How old a level may be. The usual interval between readings is half an hour (common practice, no published source). */
const INTERVAL_MS = 30 * 60_000;
/** Older than three intervals: shown as old. */
export const OLD_AFTER_MS = 3 * INTERVAL_MS;
/** Older than this: not used for promises. */
export const UNUSABLE_AFTER_MS = 24 * 3_600_000;
/** No reading for this long: the sensor is silent. */
export const SILENT_AFTER_MS = 6 * 3_600_000;

export type Freshness = 'fresh' | 'old' | 'silent' | 'unusable';

/** `at` and `now` in milliseconds. Silence never arrives, so it is worked out from the last reading's time. */
export function freshnessOf(at: number, now: number): Freshness {
  const age = now - at;
  if (age > UNUSABLE_AFTER_MS) return 'unusable';
  if (age > SILENT_AFTER_MS) return 'silent';
  return age > OLD_AFTER_MS ? 'old' : 'fresh';
}
