import * as z from 'zod/mini';
import { day, email, id, instant, language, slug, span, words } from './common';
import { endpoint } from './endpoint';
import { grants, roles, sides } from './words';

/** A path of this application; anything else falls back to the front page. */
export const nextPath = z.string().check(z.maxLength(500));

export const requestLink = endpoint({
  id: 'auth.requestLink',
  method: 'post',
  path: '/api/auth/link',
  access: { kind: 'public', reason: 'answers alike whoever asks; mail goes to the address itself' },
  body: z.strictObject({ email, next: z.optional(nextPath) }),
  status: 202,
  answer: 'nothing',
  problems: ['bad-input', 'too-many-requests'],
});

/** The token of the link, from the browser that asked; from any other with the code of the same mail; or the code alone where it was asked for. */
export const signIn = endpoint({
  id: 'auth.signIn',
  method: 'post',
  path: '/api/auth/session',
  access: { kind: 'public', reason: 'proves itself with the one-time value' },
  body: z.strictObject({
    token: z.optional(z.string().check(z.maxLength(2000))),
    code: z.optional(
      z.string().check(
        z.overwrite((text) => text.replace(/[\s-]/g, '')),
        z.regex(/^\d{6}$/, { error: 'code' }),
      ),
    ),
  }),
  answer: 'nothing',
  problems: ['bad-input', 'link-expired', 'link-other-browser', 'code-wrong', 'too-many-tries', 'too-many-requests'],
});

export const signOut = endpoint({
  id: 'auth.signOut',
  method: 'delete',
  path: '/api/auth/session',
  access: { kind: 'person', evenSeeing: true },
  answer: 'nothing',
  problems: [],
});

export const membership = z.object({
  membershipId: id,
  role: z.enum(roles),
  side: z.enum(sides),
  storeIds: z.array(id),
  grants: z.array(z.enum(grants)),
  producer: z.object({
    slug,
    name: z.string(),
    timeZone: z.string(),
    language,
    urgentPhone: z.string(),
    /** Changes with the picture; null where there is none. */
    logo: z.nullable(z.string()),
    /** When the service desk answers. */
    serviceHours: z.array(span),
    /** Today and later. */
    holidays: z.array(z.object({ day, name: z.string() })),
  }),
  /** What the rules allow some such subject: `read:Store`, `create:Request` … */
  abilities: z.array(z.string()),
});
export type Membership = z.output<typeof membership>;

const whole = z.object({
  person: z.object({ id, name: z.string(), email: z.string(), language }),
  memberships: z.array(membership),
});

export const me = endpoint({
  id: 'me.read',
  method: 'get',
  path: '/api/me',
  access: { kind: 'person' },
  result: whole,
  problems: [],
});

/** Who is signed in here, or nobody: what a page asks first, without a complaint in the console where nobody is. */
export const readSession = endpoint({
  id: 'auth.readSession',
  method: 'get',
  path: '/api/auth/session',
  access: { kind: 'public', reason: 'tells a browser about its own cookie' },
  result: z.object({ me: z.nullable(whole) }),
  problems: [],
});

/** Whether this session sees as somebody else, and since when and until when. */
export const readSeeing = endpoint({
  id: 'auth.readSeeing',
  method: 'get',
  path: '/api/auth/seeing',
  access: { kind: 'public', reason: 'tells a browser about its own session' },
  result: z.object({ seeing: z.nullable(z.object({ producer: slug, memberId: id, name: z.string(), until: instant })) }),
  problems: [],
});

export const endSeeing = endpoint({
  id: 'auth.endSeeing',
  method: 'delete',
  path: '/api/auth/seeing',
  access: { kind: 'person', evenSeeing: true },
  answer: 'nothing',
  problems: [],
});

export const updateMe = endpoint({
  id: 'me.update',
  method: 'patch',
  path: '/api/me',
  access: { kind: 'person' },
  body: z.strictObject({ language: z.optional(language), name: z.optional(words(120, 1)) }),
  answer: 'nothing',
  problems: ['bad-input'],
});

export const mySessions = endpoint({
  id: 'me.sessions',
  method: 'get',
  path: '/api/me/sessions',
  access: { kind: 'person' },
  result: z.object({
    sessions: z.array(
      z.object({
        handle: z.string(),
        device: z.string(),
        createdAt: instant,
        seenAt: instant,
        current: z.boolean(),
      }),
    ),
  }),
  problems: [],
});

export const endSession = endpoint({
  id: 'me.endSession',
  method: 'delete',
  path: '/api/me/sessions/:handle',
  access: { kind: 'person' },
  params: z.strictObject({ handle: z.string().check(z.regex(/^[\w-]{8,64}$/)) }),
  answer: 'nothing',
  problems: ['not-found'],
});
