import { addDays, dayOf, instantOf } from '../domain/civil';
import type { DemoProducer } from './data/producers';
import type { DemoStore, Staged, Truck } from './trucks';

/** What is the matter in the demo, by serial or store. */
export interface Troubles {
  madeAt: number;
  /** When the compressor stopped. */
  broken: Record<string, number>;
  /** When the sensor was last heard. */
  silent: Record<string, number>;
  /** Since when trucks bring no 20 lb bags. */
  short: Record<string, number>;
  /** Trucks that do not come as usual, by store. */
  staged: Record<string, Staged>;
}

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;
/** A world opened later than this has troubles of its own day. */
export const freshFor = 20 * HOUR;

export const noTroubles: Troubles = { madeAt: 0, broken: {}, silent: {}, short: {}, staged: {} };

/**
 * A dead compressor, a sensor silent since yesterday, a 20 lb lane nobody fills, a truck that is late, one that came
 * this morning, and a store that runs out before its next. Trucks staged before that are still to come do come.
 */
export function troublesAt(now: number, demo: DemoProducer, fleet: { serial: string; store: DemoStore }[], before: Troubles): Troubles {
  const { broken, silent, short, late, morning, hungry } = demo.troubles;
  const firstOf = (name: string) => fleet.find(({ store }) => store.name === name);
  // A store may have been renamed or lost its sensor since the demo was made.
  const sensor = (name: string, since: number): Record<string, number> => {
    const one = firstOf(name);
    return one ? { [one.serial]: since } : {};
  };
  const truck = (name: string, stage: (store: DemoStore, now: number) => Staged): Record<string, Staged> => {
    const one = firstOf(name);
    return one ? { [one.store.id]: stage(one.store, now) } : {};
  };
  const ahead = Object.entries(before.staged).filter(([, { trucks }]) => (trucks.at(-1)?.at ?? 0) > now);
  return {
    madeAt: now,
    broken: sensor(broken, now - 4.5 * HOUR),
    silent: sensor(silent, now - 26 * HOUR),
    short: sensor(short, now - 12 * DAY),
    staged: { ...truck(late, lateTruck), ...truck(morning, morningTruck), ...truck(hungry, fewTrucks), ...Object.fromEntries(ahead) },
  };
}

/** Told for earlier today; it comes five hours from now. */
function lateTruck({ timeZone }: DemoStore, now: number): Staged {
  const day = dayOf(now, timeZone);
  const midnight = instantOf(day, '00:00', timeZone);
  const to = Math.max(midnight + 2, floored(now - 50 * MINUTE));
  const from = Math.max(midnight, to - 90 * MINUTE);
  return { from: midnight, trucks: [{ day, from, to, at: now + 5 * HOUR }] };
}

function morningTruck({ timeZone }: DemoStore, now: number): Staged {
  const day = dayOf(now, timeZone);
  const midnight = instantOf(day, '00:00', timeZone);
  const at = Math.max(midnight + MINUTE, Math.min(instantOf(day, '09:40', timeZone), now - 40 * MINUTE));
  const from = floored(at - 30 * MINUTE);
  return { from: midnight, trucks: [{ day, from, to: from + 90 * MINUTE, at }] };
}

/** The last came days ago, the next comes in three days. */
function fewTrucks({ timeZone }: DemoStore, now: number): Staged {
  const on = (days: number): Truck => {
    const day = addDays(dayOf(now, timeZone), days);
    const from = instantOf(day, '09:10', timeZone);
    return { day, from, to: from + 90 * MINUTE, at: from + 45 * MINUTE };
  };
  return { from: instantOf(addDays(dayOf(now, timeZone), -4), '00:00', timeZone), trucks: [on(-4), on(3)] };
}

const floored = (at: number): number => Math.floor(at / (10 * MINUTE)) * 10 * MINUTE;
