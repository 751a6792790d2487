import type { FreezerSetup, Lane, LaneLevel, Level, Mount } from './types';
import { BULK_POUNDS_PER_CUBIC_INCH, ICE_POUNDS_PER_CUBIC_INCH } from './units';

/** A probe this near a boundary (in) sees the higher of two lanes and tells little of either. */
const NEAR_BOUNDARY_IN = 2.5;
/** Beyond the floor by up to this much (in) is an empty column; further is impossible. */
const FLOOR_TOLERANCE_IN = 2;
/** One sd of a probe's own noise (in). Common practice, no published source. */
export const PROBE_NOISE_IN = 0.3;
/** A bag lies flat: its thickness over the edge of a cube of the same volume. Common practice, no published source. */
const FLATNESS = 0.5;
/** One sd of a borrowed stack, as a share of a full one. */
const BORROWED_SD = 0.25;
/** One sd of pounds per inch before any calibration. */
export const PRIOR_K_SD = 0.2;

export type SetupFault = 'no-lanes' | 'shares' | 'no-stack' | 'no-probes' | 'probe-outside' | 'model';

/** What makes a freezer's level meaningless; empty when nothing does. */
export function setupFaults({ model, mount, lanes }: FreezerSetup): SetupFault[] {
  const sizes = [model.insideWidthIn, model.insideDepthIn, model.insideHeightIn, model.ratedPounds];
  const sum = lanes.reduce((total, { widthShare }) => total + widthShare, 0);
  const faults: [SetupFault, boolean][] = [
    ['model', sizes.some((size) => !(size > 0 && Number.isFinite(size)))],
    ['no-lanes', lanes.length === 0],
    ['shares', Math.abs(sum - 1) > 0.001 || lanes.some(({ widthShare, bagPounds }) => !(widthShare > 0 && bagPounds > 0))],
    ['no-stack', !(usableStackIn({ model, mount }) > 0)],
    ['no-probes', mount.probesIn.length === 0],
    ['probe-outside', mount.probesIn.some((x) => !(x >= 0 && x <= model.insideWidthIn))],
  ];
  return faults.filter(([, wrong]) => wrong).map(([fault]) => fault);
}

/** Height of a full stack (in): inside height less channel drop, floor rack and the headroom kept above it. */
export const usableStackIn = ({ model, mount }: Pick<FreezerSetup, 'model' | 'mount'>): number =>
  model.insideHeightIn - mount.channelDropIn - mount.rackIn - mount.headroomIn;

/** Height of the bags under each probe (in), 0 to a full stack; null where the distance is missing or impossible. */
export function probeStacks(setup: Pick<FreezerSetup, 'model' | 'mount'>, distancesIn: (number | null)[]): (number | null)[] {
  const { model, mount } = setup;
  const floor = model.insideHeightIn - mount.channelDropIn - mount.rackIn;
  const full = usableStackIn(setup);
  return mount.probesIn.map((_, i) => {
    const distance = distancesIn[i] ?? null;
    if (distance === null || !(distance >= 0 && distance <= floor + FLOOR_TOLERANCE_IN)) return null;
    return Math.min(full, Math.max(0, floor - distance));
  });
}

/** Pounds in an inch of a lane's stack before calibration: rated pounds by share of the width over a full stack. */
export const priorPoundsPerInch = (setup: FreezerSetup, lane: Lane): number =>
  (setup.model.ratedPounds * lane.widthShare) / usableStackIn(setup);

/**
 * What one set of distances means: pounds and whole bags per lane with one sd, and the freezer as a whole.
 * `kSdShare` is the sd of pounds per inch as a share of it. Null when no probe tells anything or the setup cannot be.
 */
export function levelOf(setup: FreezerSetup, distancesIn: (number | null)[], kSdShare = PRIOR_K_SD): Level | null {
  if (setupFaults(setup).length > 0) return null;
  const stacks = probeStacks(setup, distancesIn);
  if (stacks.every((stack) => stack === null)) return null;
  const views = laneViews(setup, stacks.map((stack) => stack !== null));
  const lanes = setup.lanes.map((lane, i) => laneLevel(setup, lane, views[i] ?? NO_VIEW, stacks, kSdShare));
  const pounds = sum(lanes.map((lane) => lane.pounds));
  const capacity = sum(lanes.map((lane) => lane.capacityPounds));
  // Stacks err each by itself; pounds per inch err together, since the rated pounds are one number.
  const stackSd = Math.hypot(...lanes.map((lane) => Math.sqrt(Math.max(0, lane.sdPounds ** 2 - (kSdShare * lane.pounds) ** 2))));
  return { pounds, sdPounds: Math.hypot(stackSd, kSdShare * pounds), capacityPounds: capacity, share: capacity > 0 ? pounds / capacity : 0, lanes };
}

/**
 * Reads pounds by lane from many sets of distances of one sound setup; null where no probe tells anything. The same
 * numbers as `levelOf`, without what only the latest needs.
 */
export function poundsReader(setup: FreezerSetup): (distancesIn: (number | null)[]) => number[] | null {
  const views = new Map<string, LaneView[]>();
  const poundsPerInch = setup.lanes.map((lane) => priorPoundsPerInch(setup, lane));
  return (distancesIn) => {
    const stacks = probeStacks(setup, distancesIn);
    const live = stacks.map((stack) => stack !== null);
    if (!live.includes(true)) return null;
    const key = live.join();
    const known = views.get(key) ?? laneViews(setup, live);
    views.set(key, known);
    return setup.lanes.map((lane, i) => withinVolume(setup, lane, poundsPerInch[i] ?? 0, stackOf(known[i] ?? NO_VIEW, stacks)));
  };
}

const stackOf = ({ weights }: LaneView, stacks: (number | null)[]): number => sum(weights.map(([i, weight]) => weight * (stacks[i] ?? 0)));

/** Which probes a lane is read from, with weights that sum to one. */
export interface LaneView {
  weights: [probe: number, weight: number][];
  borrowed: boolean;
}
const NO_VIEW: LaneView = { weights: [], borrowed: true };

/**
 * For each lane its own live probes, weighted by how much of its width lies nearest each; one near a boundary only
 * where the lane has no better; a lane without any borrows the nearest.
 */
export function laneViews({ model, mount, lanes }: FreezerSetup, live: boolean[]): LaneView[] {
  const width = model.insideWidthIn;
  let left = 0;
  return lanes.map(({ widthShare }) => {
    const span = { from: left, to: left + widthShare * width };
    left = span.to;
    const own = indices(mount, (x, i) => live[i] === true && x >= span.from && x <= span.to);
    const clear = own.filter((i) => distanceToBoundary(mount.probesIn[i] ?? 0, span, width) > NEAR_BOUNDARY_IN);
    if (clear.length > 0) return { weights: cells(clear, mount, span), borrowed: false };
    const near = indices(mount, (x, i) => live[i] === true && x >= span.from - NEAR_BOUNDARY_IN && x <= span.to + NEAR_BOUNDARY_IN);
    if (near.length > 0) return { weights: near.map((i) => [i, 1 / near.length]), borrowed: false };
    const nearest = closest(indices(mount, (_, i) => live[i] === true), mount, (span.from + span.to) / 2);
    return nearest === null ? NO_VIEW : { weights: [[nearest, 1]], borrowed: true };
  });
}

interface Span {
  from: number;
  to: number;
}

const indices = ({ probesIn }: Mount, wanted: (x: number, i: number) => boolean): number[] =>
  probesIn.flatMap((x, i) => (wanted(x, i) ? [i] : []));

/** To the nearest boundary between lanes; the freezer's own walls are none. */
const distanceToBoundary = (x: number, { from, to }: Span, width: number): number =>
  Math.min(from > 0 ? x - from : Infinity, to < width - 1e-6 ? to - x : Infinity);

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

/** One sd of a lane's stack (in): probe noise and half a bag's thickness per column, over the columns seen. */
export function stackSdIn(setup: FreezerSetup, lane: Lane, { weights, borrowed }: LaneView): number {
  const thickness = FLATNESS * Math.cbrt(lane.bagPounds / BULK_POUNDS_PER_CUBIC_INCH);
  const column = Math.hypot(PROBE_NOISE_IN, thickness / 2 / Math.sqrt(3));
  const seen = column * Math.hypot(...weights.map(([, weight]) => weight));
  return borrowed ? Math.hypot(seen, BORROWED_SD * usableStackIn(setup)) : seen;
}

function laneLevel(setup: FreezerSetup, lane: Lane, view: LaneView, stacks: (number | null)[], kSdShare: number): LaneLevel {
  const stackIn = stackOf(view, stacks);
  const k = priorPoundsPerInch(setup, lane);
  const pounds = withinVolume(setup, lane, k, stackIn);
  const sdPounds = Math.hypot(k * stackSdIn(setup, lane, view), kSdShare * pounds);
  return {
    productId: lane.productId,
    pounds,
    sdPounds,
    capacityPounds: withinVolume(setup, lane, k, usableStackIn(setup)),
    // Whole bags; the guard keeps 59.999999999 from losing one.
    bags: Math.floor(pounds / lane.bagPounds + 1e-6),
    about: sdPounds > lane.bagPounds,
    stackIn,
    borrowed: view.borrowed,
  };
}

/** Never more than solid ice of that height would weigh. */
function withinVolume({ model }: FreezerSetup, lane: Lane, k: number, stackIn: number): number {
  const volume = model.insideWidthIn * lane.widthShare * model.insideDepthIn * stackIn;
  return Math.min(k * stackIn, volume * ICE_POUNDS_PER_CUBIC_INCH);
}

const sum = (values: number[]): number => values.reduce((total, value) => total + value, 0);
