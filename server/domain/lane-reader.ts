import { lanePounds, stackOf, stackSdPounds } from './level';
import { laneViews, UNSEEN, type LaneView } from './lane-views';
import type { FreezerSetup } from './types';

type Stacks = (number | null)[];

/** What the live probes of one reading tell: pounds by lane. `live` names the probes, so that alike readings are known. */
export interface Told {
  at: number;
  distancesIn: (number | null)[];
  stacks: Stacks;
  live: string;
  pounds: number[];
}

/** By how much each lane rose, and one sd of that. */
export interface Rise {
  pounds: number[];
  sdPounds: number[];
}

export interface LaneReader {
  /** Pounds by lane and one sd from the stacks alone. */
  read: (stacks: Stacks) => { live: string; pounds: number[]; sdPounds: number[] };
  /** Judged by the probes live both times: one that falls silent or comes back moves no ice. Null without any. */
  rise: (before: Told, after: Told) => Rise | null;
}

/** Reads many stacks of one sound setup; lane by lane the same numbers as `levelOf`. */
export function laneReader(setup: FreezerSetup): LaneReader {
  const known = new Map<string, { views: LaneView[]; sdPounds: number[] }>();

  const eyes = (live: string, stacks: Stacks) => {
    const found = known.get(live);
    if (found) return found;
    const views = laneViews(setup, stacks.map((stack) => stack !== null));
    const made = { views, sdPounds: setup.lanes.map((lane, i) => stackSdPounds(setup, lane, views[i] ?? UNSEEN)) };
    known.set(live, made);
    return made;
  };

  const read = (stacks: Stacks) => {
    const live = liveOf(stacks);
    const { views, sdPounds } = eyes(live, stacks);
    return { live, pounds: setup.lanes.map((lane, i) => lanePounds(setup, lane, stackOf(views[i] ?? UNSEEN, stacks))), sdPounds };
  };

  const rise = (before: Told, after: Told): Rise | null => {
    if (before.live === after.live) return difference(before.pounds, after.pounds, eyes(after.live, after.stacks).sdPounds);
    const earlier = read(before.stacks.map((stack, i) => (after.stacks[i] === null ? null : stack)));
    const later = read(after.stacks.map((stack, i) => (before.stacks[i] === null ? null : stack)));
    return later.live.includes('1') ? difference(earlier.pounds, later.pounds, later.sdPounds) : null;
  };

  return { read, rise };
}

const liveOf = (stacks: Stacks): string => stacks.reduce<string>((live, stack) => live + (stack === null ? '0' : '1'), '');

const difference = (before: number[], after: number[], sdPounds: number[]): Rise => ({
  pounds: after.map((pounds, lane) => pounds - (before[lane] ?? 0)),
  sdPounds: sdPounds.map((sd) => Math.SQRT2 * sd),
});
