import type { Body } from '../../contract/endpoint';
import type { changeStore as changeEndpoint, createStore as createEndpoint, StoreSettings } from '../../contract/store-settings';
import { accounts, and, districts, eq, freezers, isNull, stores, type ProducerDb } from '../../db';
import { storeSettings } from '../../db/views/settings';
import type { ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { changedOf, inUse, retiredAtOf } from '../changed';

/** Answers the store's id. */
export function createStore({ act, now, newId }: ProducerContext, entered: Body<typeof createEndpoint>): string {
  return act('create-store', (tx) => {
    tx.authorise('create', 'Store', {});
    inUse(tx.db.find(accounts, entered.accountId));
    inUse(tx.db.find(districts, entered.districtId));
    const id = newId();
    tx.db.insert(stores, { id, ...entered, createdAt: now });
    tx.audit('Store', id, audited(entered));
    return id;
  });
}

export function changeStore({ act, now }: ProducerContext, id: string, body: Body<typeof changeEndpoint>): void {
  act('change-store', (tx) => {
    const store = settingsOf(tx.db, id);
    tx.authorise('update', 'Store', { id });
    const changed = changedOf(store, body);
    const { retired, ...patch } = changed;
    const isRestored = retired === false;
    if (isRestored || patch.accountId) inUse(tx.db.find(accounts, patch.accountId ?? store.accountId));
    if (isRestored || patch.districtId) inUse(tx.db.find(districts, patch.districtId ?? store.districtId));
    if (retired && freezersIn(tx.db, id).length > 0) throw problem('still-in-use');
    tx.db.update(stores, id, { ...patch, retiredAt: retiredAtOf(retired, now), version: store.version + 1 });
    tx.audit('Store', id, audited(changed));
    // Days are counted by the store's clocks.
    if (patch.timeZone) freezersIn(tx.db, id).forEach((freezerId) => tx.freezerChanged(freezerId));
    else tx.listAnew({ storeId: id });
  });
}

export const settingsOf = (db: ProducerDb, id: string): StoreSettings => orNotFound(storeSettings(db, id));

/** The ids of its freezers in use. */
const freezersIn = (db: ProducerDb, storeId: string): string[] =>
  db
    .select({ id: freezers.id })
    .from(freezers)
    .where(and(eq(freezers.storeId, storeId), isNull(freezers.retiredAt)))
    .all()
    .map(({ id }) => id);

/** Notes for drivers may speak of people, whom the trail does not name. */
const audited = <E extends { driverNotes?: string }>({ driverNotes, ...plain }: E) => ({ ...plain, driverNotes: driverNotes === undefined ? undefined : true });
