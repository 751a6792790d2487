import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { freezers, products } from './freezers';
import { memberships } from './people';
import { stores } from './stores';
import { owned, ownedKey, ownedRef } from './owned';

/** The next truck a store was told of; at most one open per store. `from` and `to` are instants. */
export const nextTrucks = sqliteTable(
  'next_truck',
  {
    ...owned(),
    storeId: text().notNull(),
    day: text().notNull(),
    from: integer().notNull(),
    to: integer().notNull(),
    version: integer().notNull().default(1),
    updatedAt: integer().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.storeId, stores),
    uniqueIndex('next_truck_store').on(t.producerId, t.storeId),
    index('next_truck_from').on(t.producerId, t.from),
  ],
);

export const nextTruckLoads = sqliteTable(
  'next_truck_load',
  { ...owned(), nextTruckId: text().notNull(), productId: text().notNull(), bags: integer().notNull() },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.nextTruckId, nextTrucks).onDelete('cascade'),
    ownedRef(t, t.productId, products),
    uniqueIndex('next_truck_load_product').on(t.producerId, t.nextTruckId, t.productId),
  ],
);

export const deliveries = sqliteTable(
  'delivery',
  {
    ...owned(),
    storeId: text().notNull(),
    at: integer().notNull(),
    /** What the store had been told, so that lateness can be said afterwards. */
    toldFrom: integer(),
    toldTo: integer(),
    recordedBy: text(),
    createdAt: integer().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.storeId, stores),
    ownedRef(t, t.recordedBy, memberships),
    index('delivery_store').on(t.producerId, t.storeId, t.at, t.id),
  ],
);

export const deliveryLines = sqliteTable(
  'delivery_line',
  {
    ...owned(),
    deliveryId: text().notNull(),
    freezerId: text(),
    productId: text().notNull(),
    bags: integer().notNull(),
    takenBack: integer().notNull().default(0),
    lot: text().notNull().default(''),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.deliveryId, deliveries),
    ownedRef(t, t.freezerId, freezers),
    ownedRef(t, t.productId, products),
    index('delivery_line_delivery').on(t.producerId, t.deliveryId),
    index('delivery_line_freezer').on(t.producerId, t.freezerId),
    index('delivery_line_product').on(t.producerId, t.productId),
    index('delivery_line_lot').on(t.producerId, t.lot),
  ],
);
