import { deliveries, deliveryLines, desc, eq, inArray, nextTruckLoads, nextTrucks, readings as readingTable, sensors, type Database, type ProducerDb } from '../db';
import type { Services } from '../http/context';
import { refreshState } from '../telemetry/refresh-state';
import type { RawReading } from '../telemetry/readings-of';
import type { FleetFreezer, Drop, Memory } from './simulation';
import { nextTruckOf, type DemoStore } from './trucks';

const BATCH = 500;

/** Readings of the past, written behind the door's age limit; states are worked out once at the end. */
export function writeReadings(db: Database, scoped: ProducerDb, freezer: FleetFreezer, list: RawReading[]): void {
  const sensor = scoped.select({ no: sensors.no }).from(sensors).where(eq(sensors.serial, freezer.serial)).get();
  if (!sensor) throw new Error(`no sensor ${freezer.serial}`);
  for (let from = 0; from < list.length; from += BATCH) {
    const rows = list.slice(from, from + BATCH).map(({ at, probes, airC, supplyV, conflict }) => ({ sensorNo: sensor.no, at, probes, airC, supplyV, conflict }));
    db.insert(readingTable).values(rows).onConflictDoNothing().run();
  }
  refreshState(db, scoped, freezer.id);
}

/** One delivery for each store and truck, whatever freezers it filled. */
export function writeDeliveries(scoped: ProducerDb, newId: () => string, lotPrefix: string, drops: Drop[]): void {
  const visits = new Map<string, Drop[]>();
  for (const drop of drops) visits.set(`${drop.storeId} ${drop.at}`, [...(visits.get(`${drop.storeId} ${drop.at}`) ?? []), drop]);
  for (const visit of visits.values()) {
    const [first] = visit;
    if (!first || visit.every(({ lines }) => lines.length === 0)) continue;
    const id = newId();
    const { storeId, at, from, to } = first;
    scoped.insert(deliveries, { id, storeId, at, toldFrom: from, toldTo: to, createdAt: at });
    const lot = `${lotPrefix}-${new Date(at - 86_400_000).toISOString().slice(5, 10).replace('-', '')}`;
    for (const { freezerId, lines } of visit) {
      for (const line of lines) scoped.insert(deliveryLines, { id: newId(), deliveryId: id, freezerId, lot, ...line });
    }
  }
}

/** Sets each store's next truck; a store whose truck did not come keeps the one it waits for. */
export function setNextTrucks({ newId }: Pick<Services, 'newId'>, scoped: ProducerDb, stores: DemoStore[], memory: Memory, now: number): void {
  const waiting = memory.troubles.waiting;
  const due = stores.filter((store) => !(store.id in waiting));
  const known = scoped.select({ id: nextTrucks.id, storeId: nextTrucks.storeId, day: nextTrucks.day }).from(nextTrucks).all();
  for (const store of due) {
    const truck = nextTruckOf(store, now);
    const current = known.find(({ storeId }) => storeId === store.id);
    if (!truck || current?.day === truck.day) continue;
    if (current) {
      scoped.delete(nextTruckLoads, inArray(nextTruckLoads.nextTruckId, [current.id]));
      scoped.delete(nextTrucks, eq(nextTrucks.id, current.id));
    }
    const id = newId();
    scoped.insert(nextTrucks, { id, storeId: store.id, day: truck.day, from: truck.from, to: truck.to, updatedAt: now });
    for (const { productId, bags } of usualLoad(scoped, store.id)) scoped.insert(nextTruckLoads, { id: newId(), nextTruckId: id, productId, bags });
  }
}

/** As much as the last truck brought. */
export function usualLoad(scoped: ProducerDb, storeId: string): { productId: string; bags: number }[] {
  const last = scoped.select({ id: deliveries.id }).from(deliveries).where(eq(deliveries.storeId, storeId)).orderBy(desc(deliveries.at)).limit(1).get();
  if (!last) return [];
  const load = new Map<string, number>();
  for (const { productId, bags } of scoped.select({ productId: deliveryLines.productId, bags: deliveryLines.bags }).from(deliveryLines).where(eq(deliveryLines.deliveryId, last.id)).all()) {
    load.set(productId, (load.get(productId) ?? 0) + bags);
  }
  return [...load].map(([productId, bags]) => ({ productId, bags }));
}
