import * as z from 'zod/mini';
import { email, fault, id, language, nextCursor, paging, producerParams, withProducer, words } from './common';
import { endpoint } from './endpoint';
import { grants, roles, sides } from './words';

/** Roles whose view is narrowed by what they are assigned. */
export const scopedRoles = ['store-manager', 'district-rep'] as const;
export const scopeKinds = ['store', 'district', 'account'] as const;

const scope = z.strictObject({ kind: z.enum(scopeKinds), id });
const scopes = z.array(scope).check(z.maxLength(300, fault('too-long')));

const member = z.object({
  /** Of the membership. */
  id,
  name: z.string(),
  email: z.string(),
  language,
  role: z.enum(roles),
  side: z.enum(sides),
  grants: z.array(z.enum(grants)),
  scopes: z.array(z.object({ ...scope.shape, name: z.string() })),
  active: z.boolean(),
});
export type MemberOf = z.output<typeof member>;

export const listPeople = endpoint({
  id: 'people.list',
  method: 'get',
  path: '/api/:producer/people',
  access: { kind: 'may', action: 'read', subject: 'Person' },
  params: producerParams,
  query: z.strictObject({ ...paging, role: z.optional(z.enum(roles)), q: z.optional(z.string().check(z.maxLength(120))) }),
  result: z.object({ people: z.array(member), next: nextCursor }),
  problems: ['bad-input'],
});

/** Adds somebody and writes to them in their language; the mail leads to an ordinary sign-in. */
export const invitePerson = endpoint({
  id: 'people.invite',
  method: 'post',
  path: '/api/:producer/people',
  access: { kind: 'may', action: 'create', subject: 'Person' },
  params: producerParams,
  body: z.strictObject({
    email,
    name: words(120, 1),
    language,
    role: z.enum(roles, fault('choice')),
    /** Asked of a district rep only: the stores' person or the producer's. */
    side: z._default(z.enum(sides), 'producer'),
    scopes: z._default(scopes, []),
    /** What the membership may do beyond its role. */
    grants: z._default(z.array(z.enum(grants)), []),
  }),
  status: 201,
  result: member,
  problems: ['bad-input', 'not-allowed', 'already-member', 'scope-needed', 'scope-unknown'],
});

export const changePerson = endpoint({
  id: 'people.change',
  method: 'patch',
  path: '/api/:producer/people/:memberId',
  access: { kind: 'may', action: 'update', subject: 'Person' },
  params: withProducer({ memberId: id }),
  body: z.strictObject({
    role: z.optional(z.enum(roles, fault('choice'))),
    side: z.optional(z.enum(sides)),
    scopes: z.optional(scopes),
    grants: z.optional(z.array(z.enum(grants))),
    /** Of the portal and its mail; the person can change it back. */
    language: z.optional(language),
    active: z.optional(z.boolean()),
    /** Who takes over the live requests of somebody who is deactivated; nobody unless said. */
    handOverTo: z._default(z.nullable(id), null),
  }),
  result: member,
  problems: ['bad-input', 'not-found', 'not-allowed', 'last-admin', 'scope-needed', 'scope-unknown', 'unknown-person'],
});

export const inviteAgain = endpoint({
  id: 'people.inviteAgain',
  method: 'post',
  path: '/api/:producer/people/:memberId/invitations',
  access: { kind: 'may', action: 'update', subject: 'Person' },
  params: withProducer({ memberId: id }),
  status: 202,
  answer: 'nothing',
  problems: ['not-found', 'not-allowed'],
});

/**
 * From now on, until it is ended, this session is answered what that person's own would be, and may only read. It is
 * recorded, and it ends by itself.
 */
export const seeAs = endpoint({
  id: 'people.seeAs',
  method: 'post',
  path: '/api/:producer/people/:memberId/view',
  access: { kind: 'may', action: 'update', subject: 'Person' },
  params: withProducer({ memberId: id }),
  answer: 'nothing',
  problems: ['not-found', 'not-allowed'],
});

/** What people can be assigned besides single stores. */
export const listPlaces = endpoint({
  id: 'people.places',
  method: 'get',
  path: '/api/:producer/places',
  access: { kind: 'may', action: 'read', subject: 'District' },
  params: producerParams,
  result: z.object({
    districts: z.array(z.object({ id, name: z.string() })),
    /** Empty for those who may not read accounts. */
    accounts: z.array(z.object({ id, number: z.string(), name: z.string() })),
  }),
  problems: [],
});
