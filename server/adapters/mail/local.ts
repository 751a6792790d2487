import { createTransport } from 'nodemailer';
import { localMails, type Database } from '../../db';
import type { MailPort } from '../../ports/mail';

/** Composes the mail as SMTP would and keeps it for /dev/mail; the same key keeps it once. */
export function localMail(db: Database, from: string, now: () => number): MailPort {
  const transport = createTransport({ jsonTransport: true }, { from });
  return {
    async send({ to, subject, text, html }, idempotencyKey) {
      await transport.sendMail({ to: { name: '', address: to }, subject, text, html });
      db.insert(localMails).values({ id: idempotencyKey, to, subject, text, html, at: now() }).onConflictDoNothing().run();
    },
  };
}
