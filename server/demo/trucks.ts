import { addDays, dayOf, instantOf, weekdayOf } from '../domain/civil';
import { seeded } from './random';

export interface DemoStore {
  id: string;
  name: string;
  timeZone: string;
  deliveryDays: number[];
}

export interface Truck {
  day: string;
  /** What the store is told. */
  from: number;
  to: number;
  /** When it really comes. */
  at: number;
}

/** From then on these trucks come to a store and no others, until the last of them has come. */
export interface Staged {
  from: number;
  trucks: Truck[];
}

const MINUTE = 60_000;
const HORIZON = 9 * 24 * 60 * MINUTE;

/** The trucks of a store that come after `from` and up to `to`; always the same for the same days. */
export function trucksOf(store: DemoStore, staged: Staged | undefined, from: number, to: number): Truck[] {
  const comes = ({ at }: Truck) => at > from && at <= to;
  const usual = usualTrucks(store, from, to).filter(comes);
  if (!staged) return usual;
  const last = staged.trucks.at(-1);
  const besides = usual.filter(({ at, day }) => at < staged.from || (last !== undefined && at > last.at && day > last.day));
  return [...besides, ...staged.trucks.filter(comes)].sort((a, b) => a.at - b.at);
}

/** The next one that has not come by `now`, late or not. */
export const nextTruckOf = (store: DemoStore, staged: Staged | undefined, now: number): Truck | undefined => trucksOf(store, staged, now, now + HORIZON)[0];

function usualTrucks(store: DemoStore, from: number, to: number): Truck[] {
  const trucks: Truck[] = [];
  for (let day = dayOf(from, store.timeZone); day <= dayOf(to, store.timeZone); day = addDays(day, 1)) {
    if (store.deliveryDays.includes(weekdayOf(day))) trucks.push(truckOn(store, day));
  }
  return trucks;
}

function truckOn({ name, timeZone }: DemoStore, day: string): Truck {
  const usual = seeded(`${name} usual`).whole(0, 44) * 10;
  const hour = 7 + Math.floor(usual / 60);
  const from = instantOf(day, `${String(hour).padStart(2, '0')}:${String(usual % 60).padStart(2, '0')}`, timeZone);
  return { day, from, to: from + 90 * MINUTE, at: from + Math.round(seeded(`${name} ${day}`).between(-5, 104)) * MINUTE };
}
