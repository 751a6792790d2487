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

const MINUTE = 60_000;

/** The trucks of a store that come after `from` and up to `to`, by its usual days; always the same for the same days. */
export function trucksOf(store: DemoStore, from: number, to: number): Truck[] {
  const trucks: Truck[] = [];
  for (let day = dayOf(from, store.timeZone); day <= dayOf(to, store.timeZone); day = addDays(day, 1)) {
    if (!store.deliveryDays.includes(weekdayOf(day))) continue;
    const truck = truckOn(store, day);
    if (truck.at > from && truck.at <= to) trucks.push(truck);
  }
  return trucks;
}

function truckOn({ name, timeZone }: DemoStore, day: string): Truck {
  const usual = seeded(`${name} usual`).whole(0, 44) * 10;
  const hour = 7 + Math.floor(usual / 60);
  const from = instantOf(day, `${String(hour).padStart(2, '0')}:${String(usual % 60).padStart(2, '0')}`, timeZone);
  return { day, from, to: from + 90 * MINUTE, at: from + Math.round(seeded(`${name} ${day}`).between(-5, 92)) * MINUTE };
}

/** The next one after `now`. */
export const nextTruckOf = (store: DemoStore, now: number): Truck | undefined => trucksOf(store, now, now + 9 * 24 * 60 * MINUTE)[0];
