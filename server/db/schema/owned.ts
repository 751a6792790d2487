import { type AnySQLiteColumn, type SQLiteColumn, foreignKey, primaryKey, text } from 'drizzle-orm/sqlite-core';
import { producers } from './producers';

/** What every table of a producer starts with; `ownedKey` and `ownedRef` make the tenancy structural. */
export const owned = () => ({
  id: text().notNull(),
  producerId: text()
    .notNull()
    .references(() => producers.id),
});

interface OwnedTable {
  id: SQLiteColumn;
  producerId: SQLiteColumn;
}

export const ownedKey = (table: OwnedTable) => primaryKey({ columns: [table.producerId, table.id] });

/** A reference that SQLite itself refuses when it points into another producer. */
export const ownedRef = (table: OwnedTable, column: AnySQLiteColumn, target: OwnedTable) =>
  foreignKey({
    columns: [table.producerId, column] as [AnySQLiteColumn, AnySQLiteColumn],
    foreignColumns: [target.producerId, target.id] as [AnySQLiteColumn, AnySQLiteColumn],
  });
