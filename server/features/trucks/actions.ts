import type { Body, Result } from '../../contract/endpoint';
import type { setTrucks as setEndpoint } from '../../contract/trucks';
import { and, inArray, stores } from '../../db';
import type { ProducerContext } from '../../http/context';
import { storesWanted } from '../stores/stores-wanted';
import { toldWindow, truckOf, writeTruck, type StorePlace } from './write-truck';

type Wanted = Body<typeof setEndpoint>['trucks'][number];
type Refused = Result<typeof setEndpoint>['refused'][number];
type Window = Exclude<ReturnType<typeof toldWindow>, string>;

/** Tells each of many stores when its truck comes, and says which could not be told and why. */
export function setTrucks(ctx: ProducerContext, { trucks }: Body<typeof setEndpoint>): Result<typeof setEndpoint> {
  const refused: Refused[] = [];
  // Once a store was told, what was seen of its truck is no longer so.
  const told = new Map<string, { window: Window; version: number | null }>();
  const places = placesOf(ctx, trucks);
  for (const wanted of trucks) {
    const { storeId, version } = wanted;
    const window = told.has(storeId) ? 'truck-changed' : judged(ctx, places.get(storeId), wanted);
    if (typeof window === 'string') refused.push({ storeId, problem: window });
    else told.set(storeId, { window, version });
  }
  // An act that changes nothing is none.
  if (told.size === 0) return { set: [], refused };

  ctx.act('set-next-trucks', (tx) => {
    for (const [storeId, { window, version }] of told) {
      tx.authorise('update', 'NextTruck', { storeId });
      const id = writeTruck(tx, ctx, storeId, window, version);
      tx.audit('NextTruck', id, { storeId, ...window });
    }
  });
  return { set: [...told.keys()], refused };
}

/** Nothing comes between this and the act, since both happen without waiting. */
function judged({ db, now }: ProducerContext, store: StorePlace | undefined, wanted: Wanted): Window | Refused['problem'] {
  if (!store) return 'not-found';
  const window = toldWindow(wanted, store, now);
  if (typeof window === 'string') return window;
  return (truckOf(db, store.id)?.version ?? null) === wanted.version ? window : 'truck-changed';
}

/** Those of the stores that this viewer may see. */
function placesOf(ctx: ProducerContext, trucks: Wanted[]): Map<string, StorePlace> {
  const named = inArray(stores.id, trucks.map(({ storeId }) => storeId));
  const found = ctx.db.select({ id: stores.id, timeZone: stores.timeZone }).from(stores).where(and(named, storesWanted(ctx, {}))).all();
  return new Map(found.map((place) => [place.id, place]));
}
