import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { Grant, Language, Role, Side } from '../../contract/words';
import { accounts, districts, stores } from './stores';
import { owned, ownedKey, ownedRef } from './owned';

/** Not owned: one person may work with several producers. */
export const people = sqliteTable('person', {
  id: text().primaryKey(),
  email: text().notNull().unique(),
  name: text().notNull(),
  language: text().$type<Language>().notNull(),
  deactivatedAt: integer(),
  createdAt: integer().notNull(),
});

export const memberships = sqliteTable(
  'membership',
  {
    ...owned(),
    personId: text()
      .notNull()
      .references(() => people.id),
    role: text().$type<Role>().notNull(),
    side: text().$type<Side>().notNull(),
    grants: text({ mode: 'json' }).$type<Grant[]>().notNull().default([]),
    deactivatedAt: integer(),
    createdAt: integer().notNull(),
  },
  (t) => [ownedKey(t), uniqueIndex('membership_person').on(t.personId, t.producerId)],
);

/** What a store's person or a district rep is assigned: one of store, district, account. */
export const membershipScopes = sqliteTable(
  'membership_scope',
  {
    ...owned(),
    membershipId: text().notNull(),
    storeId: text(),
    districtId: text(),
    accountId: text(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.membershipId, memberships),
    ownedRef(t, t.storeId, stores),
    ownedRef(t, t.districtId, districts),
    ownedRef(t, t.accountId, accounts),
    index('membership_scope_membership').on(t.producerId, t.membershipId),
    index('membership_scope_store').on(t.producerId, t.storeId),
  ],
);

/** Not owned: a session is a person's, who then chooses the producer by the path. `id` is the hash of the cookie's value. */
export const sessions = sqliteTable(
  'session',
  {
    id: text().primaryKey(),
    personId: text().references(() => people.id),
    handle: text().notNull().unique(),
    data: text().notNull(),
    device: text().notNull(),
    createdAt: integer().notNull(),
    seenAt: integer().notNull(),
    expiresAt: integer().notNull(),
  },
  (t) => [index('session_person').on(t.personId), index('session_expires').on(t.expiresAt)],
);

/** Not owned: asked for before anybody is known. `personId` stays empty when nobody has that address. */
export const signInLinks = sqliteTable(
  'sign_in_link',
  {
    id: text().primaryKey(),
    personId: text().references(() => people.id),
    tokenHash: text().notNull().unique(),
    codeHash: text().notNull(),
    askerHash: text().notNull(),
    next: text().notNull(),
    tries: integer().notNull().default(0),
    usedAt: integer(),
    expiresAt: integer().notNull(),
  },
  (t) => [index('sign_in_link_asker').on(t.askerHash), index('sign_in_link_expires').on(t.expiresAt)],
);
