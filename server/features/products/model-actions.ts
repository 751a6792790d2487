import type { Body } from '../../contract/endpoint';
import type { changeModel as changeEndpoint, createModel as createEndpoint, FreezerModel } from '../../contract/models';
import { eq, models, sql, type ProducerDb } from '../../db';
import { modelsView } from '../../db/views/products';
import type { ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { changedOf, refuseTaken, retiredAtOf } from '../changed';

/** Answers the model's id. */
export function createModel({ act, now, newId }: ProducerContext, entered: Body<typeof createEndpoint>): string {
  return act('create-model', (tx) => {
    tx.authorise('create', 'Model', {});
    refuseTaken('/name', holderOf(tx.db, entered.name));
    const id = newId();
    tx.db.insert(models, { id, ...entered, createdAt: now });
    tx.audit('Model', id, entered);
    return id;
  });
}

/** Only its name is free while freezers of it are in use: levels are counted by the rest. */
export function changeModel({ act, now }: ProducerContext, id: string, body: Body<typeof changeEndpoint>): void {
  act('change-model', (tx) => {
    const model = modelOf(tx.db, id);
    tx.authorise('update', 'Model', { id });
    const changed = changedOf(model, body);
    const { retired, name, ...measures } = changed;
    if (model.freezers > 0 && (retired || Object.keys(measures).length > 0)) throw problem('still-in-use');
    if (name !== undefined) refuseTaken('/name', holderOf(tx.db, name), id);
    tx.db.update(models, id, { name, ...measures, retiredAt: retiredAtOf(retired, now), version: model.version + 1 });
    tx.audit('Model', id, changed);
  });
}

export const modelOf = (db: ProducerDb, id: string): FreezerModel => orNotFound(modelsView(db, sql`m.id = ${id}`)[0]);

const holderOf = (db: ProducerDb, name: string) => db.select({ id: models.id }).from(models).where(eq(models.name, name)).get();
