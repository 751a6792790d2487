import { and, asc, eq, isNull, lte, outbox, type Database } from '../db';
import type { Logger } from 'pino';
import type { Mail, MailPort } from '../ports/mail';

interface Outbox {
  db: Database;
  mail: MailPort;
  log: Logger;
  now: () => number;
}

const MINUTE = 60_000;
const MOST_ATTEMPTS = 12;

/**
 * Sends what is due, oldest first. A row is pushed into the future before it is tried, so that a process that dies in
 * mid-send tries it again later; the row's id is the idempotency key. Answers how many were sent.
 */
export async function sendDue({ db, mail, log, now }: Outbox): Promise<number> {
  let sent = 0;
  for (let row = claim(db, now()); row; row = claim(db, now())) {
    try {
      // Written by `runAction` and sign-in as a composed mail.
      await mail.send(JSON.parse(row.payload) as Mail, row.id);
      db.update(outbox).set({ doneAt: now(), payload: '' }).where(eq(outbox.id, row.id)).run();
      sent += 1;
    } catch (error) {
      const lastError = error instanceof Error ? error.message.slice(0, 300) : 'unknown';
      db.update(outbox).set({ lastError, doneAt: row.attempts + 1 >= MOST_ATTEMPTS ? now() : null }).where(eq(outbox.id, row.id)).run();
      log.warn({ outboxId: row.id, attempts: row.attempts + 1, lastError }, 'mail not sent');
    }
  }
  return sent;
}

function claim(db: Database, now: number) {
  const due = db
    .select()
    .from(outbox)
    .where(and(isNull(outbox.doneAt), lte(outbox.dueAt, now)))
    .orderBy(asc(outbox.dueAt), asc(outbox.id))
    .limit(1)
    .get();
  if (!due) return null;
  const wait = Math.min(60, 2 ** due.attempts) * MINUTE;
  db.update(outbox).set({ attempts: due.attempts + 1, dueAt: now + wait }).where(eq(outbox.id, due.id)).run();
  return due;
}
