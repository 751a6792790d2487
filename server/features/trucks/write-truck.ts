import { eq, nextTruckLoads, nextTrucks, type ProducerDb } from '../../db';
import { dayOf, instantOf } from '../../domain/civil';
import type { ActionTx, ProducerContext } from '../../http/context';
import { problem } from '../../http/problem';

export interface StorePlace {
  id: string;
  timeZone: string;
}

interface Told {
  day: string;
  from: number;
  to: number;
}

/** The window by the store's clocks, or why no truck can come then. */
export function toldWindow(wanted: { day: string; from: string; to: string }, { timeZone }: StorePlace, now: number): Told | 'day-past' | 'window-backwards' {
  if (wanted.day < dayOf(now, timeZone)) return 'day-past';
  const from = instantOf(wanted.day, wanted.from, timeZone);
  const to = instantOf(wanted.day, wanted.to, timeZone);
  return to > from ? { day: wanted.day, from, to } : 'window-backwards';
}

/** What is to be loaded stays as it was. Whoever saw another version than the one there is told so. Answers the truck's id. */
export function writeTruck(tx: ActionTx, { now, newId }: Pick<ProducerContext, 'now' | 'newId'>, storeId: string, told: Told, seen: number | null): string {
  const known = truckOf(tx.db, storeId);
  if ((known?.version ?? null) !== seen) throw problem('truck-changed');
  // A truck told anew never has a version somebody saw of the one before.
  const row = { ...told, version: seen === null ? now : seen + 1, updatedAt: now };
  const id = known?.id ?? newId();
  tx.db.upsert(nextTrucks, { id, storeId, ...row }, row);
  tx.listAnew({ storeId });
  return id;
}

export function removeTruck(tx: ActionTx, { id, storeId }: { id: string; storeId: string }): void {
  tx.db.delete(nextTruckLoads, eq(nextTruckLoads.nextTruckId, id));
  tx.db.delete(nextTrucks, eq(nextTrucks.id, id));
  tx.listAnew({ storeId });
}

export const truckOf = (db: ProducerDb, storeId: string) =>
  db
    .select({
      id: nextTrucks.id,
      storeId: nextTrucks.storeId,
      version: nextTrucks.version,
      day: nextTrucks.day,
      from: nextTrucks.from,
      to: nextTrucks.to,
    })
    .from(nextTrucks)
    .where(eq(nextTrucks.storeId, storeId))
    .get();
