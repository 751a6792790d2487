import type { Body } from '../../contract/endpoint';
import type { recordDelivery as recordEndpoint, setNextTruck as setEndpoint } from '../../contract/deliveries';
import {
  deliveries,
  deliveryLines,
  eq,
  freezers,
  inArray,
  nextTruckLoads,
  products,
  type ProducerDb,
} from '../../db';
import { startOfDay } from '../../domain/civil';
import type { ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { removeTruck, toldWindow, truckOf, writeTruck, type StorePlace } from '../trucks/write-truck';

/** Tells a store when its next truck comes; whoever saw another version is told so first. */
export function setNextTruck({ act, now, newId }: ProducerContext, store: StorePlace, body: Body<typeof setEndpoint>): void {
  const { load } = body;
  const told = toldWindow(body, store, now);
  if (typeof told === 'string') throw problem(told);

  act('set-next-truck', (tx) => {
    tx.authorise('update', 'NextTruck', { storeId: store.id });
    const id = writeTruck(tx, { now, newId }, store.id, told, body.version);
    knownProducts(tx.db, load.map(({ productId }) => productId));
    tx.db.delete(nextTruckLoads, eq(nextTruckLoads.nextTruckId, id));
    for (const { productId, bags } of summed(load)) {
      tx.db.insert(nextTruckLoads, { id: newId(), nextTruckId: id, productId, bags });
    }
    tx.audit('NextTruck', id, { storeId: store.id, ...told, load });
  });
}

export function clearNextTruck({ act }: ProducerContext, store: StorePlace): void {
  act('clear-next-truck', (tx) => {
    tx.authorise('delete', 'NextTruck', { storeId: store.id });
    const known = orNotFound(truckOf(tx.db, store.id));
    removeTruck(tx, known);
    tx.audit('NextTruck', known.id, { storeId: store.id, cleared: true });
  });
}

const CLOCK_SLACK_MS = 5 * 60_000;

/** Records what was left at a store; the truck that was announced for then has come. Answers the delivery's id. */
export function recordDelivery({ act, now, newId, viewer }: ProducerContext, store: StorePlace, { at, lines }: Body<typeof recordEndpoint>): string {
  if (at > now + CLOCK_SLACK_MS) throw problem('time-ahead');
  return act('record-delivery', (tx) => {
    tx.authorise('create', 'Delivery', { storeId: store.id });
    knownProducts(tx.db, lines.map(({ productId }) => productId));
    for (const { freezerId } of lines) if (freezerId !== null) freezerOfStore(tx.db, freezerId, store.id);
    const truck = truckOf(tx.db, store.id);
    const came = truck && at >= startOfDay(truck.day, store.timeZone) ? truck : undefined;
    const id = newId();
    tx.db.insert(deliveries, {
      id,
      storeId: store.id,
      at,
      toldFrom: came?.from ?? null,
      toldTo: came?.to ?? null,
      recordedBy: viewer.membershipId,
      createdAt: now,
    });
    for (const line of lines) tx.db.insert(deliveryLines, { id: newId(), deliveryId: id, ...line });
    if (came) removeTruck(tx, came);
    tx.audit('Delivery', id, { storeId: store.id, at, lines });
    return id;
  });
}

function knownProducts(db: ProducerDb, ids: string[]): void {
  const wanted = [...new Set(ids)];
  if (wanted.length === 0) return;
  const known = db.select({ id: products.id }).from(products).where(inArray(products.id, wanted)).all();
  if (known.length !== wanted.length) throw problem('unknown-product');
}

export function freezerOfStore(db: ProducerDb, freezerId: string, storeId: string): void {
  if (db.find(freezers, freezerId)?.storeId !== storeId) throw problem('freezer-elsewhere');
}

/** The same product named twice is one line. */
function summed(load: { productId: string; bags: number }[]): { productId: string; bags: number }[] {
  const byProduct = new Map<string, number>();
  for (const { productId, bags } of load) byProduct.set(productId, (byProduct.get(productId) ?? 0) + bags);
  return [...byProduct].map(([productId, bags]) => ({ productId, bags })).filter(({ bags }) => bags > 0);
}
