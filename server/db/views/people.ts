import { sql, type SQL } from 'drizzle-orm';
import type { MemberOf } from '../../contract/people';
import type { Language, Role } from '../../contract/words';
import type { ProducerDb } from '../producer-db';
import { accounts, districts, memberships, membershipScopes, people, stores } from '../schema';

export interface MemberRow {
  id: string;
  name: string;
  email: string;
  language: Language;
  role: Role;
}

function members(db: ProducerDb, where: (producer: string) => SQL): MemberRow[] {
  return db.view<MemberRow>(
    (producer) => sql`
    select m.id, p.name, p.email, p.language, m.role
    from ${memberships} m join ${people} p on p.id = m.person_id and p.deactivated_at is null
    where m.producer_id = ${producer} and m.deactivated_at is null and ${where(producer)}
    order by p.name, m.id`,
  );
}

export const membersByRole = (db: ProducerDb, roles: Role[]): MemberRow[] =>
  members(db, () => sql`m.role in (${sql.join(roles.map((role) => sql`${role}`), sql`, `)})`);

export const memberById = (db: ProducerDb, id: string): MemberRow | undefined => members(db, () => sql`m.id = ${id}`)[0];

/** The managers who answer for a store, however it was assigned to them. */
export const managersOfStore = (db: ProducerDb, storeId: string): MemberRow[] =>
  members(
    db,
    (producer) => sql`m.role = 'store-manager' and exists (
      select 1 from ${membershipScopes} c join ${stores} s on s.producer_id = ${producer} and s.id = ${storeId}
      where c.producer_id = ${producer} and c.membership_id = m.id
        and (c.store_id = s.id or c.district_id = s.district_id or c.account_id = s.account_id))`,
  );

/** Somebody who works with this producer, with what they are assigned; `where` speaks of `m` and `p`. */
export function peopleView(db: ProducerDb, where: SQL, limit: number): MemberOf[] {
  const rows = db.view<Omit<MemberOf, 'scopes' | 'grants' | 'active'> & { scopes: string; grants: string; active: number }>(
    (producer) => sql`
    select m.id, p.name, p.email, p.language, m.role, m.side, m.grants,
      m.deactivated_at is null and p.deactivated_at is null as active,
      (select json_group_array(json_object(
          'kind', case when c.store_id is not null then 'store' when c.district_id is not null then 'district' else 'account' end,
          'id', coalesce(c.store_id, c.district_id, c.account_id), 'name', coalesce(s.name, d.name, a.name)))
        from ${membershipScopes} c
        left join ${stores} s on s.producer_id = ${producer} and s.id = c.store_id
        left join ${districts} d on d.producer_id = ${producer} and d.id = c.district_id
        left join ${accounts} a on a.producer_id = ${producer} and a.id = c.account_id
        where c.producer_id = ${producer} and c.membership_id = m.id) as scopes
    from ${memberships} m join ${people} p on p.id = m.person_id
    where m.producer_id = ${producer} and ${where}
    order by p.name, m.id limit ${limit}`,
  );
  return rows.map((row) => ({ ...row, scopes: JSON.parse(row.scopes), grants: JSON.parse(row.grants), active: row.active === 1 }));
}
