import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { owned, ownedKey } from './owned';

/** Append-only (by triggers) and chained by hash per producer; names people by opaque ids only. */
export const auditEntries = sqliteTable(
  'audit_entry',
  {
    ...owned(),
    seq: integer().notNull(),
    at: integer().notNull(),
    actor: text().notNull(),
    act: text().notNull(),
    subject: text().notNull(),
    subjectId: text().notNull(),
    changes: text().notNull(),
    previousHash: text().notNull(),
    hash: text().notNull(),
  },
  (t) => [
    ownedKey(t),
    uniqueIndex('audit_entry_seq').on(t.producerId, t.seq),
    index('audit_entry_subject').on(t.producerId, t.subject, t.subjectId),
  ],
);

/** Numbers without gaps: `id` names what is counted. */
export const counters = sqliteTable('counter', { ...owned(), value: integer().notNull() }, (t) => [ownedKey(t)]);

/**
 * Effects outside the database, written in the transaction that causes them.
 * Not owned: sign-in mail belongs to a person, and one job works through them all; no route reads it.
 */
export const outbox = sqliteTable(
  'outbox',
  {
    id: text().primaryKey(),
    kind: text().notNull(),
    /** Emptied once done, since mail carries one-time values. */
    payload: text().notNull(),
    attempts: integer().notNull().default(0),
    dueAt: integer().notNull(),
    doneAt: integer(),
    lastError: text(),
    createdAt: integer().notNull(),
  },
  (t) => [index('outbox_due').on(t.doneAt, t.dueAt)],
);

/** Mail as the local adapter "sent" it, for /dev/mail. Not owned: it exists in dev and demo only. */
export const localMails = sqliteTable(
  'local_mail',
  {
    id: text().primaryKey(),
    to: text().notNull(),
    subject: text().notNull(),
    text: text().notNull(),
    html: text().notNull(),
    at: integer().notNull(),
  },
  (t) => [index('local_mail_at').on(t.at)],
);
