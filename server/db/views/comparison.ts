import { sql, type SQL } from 'drizzle-orm';
import type { Ability } from '../../contract/ability';
import type { ComparedStore } from '../../contract/comparison';
import { allowed } from '../allowed';
import type { ProducerDb } from '../producer-db';
import { accounts, deliveries, freezerDays, freezers, requests, stores } from '../schema';
import { readableRequests } from './requests';
import { hasSensor, live } from './stores';

/** When it begins: the instant, and that local day. */
export interface Since {
  at: number;
  day: string;
}

export interface StoreCounts extends Pick<ComparedStore, 'id' | 'name' | 'city' | 'account' | 'openRequests' | 'solvedRequests' | 'deliveries' | 'lateDeliveries'> {
  /** Freezers with a sensor now. */
  fitted: number;
}

/** Stores by name with what is counted of each since then; `where` keeps the keyset and the viewer's scope. */
export function storeCounts(db: ProducerDb, ability: Ability, where: SQL, since: Since, limit: number): StoreCounts[] {
  const seesDeliveries = allowed(ability, 'read', 'Delivery', { storeId: stores.id });
  return db.view<StoreCounts>((producer) => {
    const requestsThat = (are: SQL): SQL => sql`(select count(*) from ${requests}
        where ${requests.producerId} = ${producer} and ${requests.storeId} = ${stores.id} and ${are} and ${readableRequests(ability)})`;
    const deliveriesThat = (are: SQL): SQL => sql`case when ${seesDeliveries} then (select count(*) from ${deliveries} d
        where d.producer_id = ${producer} and d.store_id = ${stores.id} and d.at >= ${since.at} and ${are}) else 0 end`;
    return sql`
    select ${stores.id} as id, ${stores.name} as name, ${stores.city} as city, ${accounts.name} as account,
      (select count(*) from ${freezers} f
        where f.producer_id = ${producer} and f.store_id = ${stores.id} and f.retired_at is null
          and ${hasSensor(producer)}) as fitted,
      ${requestsThat(sql`${requests.state} in (${live})`)} as "openRequests",
      ${requestsThat(sql`${requests.state} in ('solved', 'closed') and ${requests.endedAt} >= ${since.at}`)} as "solvedRequests",
      ${deliveriesThat(sql`1`)} as deliveries, ${deliveriesThat(sql`d.at > d.told_to`)} as "lateDeliveries"
    from ${stores}
    join ${accounts} on ${accounts.producerId} = ${producer} and ${accounts.id} = ${stores.accountId}
    where ${stores.producerId} = ${producer} and ${where}
    order by ${stores.name}, ${stores.id} limit ${limit}`;
  });
}

export interface StoreMinutes {
  out: number;
  warm: number;
  known: number;
}

/** Minutes of these stores: of each day as its worst freezer had it, and known of all of them together. */
export function minutesOfStores(db: ProducerDb, ids: string[], since: Since): Map<string, StoreMinutes> {
  const days = db.view<StoreMinutes & { store: string }>(
    (producer) => sql`
    select fd.store_id as store, max(fd.out_minutes) as out, max(fd.warm_minutes) as warm, sum(fd.known_minutes) as known
    from json_each(${JSON.stringify(ids)})
    cross join ${freezerDays} fd on fd.producer_id = ${producer} and fd.store_id = json_each.value and fd.day >= ${since.day}
    group by fd.store_id, fd.day`,
  );
  const minutes = new Map<string, StoreMinutes>();
  for (const { store, out, warm, known } of days) {
    const before = minutes.get(store) ?? { out: 0, warm: 0, known: 0 };
    minutes.set(store, { out: before.out + out, warm: before.warm + warm, known: before.known + known });
  }
  return minutes;
}
