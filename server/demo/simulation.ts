import { freezers, isNull, sql, stores, type ProducerDb } from '../db';
import { freezersView, type FreezerRow } from '../db/views/freezers';
import { dayOf, hourOf, weekdayOf } from '../domain/civil';
import { inchesToMetres } from '../domain/units';
import type { RawReading } from '../telemetry/readings-of';
import { seeded } from './random';
import { capacityOf, refill, sell, sense, stocked, type Moment, type SimulatedFreezer, type Truth } from './simulated-freezer';
import { trucksOf, type DemoStore } from './trucks';

/** What has gone wrong in the demo, by serial or store, and since when. */
export interface Troubles {
  broken: Record<string, number>;
  silent: Record<string, number>;
  /** Stores whose truck did not come. */
  waiting: Record<string, number>;
}

/** The truth behind every sensor, kept between runs. */
export interface Memory {
  at: Record<string, number>;
  truths: Record<string, Truth>;
  troubles: Troubles;
}

export interface FleetFreezer {
  id: string;
  serial: string;
  /** From when its sensor speaks. */
  since: number;
  store: DemoStore;
  lanes: FreezerRow['lanes'];
  simulated: SimulatedFreezer;
  /** Its place within the half hour. */
  offset: number;
}

export interface Drop {
  storeId: string;
  at: number;
  from: number;
  to: number;
  freezerId: string;
  lines: { productId: string; bags: number }[];
}

const HALF_HOUR = 30 * 60_000;

/** Every freezer with a sensor, with what it sells: a function of its serial. */
export function fleetOf(db: ProducerDb, troubles: Troubles): FleetFreezer[] {
  const places = new Map(
    db.select({ id: stores.id, name: stores.name, timeZone: stores.timeZone, deliveryDays: stores.deliveryDays }).from(stores).where(isNull(stores.retiredAt)).all().map((store) => [store.id, store]),
  );
  const rows = freezersView(db, sql`1`, sql`${freezers.id}`, 10_000);
  return rows.flatMap(({ id, sensor, model, mount, lanes, placement, storeId }) => {
    const store = places.get(storeId);
    if (!sensor || !store) return [];
    const setup = { model, mount: { ...mount, probesIn: sensor.probesIn }, lanes };
    const random = seeded(sensor.serial);
    const eager = /Bait|Marina|Muelle|Faro/.test(store.name) ? 1.5 : 1;
    const dailyPounds = lanes.map((_, lane) => capacityOf(setup, lane) * random.between(0.1, 0.24) * eager);
    const simulated = { setup, dailyPounds, defrosts: model.defrost === 'auto', outdoor: placement === 'outdoor', brokeAt: troubles.broken[sensor.serial] ?? null };
    return [{ id, serial: sensor.serial, since: sensor.since, store, lanes, simulated, offset: random.whole(0, 29) * 60_000 }];
  });
}

/** Lives a freezer from where it was to `until`: what its sensor would have said, and what trucks left. */
export function live(freezer: FleetFreezer, memory: Memory, from: number, until: number): { readings: RawReading[]; drops: Drop[] } {
  const { serial, simulated, store, offset } = freezer;
  const readings: RawReading[] = [];
  const drops: Drop[] = [];
  const stuckSince = memory.troubles.waiting[store.id] ?? Infinity;
  const trucks = trucksOf(store, from, until).filter(({ at }) => at < stuckSince);
  let truth = memory.truths[serial] ?? stocked(simulated, seeded(`${serial} start`));
  let next = Math.floor((from - offset) / HALF_HOUR) * HALF_HOUR + HALF_HOUR + offset;
  for (; next <= until; next += HALF_HOUR) {
    const random = seeded(`${serial} ${next}`);
    const truck = trucks[0] && trucks[0].at <= next ? trucks.shift() : undefined;
    if (truck) {
      const filled = refill(simulated, truth, random);
      truth = filled.truth;
      const lines = freezer.lanes.map(({ productId }, lane) => ({ productId, bags: filled.bags[lane] ?? 0 })).filter(({ bags }) => bags > 0);
      drops.push({ storeId: store.id, at: truck.at, from: truck.from, to: truck.to, freezerId: freezer.id, lines });
    }
    const moment = momentAt(next, store.timeZone);
    truth = sell(simulated, truth, moment, random);
    const jittered = next + random.whole(-20, 20) * 1000;
    if (next >= freezer.since && next < (memory.troubles.silent[serial] ?? Infinity)) readings.push(said(serial, jittered, sense(simulated, truth, moment, random)));
  }
  memory.truths[serial] = truth;
  memory.at[serial] = next - HALF_HOUR;
  return { readings, drops };
}

const moments = new Map<string, Moment>();
/** Many freezers share the same half hours. */
function momentAt(at: number, timeZone: string): Moment {
  const hourStart = Math.floor(at / 3_600_000) * 3_600_000;
  const key = `${timeZone} ${hourStart}`;
  const known = moments.get(key) ?? { at: hourStart, hour: hourOf(hourStart, timeZone), weekday: weekdayOf(dayOf(hourStart, timeZone)), open: false };
  if (moments.size > 5000) moments.clear();
  moments.set(key, known);
  const hour = known.hour + (at - hourStart) / 3_600_000;
  return { at, hour, weekday: known.weekday, open: hour >= 6 && hour < 22 };
}

const said = (serial: string, at: number, { distancesIn, airF, supplyV }: ReturnType<typeof sense>): RawReading => ({
  serial,
  at,
  probes: distancesIn.map((distance) => (distance === null ? null : rounded(inchesToMetres(distance), 3))),
  airC: rounded((airF - 32) / 1.8, 1),
  supplyV: rounded(supplyV, 2),
  conflict: false,
});

const rounded = (value: number, digits: number): number => Number(value.toFixed(digits));
