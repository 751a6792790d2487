import { createTransport } from 'nodemailer';
import { localMails, type Database } from '../../db';
import type { MailPort } from '../../ports/mail';
import { headersOf } from './headers';

/** Composes the mail as SMTP would and keeps it for /dev/mail; the same key keeps it once. */
export function localMail(db: Database, from: string, now: () => number): MailPort {
  const transport = createTransport({ jsonTransport: true });
  return {
    async send({ to, subject, text, html, sender }, idempotencyKey) {
      await transport.sendMail({ to: { name: '', address: to }, subject, text, html, ...headersOf(from, sender) });
      db.insert(localMails).values({ id: idempotencyKey, to, subject, text, html, at: now() }).onConflictDoNothing().run();
    },
  };
}
