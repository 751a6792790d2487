import * as z from 'zod/mini';
import { day, email, fault, producerParams, spans, timeZone, version, words } from './common';
import { endpoint } from './endpoint';

export const maxLogoBytes = 2_000_000;

const entered = {
  name: words(120, 1),
  timeZone,
  urgentPhone: words(40, 1),
  /** When the service desk answers, by the producer's clocks. */
  serviceHours: spans,
  holidays: z
    .array(z.strictObject({ day, name: words(80) }))
    .check(z.maxLength(60, fault('too-long'))),
  /** The chance of being empty before the truck from which a freezer counts as at risk, 0.1 to 0.5. */
  riskLimit: z.number(fault('risk-limit')).check(z.minimum(0.1, fault('risk-limit')), z.maximum(0.5, fault('risk-limit'))),
  /** Who mail says it is from, and where answers go; empty is the installation's own. */
  mailSender: z.strictObject({ name: words(80), replyTo: z.union([z.literal(''), email]) }),
};

const settings = z.object({ ...entered, hasLogo: z.boolean(), version });
export type Settings = z.output<typeof settings>;

export const readSettings = endpoint({
  id: 'settings.read',
  method: 'get',
  path: '/api/:producer/settings',
  access: { kind: 'may', action: 'read', subject: 'Settings' },
  params: producerParams,
  result: settings,
  problems: [],
});

export const changeSettings = endpoint({
  id: 'settings.change',
  method: 'patch',
  path: '/api/:producer/settings',
  access: { kind: 'may', action: 'update', subject: 'Settings' },
  params: producerParams,
  body: z.strictObject({ version, ...z.partial(z.object(entered)).shape }),
  result: settings,
  problems: ['bad-input', 'not-allowed', 'changed-meanwhile'],
});

/** One PNG, JPEG or WebP in the field `logo`. */
export const setLogo = endpoint({
  id: 'settings.setLogo',
  method: 'put',
  path: '/api/:producer/logo',
  access: { kind: 'may', action: 'update', subject: 'Settings' },
  params: producerParams,
  bodyType: 'multipart/form-data',
  answer: 'nothing',
  problems: ['not-allowed', 'photo-unreadable', 'photo-too-large', 'too-many-photos'],
});

export const clearLogo = endpoint({
  id: 'settings.clearLogo',
  method: 'delete',
  path: '/api/:producer/logo',
  access: { kind: 'may', action: 'update', subject: 'Settings' },
  params: producerParams,
  answer: 'nothing',
  problems: ['not-allowed', 'not-found'],
});

/** The picture, for everybody who works with the producer. */
export const readLogo = endpoint({
  id: 'settings.readLogo',
  method: 'get',
  path: '/api/:producer/logo',
  access: { kind: 'may', action: 'read', subject: 'Store' },
  params: producerParams,
  answer: 'file',
  problems: ['not-found'],
});
