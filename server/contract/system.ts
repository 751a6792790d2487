import * as z from 'zod/mini';
import { email } from './common';
import { endpoint } from './endpoint';

export const health = endpoint({
  id: 'system.health',
  method: 'get',
  path: '/healthz',
  access: { kind: 'public', reason: 'says only that the process and its database answer' },
  result: z.object({ ok: z.boolean() }),
  problems: ['storage-full'],
});

export const openapi = endpoint({
  id: 'system.openapi',
  method: 'get',
  path: '/api/openapi.json',
  access: { kind: 'public', reason: 'the description of this interface, without data' },
  answer: 'file',
  problems: [],
});

const devPage = { method: 'get', access: { kind: 'dev' }, answer: 'file', problems: [] } as const;

export const devMail = endpoint({ id: 'dev.mail', path: '/dev/mail', ...devPage });
export const devMailOne = endpoint({
  id: 'dev.mailOne',
  path: '/dev/mail/:mailId',
  params: z.strictObject({ mailId: z.uuid() }),
  ...devPage,
});
export const devMailJson = endpoint({
  id: 'dev.mailJson',
  method: 'get',
  path: '/dev/mail.json',
  access: { kind: 'dev' },
  result: z.array(
    z.object({
      to: z.string(),
      subject: z.string(),
      text: z.string(),
      html: z.string(),
      links: z.array(z.string()),
      at: z.string(),
    }),
  ),
  problems: [],
});
export const devPeople = endpoint({
  id: 'dev.people',
  path: '/dev/people',
  query: z.object({ email: z.optional(z.string()) }),
  ...devPage,
});
export const devSignIn = endpoint({
  id: 'dev.signIn',
  method: 'post',
  path: '/dev/people',
  access: { kind: 'dev' },
  bodyType: 'application/x-www-form-urlencoded',
  body: z.object({ email }),
  answer: 'file',
  problems: ['bad-input', 'not-found'],
});
