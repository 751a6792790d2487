import { freezers, isNull, sql, stores, type ProducerDb } from '../db';
import { freezersView } from '../db/views/freezers';
import { dayOf, hourOf, weekdayOf } from '../domain/civil';
import { fahrenheitToCelsius, inchesToMetres } from '../domain/units';
import type { RawReading } from '../telemetry/readings-of';
import { seeded, type Random } from './random';
import { capacityOf, refill, sell, sense, stocked, type Moment, type SimulatedFreezer, type Truth } from './simulated-freezer';
import { noTroubles, type Troubles } from './troubles';
import { trucksOf, type DemoStore, type Truck } from './trucks';

/** The truth behind every sensor and up to when it was lived, kept between runs. */
export interface Memory {
  at: Record<string, number>;
  truths: Record<string, Truth>;
  troubles: Troubles;
}

export const newMemory = (): Memory => ({ at: {}, truths: {}, troubles: noTroubles });

export interface FleetFreezer {
  id: string;
  serial: string;
  /** From when its sensor speaks. */
  since: number;
  store: DemoStore;
  simulated: SimulatedFreezer;
  /** Its place within the half hour. */
  offset: number;
}

export interface DropLine {
  productId: string;
  bagPounds: number;
  bags: number;
  takenBack: number;
}

/** What one truck left in one freezer. */
export interface Drop {
  storeId: string;
  truck: Truck;
  freezerId: string;
  lines: DropLine[];
}

export interface Lived {
  readings: RawReading[];
  drops: Drop[];
  truth: Truth;
  at: number;
}

const HALF_HOUR = 30 * 60_000;

export const storesOf = (db: ProducerDb): DemoStore[] =>
  db.select({ id: stores.id, name: stores.name, timeZone: stores.timeZone, deliveryDays: stores.deliveryDays }).from(stores).where(isNull(stores.retiredAt)).all();

/** Every freezer with a sensor, with what it sells: a function of its serial; the eager store sells much. */
export function fleetOf(db: ProducerDb, eager: string): FleetFreezer[] {
  const places = new Map(storesOf(db).map((store) => [store.id, store]));
  const rows = freezersView(db, sql`1`, sql`${freezers.assetNumber}`, 10_000);
  return rows.flatMap(({ id, sensor, model, mount, lanes, placement, storeId }) => {
    const store = places.get(storeId);
    if (!sensor || !store) return [];
    const setup = { model, mount: { ...mount, probesIn: sensor.probesIn }, lanes };
    const random = seeded(sensor.serial);
    const dailyPounds = lanes.map((_, lane) => capacityOf(setup, lane) * (store.name === eager ? random.between(0.15, 0.165) : random.between(0.09, 0.23)));
    const simulated = { setup, dailyPounds, defrosts: model.defrost === 'auto', outdoor: placement === 'outdoor' };
    return [{ id, serial: sensor.serial, since: sensor.since, store, simulated, offset: random.whole(0, 29) * 60_000 }];
  });
}

export interface Span {
  from: number;
  /** Readings before this are not asked for. */
  speakFrom: number;
  to: number;
}

/** Lives a freezer through a span of time: what its sensor would have said, what trucks left, and how it then stands. */
export function live(freezer: FleetFreezer, { truths, troubles }: Memory, { from, speakFrom, to }: Span): Lived {
  const { serial, simulated, store, offset, since } = freezer;
  const failing = { ...simulated, brokeAt: troubles.broken[serial] ?? null };
  const speaks = { from: Math.max(since, speakFrom), to: troubles.silent[serial] ?? Infinity };
  const shortSince = troubles.short[serial] ?? Infinity;
  const readings: RawReading[] = [];
  const drops: Drop[] = [];
  const trucks = trucksOf(store, troubles.staged[store.id], from, to);
  let truth = truths[serial] ?? stocked(simulated, seeded(`${serial} start`));
  let at = firstAfter(from, offset);
  for (; at <= to; at += HALF_HOUR) {
    const random = seeded(`${serial} ${at}`);
    while (trucks[0] && trucks[0].at <= at) {
      const [truck] = trucks.splice(0, 1);
      if (!truck) break;
      const filled = refill(simulated, truth, random, truck.at > shortSince ? 20 : null);
      truth = filled.truth;
      drops.push({ storeId: store.id, truck, freezerId: freezer.id, lines: linesOf(freezer, filled.bags, random) });
    }
    const moment = momentAt(at, store.timeZone);
    truth = sell(simulated, truth, moment, random);
    const jittered = at + random.whole(-40, 0) * 1000;
    if (at >= speaks.from && at < speaks.to) readings.push(said(serial, jittered, sense(failing, truth, moment, random)));
  }
  return { readings, drops, truth, at: at - HALF_HOUR };
}

const firstAfter = (from: number, offset: number): number => Math.floor((from - offset) / HALF_HOUR) * HALF_HOUR + HALF_HOUR + offset;

function linesOf({ simulated }: FleetFreezer, bags: number[], random: Random): DropLine[] {
  return simulated.setup.lanes.flatMap(({ productId, bagPounds }, lane) => {
    const left = bags[lane] ?? 0;
    return left > 0 ? [{ productId, bagPounds, bags: left, takenBack: random.chance(0.03) ? random.whole(1, 3) : 0 }] : [];
  });
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
  probes: distancesIn.map((distance) => (distance === null ? null : rounded(inchesToMetres(distance), 1000))),
  airC: rounded(fahrenheitToCelsius(airF), 10),
  supplyV: rounded(supplyV, 100),
  conflict: false,
});

const rounded = (value: number, parts: number): number => Math.round(value * parts) / parts;
