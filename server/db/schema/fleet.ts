import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { freezers } from './freezers';
import { owned, ownedKey, ownedRef } from './owned';
import { accounts, districts, stores } from './stores';

/**
 * A freezer as lists and the map show it, one row a freezer in use (`id` is the freezer's), written anew whenever what
 * it shows changes. Plain columns are what is filtered and sorted by; `body` is the answer's own JSON.
 */
export const fleetRows = sqliteTable(
  'fleet_row',
  {
    ...owned(),
    /** Names the row in the full-text index; given by the table's trigger. */
    no: integer().unique(),
    storeId: text().notNull(),
    districtId: text().notNull(),
    accountId: text().notNull(),
    /** Of the likely run-out; where there is none, later than any time, so that it sorts last. */
    likely: integer().notNull(),
    /** From when on the chance of being empty passes the producer's limit; null is never. */
    riskAt: integer(),
    truckFrom: integer(),
    truckTo: integer(),
    /** Of the level; null without a sensor or a believable reading. */
    heardAt: integer(),
    warmSince: integer(),
    fitted: integer({ mode: 'boolean' }).notNull(),
    /** Folded words it is found by, each after a space. */
    words: text().notNull(),
    body: text().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.id, freezers),
    ownedRef(t, t.storeId, stores),
    ownedRef(t, t.districtId, districts),
    ownedRef(t, t.accountId, accounts),
    index('fleet_row_likely').on(t.producerId, t.likely, t.id),
    index('fleet_row_district').on(t.producerId, t.districtId, t.likely, t.id),
    index('fleet_row_account').on(t.producerId, t.accountId, t.likely, t.id),
    index('fleet_row_store').on(t.producerId, t.storeId, t.likely, t.id),
    index('fleet_row_standing').on(t.producerId, t.districtId, t.accountId, t.storeId, t.riskAt, t.likely, t.truckFrom, t.truckTo, t.heardAt, t.warmSince, t.fitted),
  ],
);

/** What the readings of one freezer said of one local day of its store; `id` is the freezer's and the day. Kept for good. */
export const freezerDays = sqliteTable(
  'freezer_day',
  {
    ...owned(),
    freezerId: text().notNull(),
    /** Where it stood then. */
    storeId: text().notNull(),
    day: text().notNull(),
    /** Minutes in which some lane held no whole bag, in which the air was warm, and of which anything is known. */
    outMinutes: real().notNull(),
    warmMinutes: real().notNull(),
    knownMinutes: real().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.freezerId, freezers),
    ownedRef(t, t.storeId, stores),
    index('freezer_day_freezer').on(t.producerId, t.freezerId, t.day),
    index('freezer_day_store').on(t.producerId, t.storeId, t.day, t.outMinutes, t.warmMinutes, t.knownMinutes),
  ],
);
