import { sql, type SQL } from 'drizzle-orm';
import type { TruckRow } from '../../contract/trucks';
import type { UsualDays } from '../../domain/usual-truck';
import type { ProducerDb } from '../producer-db';
import { districts, freezers, freezerStates, nextTrucks, stores } from '../schema';
import { fromStores, hasSensor } from './stores';

export type TruckStore = Omit<TruckRow, 'usual'> & Pick<UsualDays, 'deliveryDays' | 'receivingHours' | 'openHours'>;

/** Stores by name with the truck each was told of; `where` keeps the keyset and the viewer's scope. */
export function trucksView(db: ProducerDb, where: SQL, limit: number): TruckStore[] {
  const rows = db.view<{ body: string; runOutLikely: number | null }>(
    (producer) => sql`
    select json_object(
        'store', json_object('id', ${stores.id}, 'name', ${stores.name}, 'city', ${stores.city},
          'timeZone', ${stores.timeZone}, 'district', ${districts.name}),
        'truck', json(case when ${nextTrucks.id} is null then 'null' else json_object(
          'day', ${nextTrucks.day}, 'from', ${nextTrucks.from}, 'to', ${nextTrucks.to}, 'version', ${nextTrucks.version}) end),
        'deliveryDays', json(${stores.deliveryDays}), 'receivingHours', json(${stores.receivingHours}),
        'openHours', json(${stores.openHours})) as body,
      (select min(st.run_out_likely) from ${freezers} f
        join ${freezerStates} st on st.producer_id = ${producer} and st.id = f.id
        where f.producer_id = ${producer} and f.store_id = ${stores.id} and f.retired_at is null
          and ${hasSensor(producer)}) as "runOutLikely"
    ${fromStores(producer, where, limit)}`,
  );
  // Built by the statement above.
  return rows.map(({ body, runOutLikely }) => ({ ...(JSON.parse(body) as Omit<TruckStore, 'runOutLikely'>), runOutLikely }));
}
