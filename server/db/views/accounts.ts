import { sql, type SQL } from 'drizzle-orm';
import type { Account } from '../../contract/accounts';
import type { District } from '../../contract/districts';
import type { ProducerDb } from '../producer-db';
import { accounts, districts, stores } from '../schema';

/** Accounts by name, with how many of their stores are in use; `where` speaks of `a`. */
export function accountsView(db: ProducerDb, where: SQL, limit: number): Account[] {
  const rows = db.view<Omit<Account, 'contacts' | 'retired'> & { contacts: string; retiredAt: number | null }>(
    (producer) => sql`
    select a.id, a.number, a.name, a.terms, a.language, a.contacts, a.version, a.retired_at as "retiredAt",
      (select count(*) from ${stores} s where s.producer_id = ${producer} and s.account_id = a.id and s.retired_at is null) as stores
    from ${accounts} a
    where a.producer_id = ${producer} and ${where}
    order by a.name, a.id limit ${limit}`,
  );
  return rows.map(({ retiredAt, contacts, ...row }) => ({ ...row, contacts: JSON.parse(contacts), retired: retiredAt !== null }));
}

/** Districts by name, the retired last, with how many of their stores are in use; `where` speaks of `d`. */
export function districtsView(db: ProducerDb, where: SQL): District[] {
  const rows = db.view<Omit<District, 'retired'> & { retiredAt: number | null }>(
    (producer) => sql`
    select d.id, d.name, d.version, d.retired_at as "retiredAt",
      (select count(*) from ${stores} s where s.producer_id = ${producer} and s.district_id = d.id and s.retired_at is null) as stores
    from ${districts} d
    where d.producer_id = ${producer} and ${where}
    order by d.retired_at is not null, d.name`,
  );
  return rows.map(({ retiredAt, ...row }) => ({ ...row, retired: retiredAt !== null }));
}
