import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { Language, Span, StoreKind, Weekday } from '../../contract/words';
import { owned, ownedKey, ownedRef } from './owned';

export const accounts = sqliteTable(
  'account',
  {
    ...owned(),
    number: text().notNull(),
    name: text().notNull(),
    terms: text().notNull().default(''),
    language: text().$type<Language>().notNull(),
    contacts: text({ mode: 'json' }).$type<Contact[]>().notNull().default([]),
    version: integer().notNull().default(1),
    retiredAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [ownedKey(t), uniqueIndex('account_number').on(t.producerId, t.number), index('account_name').on(t.producerId, t.name, t.id)],
);

/** Somebody at an account, who need not use the portal. */
export interface Contact {
  name: string;
  work: string;
  email: string;
  phone: string;
}

export const districts = sqliteTable(
  'district',
  { ...owned(), name: text().notNull(), version: integer().notNull().default(1), retiredAt: integer(), createdAt: integer().notNull() },
  (t) => [ownedKey(t), uniqueIndex('district_name').on(t.producerId, t.name)],
);

export const stores = sqliteTable(
  'store',
  {
    ...owned(),
    accountId: text().notNull(),
    districtId: text().notNull(),
    name: text().notNull(),
    kind: text().$type<StoreKind>().notNull(),
    street: text().notNull(),
    city: text().notNull(),
    region: text().notNull(),
    postalCode: text().notNull(),
    latitude: real().notNull(),
    longitude: real().notNull(),
    timeZone: text().notNull(),
    language: text().$type<Language>().notNull(),
    phone: text().notNull(),
    /** Empty is the producer's own. */
    urgentPhone: text().notNull().default(''),
    openHours: text({ mode: 'json' }).$type<[number, number]>().notNull(),
    receivingHours: text({ mode: 'json' }).$type<Span[]>().notNull(),
    deliveryDays: text({ mode: 'json' }).$type<Weekday[]>().notNull(),
    driverNotes: text().notNull().default(''),
    version: integer().notNull().default(1),
    retiredAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.accountId, accounts),
    ownedRef(t, t.districtId, districts),
    index('store_name').on(t.producerId, t.name, t.id),
    index('store_account').on(t.producerId, t.accountId),
    index('store_district').on(t.producerId, t.districtId),
  ],
);
