import type { Reading } from './types';

/** Ice begins to melt: two readings above this (°F) in a row are warm. */
export const WARM_ABOVE_F = 32;

export interface Cooling {
  airF: number | null;
  airAt: number | null;
  /** The first of the unbroken run of readings above 32 °F, when there are at least two. */
  warmSince: number | null;
}

/** The air as it was last heard, and since when it is warm. `readings` in order of time; those without air are passed over. */
export function coolingOf(readings: Reading[]): Cooling {
  const heard = readings.filter((reading): reading is Reading & { airF: number } => reading.airF !== null);
  const last = heard.at(-1);
  if (!last) return { airF: null, airAt: null, warmSince: null };
  const coldBefore = heard.findLastIndex(({ airF }) => airF <= WARM_ABOVE_F);
  const run = heard.slice(coldBefore + 1);
  return { airF: last.airF, airAt: last.at, warmSince: run.length >= 2 ? (run[0]?.at ?? null) : null };
}
