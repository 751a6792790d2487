import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { EntryKind, Language, RequestKind, RequestState } from '../../contract/words';
import { freezers } from './freezers';
import { memberships } from './people';
import { stores } from './stores';
import { owned, ownedKey, ownedRef } from './owned';

export const requests = sqliteTable(
  'request',
  {
    ...owned(),
    number: integer().notNull(),
    storeId: text().notNull(),
    freezerId: text(),
    kind: text().$type<RequestKind>().notNull(),
    words: text().notNull(),
    language: text().$type<Language>().notNull(),
    state: text().$type<RequestState>().notNull(),
    assigneeId: text(),
    scheduledDay: text(),
    /** Empty when a freezer's own readings opened it. */
    openedBy: text(),
    /** Grows with every change; a writer says which version it saw. */
    version: integer().notNull().default(1),
    openedAt: integer().notNull(),
    changedAt: integer().notNull(),
    endedAt: integer(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.storeId, stores),
    ownedRef(t, t.freezerId, freezers),
    ownedRef(t, t.assigneeId, memberships),
    ownedRef(t, t.openedBy, memberships),
    uniqueIndex('request_number').on(t.producerId, t.number),
    index('request_opened').on(t.producerId, t.openedAt, t.id),
    index('request_state').on(t.producerId, t.state, t.openedAt, t.id),
    index('request_store').on(t.producerId, t.storeId, t.openedAt, t.id),
    index('request_freezer').on(t.producerId, t.freezerId, t.openedAt, t.id),
    index('request_assignee').on(t.producerId, t.assigneeId, t.openedAt, t.id),
  ],
);

/** The timeline: what was said and what changed, oldest first. */
export const requestEntries = sqliteTable(
  'request_entry',
  {
    ...owned(),
    requestId: text().notNull(),
    at: integer().notNull(),
    kind: text().$type<EntryKind>().notNull(),
    authorId: text(),
    words: text().notNull().default(''),
    state: text().$type<RequestState>(),
    day: text(),
    assigneeId: text(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.requestId, requests),
    ownedRef(t, t.authorId, memberships),
    ownedRef(t, t.assigneeId, memberships),
    index('request_entry_request').on(t.producerId, t.requestId, t.at, t.id),
  ],
);

export const photos = sqliteTable(
  'photo',
  {
    ...owned(),
    requestId: text().notNull(),
    file: text().notNull(),
    width: integer().notNull(),
    height: integer().notNull(),
    addedBy: text().notNull(),
    createdAt: integer().notNull(),
  },
  (t) => [
    ownedKey(t),
    ownedRef(t, t.requestId, requests),
    ownedRef(t, t.addedBy, memberships),
    index('photo_request').on(t.producerId, t.requestId),
  ],
);
