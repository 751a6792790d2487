import { isDeepStrictEqual } from 'node:util';
import type { Body } from '../../contract/endpoint';
import type { tieSensor as tieEndpoint } from '../../contract/freezer-settings';
import { allowed, and, eq, freezers, installs, isNull, sensors, type ProducerDb } from '../../db';
import { freezerSettings } from '../../db/views/settings';
import type { ActionTx, ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { refuseImpossible } from './setup';

/** Hangs a sensor in a freezer from now on; what was measured before stays with where it was measured. */
export function tieSensor(ctx: ProducerContext, freezerId: string, { sensorId, probesIn, move }: Body<typeof tieEndpoint>): void {
  ctx.act('tie-sensor', (tx) => {
    const freezer = readableFreezer(ctx, tx.db, freezerId);
    tx.authorise('create', 'Install', { freezerId, storeId: freezer.storeId });
    if (!tx.db.find(sensors, sensorId)) throw problem('unknown-sensor');
    const elsewhere = currentInstalls(tx.db, { sensorId }).filter((install) => install.freezerId !== freezerId);
    // Out of a freezer they may not see nobody takes anything.
    if (elsewhere.some((install) => !move || !isReadable(ctx, tx.db, install.freezerId))) throw problem('sensor-elsewhere');
    refuseImpossible(tx.db, freezer, { probesIn, kept: freezer.lanes });

    const here = currentInstalls(tx.db, { freezerId });
    const isAsAsked = here.length === 1 && here.every((install) => install.sensorId === sensorId && isDeepStrictEqual(install.probesIn, probesIn));
    if (!isAsAsked) {
      endInstalls(tx, [...elsewhere, ...here], ctx.now);
      tx.db.insert(installs, { id: ctx.newId(), sensorId, freezerId, probesIn, from: ctx.now });
    }
    tx.audit('Freezer', freezerId, { sensorId, probesIn });
    tx.freezerChanged(freezerId);
    for (const left of elsewhere) {
      tx.audit('Freezer', left.freezerId, { sensorId: null });
      tx.freezerChanged(left.freezerId);
    }
  });
}

export function takeSensorOff(ctx: ProducerContext, freezerId: string): void {
  ctx.act('take-sensor-off', (tx) => {
    const { storeId } = readableFreezer(ctx, tx.db, freezerId);
    tx.authorise('update', 'Install', { freezerId, storeId });
    const here = currentInstalls(tx.db, { freezerId });
    if (here.length === 0) throw problem('not-found');
    endInstalls(tx, here, ctx.now);
    tx.audit('Freezer', freezerId, { sensorId: null });
    tx.freezerChanged(freezerId);
  });
}

export type Install = Pick<typeof installs.$inferSelect, 'id' | 'sensorId' | 'freezerId' | 'probesIn'>;

export const currentInstalls = (db: ProducerDb, of: { freezerId: string } | { sensorId: string }): Install[] =>
  db
    .select({ id: installs.id, sensorId: installs.sensorId, freezerId: installs.freezerId, probesIn: installs.probesIn })
    .from(installs)
    .where(and('freezerId' in of ? eq(installs.freezerId, of.freezerId) : eq(installs.sensorId, of.sensorId), isNull(installs.to)))
    .all();

export function endInstalls({ db }: ActionTx, ended: Install[], now: number): void {
  for (const { id } of ended) db.update(installs, id, { to: now });
}

/** A freezer in use that this viewer may see; otherwise it does not exist. */
const readableFreezer = (ctx: ProducerContext, db: ProducerDb, freezerId: string) =>
  orNotFound(isReadable(ctx, db, freezerId) ? freezerSettings(db, freezerId) : null);

function isReadable({ ability }: ProducerContext, db: ProducerDb, freezerId: string): boolean {
  const readable = allowed(ability, 'read', 'Freezer', { id: freezers.id, storeId: freezers.storeId });
  return db.find(freezers, freezerId, and(isNull(freezers.retiredAt), readable)) !== undefined;
}
