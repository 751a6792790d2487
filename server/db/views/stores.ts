import { and, eq, isNull, sql, type SQL } from 'drizzle-orm';
import type { Ability } from '../../contract/ability';
import type { FreezerGlance } from '../../domain/attention';
import { allowed } from '../allowed';
import type { ProducerDb } from '../producer-db';
import { accounts, districts, freezers, freezerStates, installs, nextTrucks, requests, stores } from '../schema';
import { liveStates } from '../../contract/words';

export interface StoreRow {
  id: string;
  name: string;
  street: string;
  city: string;
  timeZone: string;
  district: string;
  account: string;
  truckFrom: number | null;
  truckTo: number | null;
  openRequests: number;
  freezers: (FreezerGlance & { pounds: number | null; capacityPounds: number | null })[];
}

export const live: SQL = sql.join(liveStates.map((state) => sql`${state}`), sql`, `);

/**
 * Stores by name with what a list says of each; `where` keeps the keyset and the viewer's scope, `readable` which
 * requests are counted.
 */
export function storesView(db: ProducerDb, where: SQL, readable: SQL, limit: number): StoreRow[] {
  const rows = db.view<Omit<StoreRow, 'freezers'> & { freezers: string }>(
    (producer) => sql`
    select ${stores.id} as id, ${stores.name} as name, ${stores.street} as street, ${stores.city} as city,
      ${stores.timeZone} as "timeZone", ${districts.name} as district, ${accounts.name} as account,
      ${nextTrucks.from} as "truckFrom", ${nextTrucks.to} as "truckTo",
      (select count(*) from ${requests}
        where ${requests.producerId} = ${producer} and ${requests.storeId} = ${stores.id}
          and ${requests.state} in (${live}) and ${readable}) as "openRequests",
      (select json_group_array(json_object(
          'at', st.at, 'share', st.share, 'pounds', st.pounds, 'capacityPounds', st.capacity_pounds,
          'warmSince', st.warm_since, 'runOutLikely', st.run_out_likely,
          'sensor', json(case when ${hasSensor(producer)} then 'true' else 'false' end)))
        from ${freezers} f
        left join ${freezerStates} st on st.producer_id = ${producer} and st.id = f.id
        where f.producer_id = ${producer} and f.store_id = ${stores.id} and f.retired_at is null) as freezers
    ${fromStores(producer, where, limit)}`,
  );
  return rows.map((row) => ({ ...row, freezers: JSON.parse(row.freezers) }));
}

/** Stores by name, each with its district, its account and its next truck. */
export const fromStores = (producer: string, where: SQL, limit: number): SQL => sql`
    from ${stores}
    join ${districts} on ${districts.producerId} = ${producer} and ${districts.id} = ${stores.districtId}
    join ${accounts} on ${accounts.producerId} = ${producer} and ${accounts.id} = ${stores.accountId}
    left join ${nextTrucks} on ${nextTrucks.producerId} = ${producer} and ${nextTrucks.storeId} = ${stores.id}
    where ${stores.producerId} = ${producer} and ${where}
    order by ${stores.name}, ${stores.id} limit ${limit}`;

/** Of the freezer `f` of a statement. */
export const hasSensor = (producer: string): SQL => sql`exists (select 1 from ${installs} i
    where i.producer_id = ${producer} and i.freezer_id = f.id and i."to" is null)`;

export const hasTruck = (condition: SQL): SQL => sql`${nextTrucks.id} is not null and ${condition}`;
export const noTruck: SQL = sql`${nextTrucks.id} is null`;

/** The store if this viewer may see it; otherwise it does not exist. */
export const storeView = (db: ProducerDb, ability: Ability, storeId: string) =>
  db
    .select({
      id: stores.id,
      name: stores.name,
      kind: stores.kind,
      street: stores.street,
      city: stores.city,
      region: stores.region,
      postalCode: stores.postalCode,
      timeZone: stores.timeZone,
      language: stores.language,
      phone: stores.phone,
      urgentPhone: stores.urgentPhone,
      account: accounts.name,
      district: districts.name,
      deliveryDays: stores.deliveryDays,
      receivingHours: stores.receivingHours,
    })
    .from(stores)
    .innerJoin(accounts, eq(accounts.id, stores.accountId))
    .innerJoin(districts, eq(districts.id, stores.districtId))
    .where(and(eq(stores.id, storeId), isNull(stores.retiredAt), allowed(ability, 'read', 'Store', { id: stores.id })))
    .get();
