import { and, deliveries, deliveryLines, desc, eq, lte, nextTruckLoads, nextTrucks, readings as readingTable, sensors, sql, type Database, writeFleetRows, type ProducerDb } from '../db';
import { membersByRole } from '../db/views/people';
import { dayOf } from '../domain/civil';
import { refreshDays, refreshState, WINDOW_MS } from '../telemetry/refresh-state';
import type { RawReading } from '../telemetry/readings-of';
import type { Drop, FleetFreezer } from './simulation';
import { nextTruckOf, type DemoStore, type Staged } from './trucks';

const DAY = 86_400_000;

/** Writes readings of the past, which the door would find too old; what they mean is worked out once for each freezer. */
export function historyWriter(db: Database, scoped: ProducerDb): (freezer: FleetFreezer, list: RawReading[]) => void {
  const { placeholder } = sql;
  const row = { sensorNo: placeholder('sensorNo'), at: placeholder('at'), probes: placeholder('probes'), airC: placeholder('airC'), supplyV: placeholder('supplyV') };
  const insert = db.insert(readingTable).values(row).onConflictDoNothing().prepare();
  return (freezer, list) => {
    const sensor = scoped.select({ no: sensors.no }).from(sensors).where(eq(sensors.serial, freezer.serial)).get();
    if (!sensor) throw new Error(`no sensor ${freezer.serial}`);
    for (const { at, probes, airC, supplyV } of list) insert.run({ sensorNo: sensor.no, at, probes, airC, supplyV });
    const last = list.at(-1)?.at ?? 0;
    for (let back = 4; back > 0; back -= 1) refreshDays(db, scoped, freezer.id, last - back * (WINDOW_MS - DAY));
    refreshState(db, scoped, freezer.id);
  };
}

/** One delivery for each store and truck, whatever freezers it filled; the same drops again change nothing. */
export function writeDeliveries(scoped: ProducerDb, newId: () => string, lotPrefix: string, drops: Drop[]): void {
  const recordedBy = membersByRole(scoped, ['driver'])[0]?.id ?? null;
  const visits = new Map<string, Drop[]>();
  for (const drop of drops) {
    const key = `${drop.storeId} ${drop.truck.at}`;
    visits.set(key, [...(visits.get(key) ?? []), drop]);
  }
  for (const visit of visits.values()) {
    const [first] = visit;
    if (!first || visit.every(({ lines }) => lines.length === 0)) continue;
    const { storeId, truck } = first;
    const { at, from, to } = truck;
    if (scoped.select({ id: deliveries.id }).from(deliveries).where(and(eq(deliveries.storeId, storeId), eq(deliveries.at, at))).get()) continue;
    const id = newId();
    scoped.insert(deliveries, { id, storeId, at, toldFrom: from, toldTo: to, recordedBy, createdAt: at });
    for (const { freezerId, lines } of visit) {
      for (const { productId, bagPounds, bags, takenBack } of lines) {
        scoped.insert(deliveryLines, { id: newId(), deliveryId: id, freezerId, productId, bags, takenBack, lot: lotOf(lotPrefix, at, bagPounds) });
      }
    }
    removeTrucks(scoped, storeId, truck.day);
  }
}

/** Bagged the day before, small and large bags on different lines. */
const lotOf = (prefix: string, at: number, bagPounds: number): string =>
  `${prefix}-${new Date(at - 86_400_000).toISOString().slice(5, 10).replace('-', '')}-${bagPounds < 10 ? 1 : 2}`;

/** Tells each store that waits for no truck of today or later when its next one comes; what a dispatcher set stands. */
export function setNextTrucks(scoped: ProducerDb, newId: () => string, stores: DemoStore[], staged: Record<string, Staged>, now: number): void {
  const told = new Map(scoped.select({ storeId: nextTrucks.storeId, day: nextTrucks.day }).from(nextTrucks).all().map(({ storeId, day }) => [storeId, day]));
  for (const store of stores) {
    const today = dayOf(now, store.timeZone);
    if ((told.get(store.id) ?? '') >= today) continue;
    const truck = nextTruckOf(store, staged[store.id], now);
    if (!truck || told.get(store.id) === truck.day) continue;
    removeTrucks(scoped, store.id, today);
    const id = newId();
    scoped.insert(nextTrucks, { id, storeId: store.id, day: truck.day, from: truck.from, to: truck.to, updatedAt: now });
    for (const { productId, bags } of usualLoad(scoped, store.id)) scoped.insert(nextTruckLoads, { id: newId(), nextTruckId: id, productId, bags });
    writeFleetRows(scoped, { storeId: store.id });
  }
}

function removeTrucks(scoped: ProducerDb, storeId: string, upTo: string): void {
  const over = scoped.select({ id: nextTrucks.id }).from(nextTrucks).where(and(eq(nextTrucks.storeId, storeId), lte(nextTrucks.day, upTo))).all();
  for (const { id } of over) {
    scoped.delete(nextTruckLoads, eq(nextTruckLoads.nextTruckId, id));
    scoped.delete(nextTrucks, eq(nextTrucks.id, id));
  }
  if (over.length > 0) writeFleetRows(scoped, { storeId });
}

/** As much as the last truck brought. */
function usualLoad(scoped: ProducerDb, storeId: string): { productId: string; bags: number }[] {
  const last = scoped.select({ id: deliveries.id }).from(deliveries).where(eq(deliveries.storeId, storeId)).orderBy(desc(deliveries.at)).limit(1).get();
  if (!last) return [];
  const load = new Map<string, number>();
  for (const { productId, bags } of scoped.select({ productId: deliveryLines.productId, bags: deliveryLines.bags }).from(deliveryLines).where(eq(deliveryLines.deliveryId, last.id)).all()) {
    load.set(productId, (load.get(productId) ?? 0) + bags);
  }
  return [...load].map(([productId, bags]) => ({ productId, bags }));
}
