import { sql } from 'drizzle-orm';
import type { FreezerSettings } from '../../contract/freezer-settings';
import type { StoreSettings } from '../../contract/store-settings';
import type { ProducerDb } from '../producer-db';
import { freezers, lanes, stores } from '../schema';

/** What is entered of a store, whether it is in use or not. */
export function storeSettings(db: ProducerDb, id: string): StoreSettings | undefined {
  const row = db.find(stores, id);
  return row && { ...row, retired: row.retiredAt !== null };
}

/** What is entered of a freezer, whether it is in use or not. */
export function freezerSettings(db: ProducerDb, id: string): FreezerSettings | undefined {
  const [row] = db.view<Omit<FreezerSettings, 'mount' | 'lanes' | 'retired'> & { mount: string; lanes: string; retiredAt: number | null }>(
    (producer) => sql`
    select f.id, f.store_id as "storeId", f.model_id as "modelId", f.asset_number as "assetNumber", f.name, f.placement,
      f.condition, f.version, f.retired_at as "retiredAt",
      json_object('channelDropIn', f.channel_drop_in, 'rackIn', f.rack_in, 'headroomIn', f.headroom_in) as mount,
      (select json_group_array(json_object('productId', l.product_id, 'widthShare', l.width_share) order by l.position)
        from ${lanes} l where l.producer_id = ${producer} and l.freezer_id = f.id) as lanes
    from ${freezers} f
    where f.producer_id = ${producer} and f.id = ${id}`,
  );
  if (!row) return undefined;
  const { retiredAt, ...rest } = row;
  return { ...rest, mount: JSON.parse(row.mount), lanes: JSON.parse(row.lanes), retired: retiredAt !== null };
}
