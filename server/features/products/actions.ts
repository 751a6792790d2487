import type { Body } from '../../contract/endpoint';
import type { changeProduct as changeEndpoint, createProduct as createEndpoint, Product } from '../../contract/products';
import { and, deliveryLines, eq, freezers, isNull, lanes, products, type ProducerDb } from '../../db';
import { productsView } from '../../db/views/products';
import type { ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { changedOf, refuseTaken, retiredAtOf } from '../changed';

/** Answers the product's id. */
export function createProduct({ act, now, newId }: ProducerContext, entered: Body<typeof createEndpoint>): string {
  return act('create-product', (tx) => {
    tx.authorise('create', 'Product', {});
    refuseTaken('/name', holderOf(tx.db, entered.name));
    const id = newId();
    tx.db.insert(products, { id, ...entered, gtin: entered.gtin || null, createdAt: now });
    tx.audit('Product', id, entered);
    return id;
  });
}

export function changeProduct({ act, now }: ProducerContext, id: string, body: Body<typeof changeEndpoint>): void {
  act('change-product', (tx) => {
    const product = productOf(tx.db, id);
    tx.authorise('update', 'Product', { id });
    const changed = changedOf(product, body);
    const { retired, gtin, ...patch } = changed;
    const hangsIn = freezersWith(tx.db, id);
    if (retired && hangsIn.length > 0) throw problem('still-in-use');
    if (patch.bagPounds !== undefined && wasNamed(tx.db, id)) throw problem('still-in-use');
    if (patch.name !== undefined) refuseTaken('/name', holderOf(tx.db, patch.name), id);
    const row = { ...patch, gtin: gtin === '' ? null : gtin, retiredAt: retiredAtOf(retired, now) };
    tx.db.update(products, id, { ...row, version: product.version + 1 });
    tx.audit('Product', id, changed);
    if (patch.name !== undefined) for (const { freezerId } of hangsIn) tx.listAnew({ freezerId });
  });
}

export const productOf = (db: ProducerDb, id: string): Product => orNotFound(productsView(db, eq(products.id, id))[0]);

const holderOf = (db: ProducerDb, name: string) => db.select({ id: products.id }).from(products).where(eq(products.name, name)).get();

/** Freezers in use with a lane of it. */
const freezersWith = (db: ProducerDb, productId: string) =>
  db
    .select({ freezerId: lanes.freezerId })
    .from(lanes)
    .innerJoin(freezers, eq(freezers.id, lanes.freezerId))
    .where(and(eq(lanes.productId, productId), isNull(freezers.retiredAt)))
    .groupBy(lanes.freezerId)
    .all();

/** Whether pounds have been counted by it: in any lane, or in any delivery. */
const wasNamed = (db: ProducerDb, productId: string): boolean =>
  [lanes, deliveryLines].some((table) => db.select({ id: table.id }).from(table).where(eq(table.productId, productId)).limit(1).get());
