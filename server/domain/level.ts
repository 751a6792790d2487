import { laneViews, UNSEEN, type LaneView } from './lane-views';
import type { FreezerSetup, Lane, LaneLevel, Level } from './types';
import { BULK_POUNDS_PER_CUBIC_INCH, ICE_POUNDS_PER_CUBIC_INCH } from './units';

/** Beyond the floor by up to this much (in) is an empty column; further is impossible. */
const FLOOR_TOLERANCE_IN = 2;
/** Three thirds written with three digits miss one by a thousandth. */
export const SHARES_TOLERANCE = 0.002;
/** One sd of a probe's own noise (in). Common practice, no published source. */
export const PROBE_NOISE_IN = 0.3;
/** A bag lies flat: its thickness over the edge of a cube of the same volume. Common practice, no published source. */
const FLATNESS = 0.5;
/** One sd more where a lane is not seen by a probe of its own, as a share of a full stack. Chosen, no published source. */
const UNSEEN_SD: Record<LaneView['seen'], number> = { own: 0, boundary: 0.12, borrowed: 0.25 };
/** One sd of pounds per inch before any calibration. */
export const PRIOR_K_SD = 0.2;

export type SetupFault = 'no-lanes' | 'shares' | 'no-stack' | 'no-probes' | 'probe-outside' | 'model';

/** What makes a freezer's level meaningless; empty when nothing does. */
export function setupFaults({ model, mount, lanes }: FreezerSetup): SetupFault[] {
  const sizes = [model.insideWidthIn, model.insideDepthIn, model.insideHeightIn, model.ratedPounds];
  const drops = [mount.channelDropIn, mount.rackIn, mount.headroomIn];
  const sum = lanes.reduce((total, { widthShare }) => total + widthShare, 0);
  const faults: [SetupFault, boolean][] = [
    ['model', sizes.some((size) => !(size > 0 && size < Infinity))],
    ['no-lanes', lanes.length === 0],
    ['shares', Math.abs(sum - 1) > SHARES_TOLERANCE || lanes.some(({ widthShare, bagPounds }) => !(widthShare > 0 && bagPounds > 0 && bagPounds < Infinity))],
    ['no-stack', !(usableStackIn({ model, mount }) > 0) || drops.some((drop) => !(drop >= 0))],
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
  const full = usableStackIn(setup);
  return setup.mount.probesIn.map((_, i) => {
    const distance = possibleDistance(setup, distancesIn[i] ?? null);
    return distance === null ? null : Math.min(full, Math.max(0, floorIn(setup) - distance));
  });
}

/** The distance (in), or null where it is negative or more than two inches beyond the floor. */
export const possibleDistance = (setup: Pick<FreezerSetup, 'model' | 'mount'>, distanceIn: number | null): number | null =>
  distanceIn !== null && distanceIn >= 0 && distanceIn <= floorIn(setup) + FLOOR_TOLERANCE_IN ? distanceIn : null;

/** From a probe's face down to the rack (in). */
const floorIn = ({ model, mount }: Pick<FreezerSetup, 'model' | 'mount'>): number => model.insideHeightIn - mount.channelDropIn - mount.rackIn;

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
  const lanes = setup.lanes.map((lane, i) => laneLevel(setup, lane, views[i] ?? UNSEEN, stacks, kSdShare));
  const pounds = sum(lanes.map((lane) => lane.pounds));
  const capacity = sum(lanes.map((lane) => lane.capacityPounds));
  // Stacks err each by itself; pounds per inch err together, since the rated pounds are one number.
  const stackSd = Math.hypot(...lanes.map((lane) => Math.sqrt(Math.max(0, lane.sdPounds ** 2 - (kSdShare * lane.pounds) ** 2))));
  return { pounds, sdPounds: Math.hypot(stackSd, kSdShare * pounds), capacityPounds: capacity, share: capacity > 0 ? pounds / capacity : 0, lanes };
}

/** One sd of a lane's stack (in): probe noise and half a bag's thickness per column, over the columns seen. */
export function stackSdIn(setup: FreezerSetup, lane: Lane, { weights, seen }: LaneView): number {
  const thickness = FLATNESS * Math.cbrt(lane.bagPounds / BULK_POUNDS_PER_CUBIC_INCH);
  const column = Math.hypot(PROBE_NOISE_IN, thickness / 2 / Math.sqrt(3));
  const columns = column * Math.hypot(...weights.map(([, weight]) => weight));
  return Math.hypot(columns, UNSEEN_SD[seen] * usableStackIn(setup));
}

function laneLevel(setup: FreezerSetup, lane: Lane, view: LaneView, stacks: (number | null)[], kSdShare: number): LaneLevel {
  const stackIn = stackOf(view, stacks);
  const pounds = lanePounds(setup, lane, stackIn);
  const sdPounds = Math.hypot(stackSdPounds(setup, lane, view), kSdShare * pounds);
  return {
    productId: lane.productId,
    pounds,
    sdPounds,
    capacityPounds: lanePounds(setup, lane, usableStackIn(setup)),
    // Whole bags; the guard keeps 59.999999999 from losing one.
    bags: Math.floor(pounds / lane.bagPounds + 1e-6),
    about: sdPounds > lane.bagPounds,
    stackIn,
    borrowed: view.seen === 'borrowed',
  };
}

/** Pounds of a lane's stack (in): never more than solid ice of that height would weigh. */
export function lanePounds(setup: FreezerSetup, lane: Lane, stackIn: number): number {
  const { insideWidthIn, insideDepthIn } = setup.model;
  const volume = insideWidthIn * lane.widthShare * insideDepthIn * stackIn;
  return Math.min(priorPoundsPerInch(setup, lane) * stackIn, volume * ICE_POUNDS_PER_CUBIC_INCH);
}

/** One sd of a lane's pounds from its stack alone. */
export const stackSdPounds = (setup: FreezerSetup, lane: Lane, view: LaneView): number => priorPoundsPerInch(setup, lane) * stackSdIn(setup, lane, view);

/** A lane's stack (in) as its probes tell it. */
export const stackOf = ({ weights }: LaneView, stacks: (number | null)[]): number =>
  weights.reduce((total, [probe, weight]) => total + weight * (stacks[probe] ?? 0), 0);

const sum = (values: number[]): number => values.reduce((total, value) => total + value, 0);
