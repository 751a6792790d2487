import type { Mail } from '../../ports/mail';

export const addressOf = (from: string): string => /<([^>]+)>/.exec(from)?.[1] ?? from.trim();

/** A producer's name before the installation's own address, which is the one its mail server may speak for. */
export const headersOf = (from: string, sender: Mail['sender']) => ({
  from: sender?.name ? { name: sender.name, address: addressOf(from) } : from,
  ...(sender?.replyTo ? { replyTo: { name: '', address: sender.replyTo } } : {}),
});
