import { freshnessOf } from './freshness';

/** What is known of one freezer of a store; `at` is null without a believable reading. */
export interface FreezerGlance {
  sensor: boolean;
  at: number | null;
  share: number | null;
  warmSince: number | null;
  /** Of its first lane; not after `at` where a lane holds no whole bag. */
  runOutLikely: number | null;
}

export type Attention = 'warm' | 'empty' | 'runs-out-first' | 'truck-late' | 'silent' | 'none';

/** The worst thing about a store, for whoever decides where to look first. */
export function attentionOf(freezers: FreezerGlance[], truck: { from: number; to: number } | null, now: number): Attention {
  const believed = freezers.filter(({ at }) => at !== null && freshnessOf(at, now) !== 'unusable');
  if (believed.some(({ warmSince }) => warmSince !== null)) return 'warm';
  if (believed.some(({ at, runOutLikely }) => at !== null && runOutLikely !== null && runOutLikely <= at)) return 'empty';
  if (truck && now > truck.to) return 'truck-late';
  if (believed.some(({ runOutLikely }) => runOutLikely !== null && (truck ? runOutLikely < truck.from : runOutLikely < now + 2 * DAY))) {
    return 'runs-out-first';
  }
  const quiet = freezers.some(({ sensor, at }) => sensor && (at === null || ['silent', 'unusable'].includes(freshnessOf(at, now))));
  return quiet ? 'silent' : 'none';
}

const DAY = 86_400_000;
