import { sql, type SQL } from 'drizzle-orm';
import type { Delivery, NextTruck } from '../../contract/deliveries';
import type { ProducerDb } from '../producer-db';
import { deliveries, deliveryLines, nextTruckLoads, nextTrucks, products } from '../schema';

type Place = readonly [at: number, id: string];

/** A store's deliveries, youngest first, from behind `after`. */
export const deliveriesOfStore = (db: ProducerDb, storeId: string, after: Place | null, limit: number): Delivery[] =>
  deliveriesView(db, () => sql`d.store_id = ${storeId} and ${after ? sql`(d.at, d.id) < (${after[0]}, ${after[1]})` : sql`1`}`, limit);

/** The last of a store that left something in this freezer, or did not say in which. */
export const deliveriesOfFreezer = (db: ProducerDb, { id, storeId }: { id: string; storeId: string }, limit: number): Delivery[] =>
  deliveriesView(
    db,
    (producer) => sql`d.store_id = ${storeId} and exists (select 1 from ${deliveryLines} l
      where l.producer_id = ${producer} and l.delivery_id = d.id and (l.freezer_id = ${id} or l.freezer_id is null))`,
    limit,
  );

export const deliveryView = (db: ProducerDb, id: string): Delivery | undefined => deliveriesView(db, () => sql`d.id = ${id}`, 1)[0];

function deliveriesView(db: ProducerDb, where: (producer: string) => SQL, limit: number): Delivery[] {
  const rows = db.view<Omit<Delivery, 'lines'> & { lines: string }>(
    (producer) => sql`
    select d.id, d.at, d.told_from as "toldFrom", d.told_to as "toldTo",
      (select json_group_array(json_object(
          'productId', p.id, 'product', p.name, 'bagPounds', p.bag_pounds, 'bags', l.bags, 'takenBack', l.taken_back,
          'lot', l.lot, 'freezerId', l.freezer_id) order by p.bag_pounds, l.id)
        from ${deliveryLines} l join ${products} p on p.producer_id = ${producer} and p.id = l.product_id
        where l.producer_id = ${producer} and l.delivery_id = d.id) as lines
    from ${deliveries} d
    where d.producer_id = ${producer} and ${where(producer)}
    order by d.at desc, d.id desc limit ${limit}`,
  );
  return rows.map((row) => ({ ...row, lines: JSON.parse(row.lines) }));
}

export function nextTruckOfStore(db: ProducerDb, storeId: string): NextTruck | null {
  const [row] = db.view<Omit<NextTruck, 'load'> & { load: string }>(
    (producer) => sql`
    select t.day, t."from", t."to", t.version,
      (select json_group_array(json_object(
          'productId', p.id, 'product', p.name, 'bagPounds', p.bag_pounds, 'bags', l.bags) order by p.bag_pounds)
        from ${nextTruckLoads} l join ${products} p on p.producer_id = ${producer} and p.id = l.product_id
        where l.producer_id = ${producer} and l.next_truck_id = t.id) as load
    from ${nextTrucks} t where t.producer_id = ${producer} and t.store_id = ${storeId}`,
  );
  return row ? { ...row, load: JSON.parse(row.load) } : null;
}
