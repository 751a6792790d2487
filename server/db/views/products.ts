import { isNotNull, sql, type SQL } from 'drizzle-orm';
import type { FreezerModel } from '../../contract/models';
import type { Product } from '../../contract/products';
import type { ProducerDb } from '../producer-db';
import { freezers, models, products } from '../schema';

const { id, name, bagPounds, gtin, version, retiredAt } = products;

/** Products by the size of the bag, the retired last. */
export const productsView = (db: ProducerDb, where: SQL | undefined): Product[] =>
  db
    .select({ id, name, bagPounds, gtin, version, retiredAt })
    .from(products)
    .where(where)
    .orderBy(isNotNull(retiredAt), bagPounds, name)
    .all()
    .map((row) => ({ ...row, gtin: row.gtin ?? '', retired: row.retiredAt !== null }));

/** Models by name, the retired last, with how many of their freezers are in use; `where` speaks of `m`. */
export function modelsView(db: ProducerDb, where: SQL): FreezerModel[] {
  const rows = db.view<Omit<FreezerModel, 'retired'> & { retiredAt: number | null }>(
    (producer) => sql`
    select m.id, m.name, m.inside_width_in as "insideWidthIn", m.inside_depth_in as "insideDepthIn",
      m.inside_height_in as "insideHeightIn", m.doors, m.rated_pounds as "ratedPounds", m.defrost, m.version,
      m.retired_at as "retiredAt",
      (select count(*) from ${freezers} f where f.producer_id = ${producer} and f.model_id = m.id and f.retired_at is null) as freezers
    from ${models} m
    where m.producer_id = ${producer} and ${where}
    order by m.retired_at is not null, m.name`,
  );
  return rows.map((row) => ({ ...row, retired: row.retiredAt !== null }));
}
