import type { FreezerSetup, Mount } from './types';

/** A probe this near a boundary (in) sees the higher of two lanes and tells little of either. */
const NEAR_BOUNDARY_IN = 2.5;

/** Shares written with a few digits do not quite sum to one: a boundary this near the right wall (in) is that wall. */
const WALL_IN = 0.2;

/** Which probes a lane is read from, with weights that sum to one, and whether they are its own. */
export interface LaneView {
  weights: [probe: number, weight: number][];
  seen: 'own' | 'boundary' | 'borrowed';
}
export const UNSEEN: LaneView = { weights: [], seen: 'borrowed' };

interface Span {
  from: number;
  to: number;
}

/**
 * For each lane its own live probes, weighted by how much of its width lies nearest each. One near a boundary weighs
 * nothing beside them and counts only where the lane has no better; a lane without any borrows the nearest.
 */
export function laneViews({ model, mount, lanes }: FreezerSetup, live: boolean[]): LaneView[] {
  let left = 0;
  return lanes.map(({ widthShare }) => {
    const span = { from: left, to: left + widthShare * model.insideWidthIn };
    left = span.to;
    return viewOf(span, mount, model.insideWidthIn, live);
  });
}

function viewOf(span: Span, mount: Mount, width: number, live: boolean[]): LaneView {
  const wanted = (test: (x: number) => boolean) => mount.probesIn.flatMap((x, i) => (live[i] === true && test(x) ? [i] : []));
  const own = wanted((x) => distanceInside(x, span, width) > NEAR_BOUNDARY_IN);
  if (own.length > 0) return { weights: cells(own, mount, span), seen: 'own' };
  const near = wanted((x) => distanceInside(x, span, width) >= -NEAR_BOUNDARY_IN);
  if (near.length > 0) return { weights: near.map((i) => [i, 1 / near.length]), seen: 'boundary' };
  const nearest = closest(wanted(() => true), mount, (span.from + span.to) / 2);
  return nearest === null ? UNSEEN : { weights: [[nearest, 1]], seen: 'borrowed' };
}

/** How far inside the lane's boundaries, negative outside; the freezer's own walls are none. */
const distanceInside = (x: number, { from, to }: Span, width: number): number =>
  Math.min(from > 0 ? x - from : Infinity, to < width - WALL_IN ? to - x : Infinity);

function cells(probes: number[], { probesIn }: Mount, { from, to }: Span): [number, number][] {
  const at = probes.map((i) => ({ i, x: probesIn[i] ?? 0 })).sort((a, b) => a.x - b.x);
  return at.map(({ i, x }, n) => {
    const before = at[n - 1];
    const after = at[n + 1];
    const start = before ? (before.x + x) / 2 : from;
    const end = after ? (after.x + x) / 2 : to;
    return [i, (end - start) / (to - from)];
  });
}

const closest = (probes: number[], { probesIn }: Mount, x: number): number | null =>
  probes.reduce<number | null>((best, i) => (best === null || gap(probesIn, i, x) < gap(probesIn, best, x) ? i : best), null);
const gap = (probesIn: number[], i: number, x: number): number => Math.abs((probesIn[i] ?? 0) - x);
