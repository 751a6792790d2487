import { integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Language, Span } from '../../contract/words';

/** The tenants. Not owned: this is what owns. */
export const producers = sqliteTable('producer', {
  id: text().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  timeZone: text().notNull(),
  language: text().$type<Language>().notNull(),
  urgentPhone: text().notNull(),
  /** Name in the storage of the picture shown beside the producer's name. */
  logo: text(),
  serviceHours: text({ mode: 'json' }).$type<Span[]>().notNull().default([]),
  holidays: text({ mode: 'json' }).$type<Holiday[]>().notNull().default([]),
  /** The chance of being empty before the truck from which a freezer counts as at risk. */
  riskLimit: real().notNull().default(0.1),
  /** Who mail says it is from, and where answers go; empty is the installation's own. */
  senderName: text().notNull().default(''),
  replyTo: text().notNull().default(''),
  version: integer().notNull().default(1),
  createdAt: integer().notNull(),
});

/** A local day on which the service desk is closed. */
export interface Holiday {
  day: string;
  name: string;
}
