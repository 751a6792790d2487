export interface Mail {
  to: string;
  subject: string;
  text: string;
  html: string;
  /** Who it is said to be from, at the installation's own address, and where answers go; empty is the installation. */
  sender?: { name: string; replyTo: string };
}

/** Sends one mail to one address. Rejects when it was not taken over; the outbox then tries again later. */
export interface MailPort {
  send: (mail: Mail, idempotencyKey: string) => Promise<void>;
}
