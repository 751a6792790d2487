import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { Defrost, Placement } from '../../contract/words';
import { stores } from './stores';
import { owned, ownedKey, ownedRef } from './owned';

export const products = sqliteTable(
  'product',
  {
    ...owned(),
    name: text().notNull(),
    bagPounds: real().notNull(),
    gtin: text(),
    version: integer().notNull().default(1),
    retiredAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [ownedKey(t), uniqueIndex('product_name').on(t.producerId, t.name)],
);

export const models = sqliteTable(
  'model',
  {
    ...owned(),
    name: text().notNull(),
    insideWidthIn: real().notNull(),
    insideDepthIn: real().notNull(),
    insideHeightIn: real().notNull(),
    doors: integer().notNull(),
    ratedPounds: real().notNull(),
    defrost: text().$type<Defrost>().notNull(),
    version: integer().notNull().default(1),
    retiredAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [ownedKey(t), uniqueIndex('model_name').on(t.producerId, t.name)],
);

export const freezers = sqliteTable(
  'freezer',
  {
    ...owned(),
    storeId: text().notNull(),
    modelId: text().notNull(),
    assetNumber: text().notNull(),
    name: text().notNull(),
    placement: text().$type<Placement>().notNull(),
    condition: text().notNull().default(''),
    channelDropIn: real().notNull(),
    rackIn: real().notNull(),
    headroomIn: real().notNull(),
    position: integer().notNull().default(0),
    version: integer().notNull().default(1),
    retiredAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.storeId, stores),
    ownedRef(t, t.modelId, models),
    uniqueIndex('freezer_asset').on(t.producerId, t.assetNumber),
    index('freezer_store').on(t.producerId, t.storeId, t.position),
    index('freezer_model').on(t.producerId, t.modelId),
  ],
);

export const lanes = sqliteTable(
  'lane',
  {
    ...owned(),
    freezerId: text().notNull(),
    position: integer().notNull(),
    productId: text().notNull(),
    widthShare: real().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.freezerId, freezers),
    ownedRef(t, t.productId, products),
    uniqueIndex('lane_position').on(t.producerId, t.freezerId, t.position),
    index('lane_product').on(t.producerId, t.productId),
  ],
);
