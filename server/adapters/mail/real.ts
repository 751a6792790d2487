import { createTransport } from 'nodemailer';
import type { MailPort } from '../../ports/mail';
import { addressOf, headersOf } from './headers';

/** SMTP. One address a mail: nodemailer would send to a list given as one. */
export function smtpMail(url: string, from: string): MailPort {
  const transport = createTransport(url);
  return {
    async send({ to, subject, text, html, sender }, idempotencyKey) {
      const host = addressOf(from).split('@')[1] ?? 'localhost';
      await transport.sendMail({ to: { name: '', address: to }, subject, text, html, ...headersOf(from, sender), messageId: `<${idempotencyKey}@${host}>` });
    },
  };
}
