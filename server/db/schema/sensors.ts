import { index, integer, primaryKey, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { FreezerState } from '../../domain/freezer-state';
import { freezers } from './freezers';
import { owned, ownedKey, ownedRef } from './owned';

/** `no` is the small integer the readings carry in place of two UUIDs. */
export const sensors = sqliteTable(
  'sensor',
  {
    ...owned(),
    no: integer().notNull().unique(),
    serial: text().notNull(),
    firstHeardAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [ownedKey(t), uniqueIndex('sensor_serial').on(t.producerId, t.serial)],
);

/** Which sensor hangs in which freezer from when to when: history stays with the right freezer for the right time. */
export const installs = sqliteTable(
  'install',
  {
    ...owned(),
    sensorId: text().notNull(),
    freezerId: text().notNull(),
    probesIn: text({ mode: 'json' }).$type<number[]>().notNull(),
    from: integer().notNull(),
    to: integer(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.sensorId, sensors),
    ownedRef(t, t.freezerId, freezers),
    index('install_sensor').on(t.producerId, t.sensorId, t.from),
    index('install_freezer').on(t.producerId, t.freezerId, t.from),
  ],
);

/**
 * The one big table, so it lives by its own rules: small keys, appended by the pipeline alone, expired by age.
 * Reached only through the `no` of a sensor that a producer's scope has already answered for.
 */
export const readings = sqliteTable(
  'reading',
  {
    sensorNo: integer()
      .notNull()
      .references(() => sensors.no),
    at: integer().notNull(),
    /** Metres from the left, as sent; null where a probe said nothing. */
    probes: text({ mode: 'json' }).$type<(number | null)[]>().notNull(),
    airC: real(),
    supplyV: real(),
    /** Two senders disagreed about this moment; the cautious value was kept. */
    conflict: integer({ mode: 'boolean' }).notNull().default(false),
  },
  (t) => [primaryKey({ columns: [t.sensorNo, t.at] })],
);

/** Readings that were not believed, kept with the reason. */
export const quarantinedReadings = sqliteTable(
  'quarantined_reading',
  {
    ...owned(),
    serial: text().notNull(),
    at: integer(),
    reason: text().notNull(),
    body: text().notNull(),
    receivedAt: integer().notNull(),
  },
  (t) => [ownedKey(t), index('quarantined_reading_received').on(t.producerId, t.receivedAt)],
);

/** One bearer key per telemetry source; only the hash is kept. */
export const telemetryKeys = sqliteTable(
  'telemetry_key',
  {
    ...owned(),
    name: text().notNull(),
    keyHash: text().notNull().unique(),
    lastUsedAt: integer(),
    revokedAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [ownedKey(t)],
);

/**
 * What the readings mean now, one row a freezer (`id` is the freezer's), written when a reading arrives.
 * The plain columns are what lists filter and sort by; `state` is what a page draws.
 */
export const freezerStates = sqliteTable(
  'freezer_state',
  {
    ...owned(),
    at: integer().notNull(),
    pounds: real().notNull(),
    capacityPounds: real().notNull(),
    share: real().notNull(),
    airF: real(),
    warmSince: integer(),
    runOutEarly: integer(),
    runOutLikely: integer(),
    runOutLate: integer(),
    state: text({ mode: 'json' }).$type<FreezerState>().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.id, freezers),
    index('freezer_state_likely').on(t.producerId, t.runOutLikely, t.id),
  ],
);
