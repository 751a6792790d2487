import type { RunOut } from './types';

/** The chances that the early and the likely time of a run-out stand for. */
const EARLY = 0.1;
const LIKELY = 0.5;

/**
 * From when on the chance of being empty is above `limit` (0.1 to 0.5), in between as a straight line of time; null where
 * that is beyond the horizon. Where only the early time is known, it is taken: rather too soon than too late.
 */
export function riskAt({ early, likely }: Pick<RunOut, 'early' | 'likely'>, limit: number): number | null {
  if (early === null) return likely;
  if (likely === null) return early;
  return Math.round(early + (likely - early) * ((limit - EARLY) / (LIKELY - EARLY)));
}
