import { createTransport } from 'nodemailer';
import type { MailPort } from '../../ports/mail';

/** SMTP. One address a mail: nodemailer would send to a list given as one. */
export function smtpMail(url: string, from: string): MailPort {
  const transport = createTransport(url, { from });
  return {
    async send({ to, subject, text, html }, idempotencyKey) {
      const host = from.match(/@([\w.-]+)/)?.[1] ?? 'localhost';
      await transport.sendMail({ to: { name: '', address: to }, subject, text, html, messageId: `<${idempotencyKey}@${host}>` });
    },
  };
}
