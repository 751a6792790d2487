import type { Account, changeAccount as changeEndpoint, createAccount as createEndpoint } from '../../contract/accounts';
import type { Body } from '../../contract/endpoint';
import { accounts, eq, sql, type ProducerDb } from '../../db';
import { accountsView } from '../../db/views/accounts';
import type { ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { changedOf, refuseTaken, retiredAtOf } from '../changed';

/** Answers the account's id. */
export function createAccount({ act, now, newId }: ProducerContext, entered: Body<typeof createEndpoint>): string {
  return act('create-account', (tx) => {
    tx.authorise('create', 'Account', {});
    refuseTaken('/number', holderOf(tx.db, entered.number));
    const id = newId();
    tx.db.insert(accounts, { id, ...entered, createdAt: now });
    tx.audit('Account', id, audited(entered));
    return id;
  });
}

export function changeAccount({ act, now }: ProducerContext, id: string, body: Body<typeof changeEndpoint>): void {
  act('change-account', (tx) => {
    const account = accountOf(tx.db, id);
    tx.authorise('update', 'Account', { id });
    const changed = changedOf(account, body);
    const { retired, ...patch } = changed;
    if (retired && account.stores > 0) throw problem('still-in-use');
    if (patch.number !== undefined) refuseTaken('/number', holderOf(tx.db, patch.number), id);
    tx.db.update(accounts, id, { ...patch, retiredAt: retiredAtOf(retired, now), version: account.version + 1 });
    tx.audit('Account', id, audited(changed));
    if (patch.number !== undefined || patch.name !== undefined) tx.listAnew({ accountId: id });
  });
}

export const accountOf = (db: ProducerDb, id: string): Account => orNotFound(accountsView(db, sql`a.id = ${id}`, 1)[0]);

const holderOf = (db: ProducerDb, number: string) => db.select({ id: accounts.id }).from(accounts).where(eq(accounts.number, number)).get();

/** Contacts are people, whom the trail does not name. */
const audited = <E extends { contacts?: Account['contacts'] }>({ contacts, ...plain }: E) => ({ ...plain, contacts: contacts && true });
