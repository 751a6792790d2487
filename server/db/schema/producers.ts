import { sqliteTable, text, integer } from 'drizzle-orm/sqlite-core';
import type { Language } from '../../contract/words';

/** The tenants. Not owned: this is what owns. */
export const producers = sqliteTable('producer', {
  id: text().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  timeZone: text().notNull(),
  language: text().$type<Language>().notNull(),
  urgentPhone: text().notNull(),
  createdAt: integer().notNull(),
});
