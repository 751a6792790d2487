import type { changeDistrict as changeEndpoint, createDistrict as createEndpoint, District } from '../../contract/districts';
import type { Body } from '../../contract/endpoint';
import { districts, eq, sql, type ProducerDb } from '../../db';
import { districtsView } from '../../db/views/accounts';
import type { ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { changedOf, refuseTaken, retiredAtOf } from '../changed';

/** Answers the district's id. */
export function createDistrict({ act, now, newId }: ProducerContext, { name }: Body<typeof createEndpoint>): string {
  return act('create-district', (tx) => {
    tx.authorise('create', 'District', {});
    refuseTaken('/name', holderOf(tx.db, name));
    const id = newId();
    tx.db.insert(districts, { id, name, createdAt: now });
    tx.audit('District', id, { name });
    return id;
  });
}

export function changeDistrict({ act, now }: ProducerContext, id: string, body: Body<typeof changeEndpoint>): void {
  act('change-district', (tx) => {
    const district = districtOf(tx.db, id);
    tx.authorise('update', 'District', { id });
    const changed = changedOf(district, body);
    const { retired, name } = changed;
    if (retired && district.stores > 0) throw problem('still-in-use');
    if (name !== undefined) refuseTaken('/name', holderOf(tx.db, name), id);
    tx.db.update(districts, id, { name, retiredAt: retiredAtOf(retired, now), version: district.version + 1 });
    tx.audit('District', id, changed);
  });
}

export const districtOf = (db: ProducerDb, id: string): District => orNotFound(districtsView(db, sql`d.id = ${id}`)[0]);

const holderOf = (db: ProducerDb, name: string) => db.select({ id: districts.id }).from(districts).where(eq(districts.name, name)).get();
