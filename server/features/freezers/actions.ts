import type { Body } from '../../contract/endpoint';
import type { changeFreezer as changeEndpoint, createFreezer as createEndpoint, FreezerSettings } from '../../contract/freezer-settings';
import { and, eq, freezers, gte, lanes, max, models, stores, type ProducerDb } from '../../db';
import { freezerSettings } from '../../db/views/settings';
import type { ActionTx, ProducerContext } from '../../http/context';
import { orNotFound } from '../../http/problem';
import { changedOf, inUse, refuseTaken, retiredAtOf } from '../changed';
import { currentInstalls, endInstalls } from './installs';
import { refuseImpossible } from './setup';

/** Stands last in its store. Answers the freezer's id. */
export function createFreezer(ctx: ProducerContext, { lanes: wanted, mount, ...entered }: Body<typeof createEndpoint>): string {
  return ctx.act('create-freezer', (tx) => {
    tx.authorise('create', 'Freezer', { storeId: entered.storeId });
    inUse(tx.db.find(stores, entered.storeId));
    inUse(tx.db.find(models, entered.modelId));
    refuseTaken('/assetNumber', holderOf(tx.db, entered.assetNumber));
    refuseImpossible(tx.db, { ...entered, mount, lanes: wanted });
    const id = ctx.newId();
    tx.db.insert(freezers, { id, ...entered, ...mount, position: nextPosition(tx.db, entered.storeId), createdAt: ctx.now });
    writeLanes(ctx, tx, id, wanted);
    tx.audit('Freezer', id, { ...entered, mount, lanes: wanted });
    tx.freezerChanged(id);
    return id;
  });
}

export function changeFreezer(ctx: ProducerContext, id: string, body: Body<typeof changeEndpoint>): void {
  ctx.act('change-freezer', (tx) => {
    const freezer = settingsOf(tx.db, id);
    tx.authorise('update', 'Freezer', { id, storeId: freezer.storeId });
    const changed = changedOf(freezer, body);
    refuseWrong(tx.db, freezer, changed);
    const { retired, lanes: wanted, mount, ...patch } = changed;
    tx.db.update(freezers, id, {
      ...patch,
      ...mount,
      position: patch.storeId === undefined ? undefined : nextPosition(tx.db, patch.storeId),
      retiredAt: retiredAtOf(retired, ctx.now),
      version: freezer.version + 1,
    });
    if (wanted) writeLanes(ctx, tx, id, wanted);
    if (retired) endInstalls(tx, currentInstalls(tx.db, { freezerId: id }), ctx.now);
    tx.audit('Freezer', id, changed);
    tx.freezerChanged(id);
  });
}

export const settingsOf = (db: ProducerDb, id: string): FreezerSettings => orNotFound(freezerSettings(db, id));

/** What stays as it was is not asked about again, unless the freezer comes back into use with it. */
function refuseWrong(db: ProducerDb, freezer: FreezerSettings, changed: Partial<FreezerSettings>): void {
  const wanted = { ...freezer, ...changed };
  const isRestored = changed.retired === false;
  if (isRestored || changed.storeId) inUse(db.find(stores, wanted.storeId));
  if (isRestored || changed.modelId) inUse(db.find(models, wanted.modelId));
  if (changed.assetNumber !== undefined) refuseTaken('/assetNumber', holderOf(db, changed.assetNumber), freezer.id);
  if (isRestored || changed.modelId || changed.mount || changed.lanes) {
    const [install] = currentInstalls(db, { freezerId: freezer.id });
    refuseImpossible(db, wanted, { probesIn: install?.probesIn, kept: freezer.lanes });
  }
}

const holderOf = (db: ProducerDb, assetNumber: string) =>
  db.select({ id: freezers.id }).from(freezers).where(eq(freezers.assetNumber, assetNumber)).get();

function nextPosition(db: ProducerDb, storeId: string): number {
  const last = db.select({ position: max(freezers.position) }).from(freezers).where(eq(freezers.storeId, storeId)).get()?.position ?? -1;
  return last + 1;
}

function writeLanes({ newId }: ProducerContext, { db }: ActionTx, freezerId: string, wanted: FreezerSettings['lanes']): void {
  const stored = db.select({ id: lanes.id, position: lanes.position }).from(lanes).where(eq(lanes.freezerId, freezerId)).all();
  wanted.forEach((lane, position) => {
    const known = stored.find((one) => one.position === position);
    if (known) db.update(lanes, known.id, lane);
    else db.insert(lanes, { id: newId(), freezerId, position, ...lane });
  });
  const beyond = and(eq(lanes.freezerId, freezerId), gte(lanes.position, wanted.length));
  if (beyond) db.delete(lanes, beyond);
}
