import * as z from 'zod/mini';
import { email, fault, id, language, nextCursor, paging, phone, producerParams, search, version, withProducer, words } from './common';
import { endpoint } from './endpoint';

const contact = z.strictObject({
  name: words(120, 1),
  /** What they are to the account: buyer, bookkeeper … */
  work: words(80),
  email: z.union([z.literal(''), email]),
  phone,
});

const entered = {
  number: words(40, 1),
  name: words(120, 1),
  terms: words(80),
  language,
  contacts: z.array(contact).check(z.maxLength(20, fault('too-long'))),
};

const account = z.object({ id, ...entered, stores: z.int(), retired: z.boolean(), version });
export type Account = z.output<typeof account>;

/** By name; the retired ones only when asked for. */
export const listAccounts = endpoint({
  id: 'accounts.list',
  method: 'get',
  path: '/api/:producer/accounts',
  access: { kind: 'may', action: 'read', subject: 'Account' },
  params: producerParams,
  query: z.strictObject({ ...paging, q: search, retired: z.optional(z.literal('only')) }),
  result: z.object({ accounts: z.array(account), next: nextCursor }),
  problems: ['bad-input'],
});

export const readAccount = endpoint({
  id: 'accounts.read',
  method: 'get',
  path: '/api/:producer/accounts/:accountId',
  access: { kind: 'may', action: 'read', subject: 'Account' },
  params: withProducer({ accountId: id }),
  result: account,
  problems: ['not-found'],
});

export const createAccount = endpoint({
  id: 'accounts.create',
  method: 'post',
  path: '/api/:producer/accounts',
  access: { kind: 'may', action: 'create', subject: 'Account' },
  params: producerParams,
  body: z.strictObject(entered),
  status: 201,
  result: account,
  problems: ['bad-input', 'not-allowed'],
});

/** What is given is changed; retired is for good until it is taken back, and only without stores in use. */
export const changeAccount = endpoint({
  id: 'accounts.change',
  method: 'patch',
  path: '/api/:producer/accounts/:accountId',
  access: { kind: 'may', action: 'update', subject: 'Account' },
  params: withProducer({ accountId: id }),
  body: z.strictObject({ version, ...z.partial(z.object(entered)).shape, retired: z.optional(z.boolean()) }),
  result: account,
  problems: ['bad-input', 'not-found', 'not-allowed', 'changed-meanwhile', 'still-in-use'],
});
