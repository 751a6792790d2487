import type { Request } from 'express';
import type { Body } from '../../contract/endpoint';
import type { changeSettings as changeEndpoint, Settings } from '../../contract/settings';
import type { ProducerContext } from '../../http/context';
import { problem } from '../../http/problem';
import { changedOf } from '../changed';
import { redraw } from '../pictures';

/** Changes what differs; a new risk limit is asked of every freezer at once. */
export function changeSettings({ act, producer }: ProducerContext, body: Body<typeof changeEndpoint>): void {
  act('change-settings', (tx) => {
    tx.authorise('update', 'Settings', {});
    const { mailSender, ...change } = changedOf(presentSettings({ producer }), body);
    const sender = mailSender && { senderName: mailSender.name, replyTo: mailSender.replyTo };
    tx.changeProducer({ ...change, ...sender });
    // An address is somebody's; the trail names nobody.
    tx.audit('Settings', 'settings', { ...change, ...(sender && { senderName: sender.senderName, replyTo: true }) });
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

export const presentSettings = ({ producer }: Pick<ProducerContext, 'producer'>): Settings => {
  const { name, timeZone, urgentPhone, serviceHours, holidays, riskLimit, senderName, replyTo, logo, version } = producer;
  return { name, timeZone, urgentPhone, serviceHours, holidays, riskLimit, mailSender: { name: senderName, replyTo }, hasLogo: logo !== null, version };
};
