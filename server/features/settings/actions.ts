import type { Request } from 'express';
import type { Body } from '../../contract/endpoint';
import type { changeSettings as changeEndpoint, Settings } from '../../contract/settings';
import type { ProducerContext } from '../../http/context';
import { problem } from '../../http/problem';
import { redraw } from '../pictures';

/** Changes what is given; a new risk limit is asked of every freezer at once. */
export function changeSettings({ act, producer }: ProducerContext, { version, mailSender, ...change }: Body<typeof changeEndpoint>): void {
  act('change-settings', (tx) => {
    tx.authorise('update', 'Settings', {});
    if (version !== producer.version) throw problem('changed-meanwhile');
    const sender = mailSender && { senderName: mailSender.name, replyTo: mailSender.replyTo };
    tx.changeProducer({ ...change, ...sender });
    tx.audit('Settings', 'settings', { ...change, ...sender });
  });
}

const LOGO_SIDE = 512;

/** The producer's picture, drawn anew. */
export async function setLogo(ctx: ProducerContext, req: Request): Promise<void> {
  if (!req.file) throw problem('photo-unreadable');
  const { bytes } = await redraw(req.file.buffer, LOGO_SIDE, (picture) => picture.png());
  const logo = `${ctx.newId()}.png`;
  await ctx.storage.put(logo, bytes);
  keepLogo(ctx, logo);
}

export function clearLogo(ctx: ProducerContext): void {
  if (ctx.producer.logo === null) throw problem('not-found');
  keepLogo(ctx, null);
}

function keepLogo({ act }: ProducerContext, logo: string | null): void {
  act('change-logo', (tx) => {
    tx.authorise('update', 'Settings', {});
    tx.changeProducer({ logo });
    tx.audit('Settings', 'settings', { logo: logo !== null });
  });
}

export const presentSettings = ({ producer }: ProducerContext): Settings => {
  const { name, timeZone, urgentPhone, serviceHours, holidays, riskLimit, senderName, replyTo, logo, version } = producer;
  return { name, timeZone, urgentPhone, serviceHours, holidays, riskLimit, mailSender: { name: senderName, replyTo }, hasLogo: logo !== null, version };
};
