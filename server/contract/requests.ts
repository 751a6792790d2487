import * as z from 'zod/mini';
import { day, fault, id, instant, language, nextCursor, paging, producerParams, withProducer, words } from './common';
import { endpoint } from './endpoint';
import { entryKinds, requestKinds, requestStates, roles } from './words';

export const maxPhotos = 5;
export const maxPhotoBytes = 10 * 1024 * 1024;

const member = z.object({ id, name: z.string(), role: z.enum(roles) });
export type Member = z.output<typeof member>;

export const requestSummary = z.object({
  id,
  /** `SR-` and this number, counted per producer. */
  number: z.int(),
  kind: z.enum(requestKinds),
  state: z.enum(requestStates),
  storeId: id,
  store: z.string(),
  timeZone: z.string(),
  freezerId: z.nullable(id),
  freezer: z.nullable(z.string()),
  scheduledDay: z.nullable(day),
  assignee: z.nullable(member),
  language,
  openedAt: instant,
  changedAt: instant,
  photos: z.int(),
  version: z.int(),
});
export type RequestSummary = z.output<typeof requestSummary>;

export const requestEntry = z.object({
  id,
  at: instant,
  kind: z.enum(entryKinds),
  author: z.nullable(member),
  words: z.string(),
  state: z.nullable(z.enum(requestStates)),
  day: z.nullable(day),
  assignee: z.nullable(member),
});

export const request = z.object({
  ...requestSummary.shape,
  words: z.string(),
  /** Null when a freezer's own readings opened it. */
  openedBy: z.nullable(member),
  /** Oldest first; notes to staff only for those who may read them. */
  entries: z.array(requestEntry),
  photoList: z.array(z.object({ id, width: z.int(), height: z.int() })),
});
export type Request = z.output<typeof request>;

/** `live` stands for new, open, waiting on store and scheduled; `any` for all. */
export const stateFilters = ['live', 'any', ...requestStates] as const;

export const listRequests = endpoint({
  id: 'requests.list',
  method: 'get',
  path: '/api/:producer/requests',
  access: { kind: 'may', action: 'read', subject: 'Request' },
  params: producerParams,
  query: z.strictObject({
    ...paging,
    state: z.optional(z.enum(stateFilters)),
    kind: z.optional(z.enum(requestKinds)),
    assignee: z.optional(z.union([z.enum(['me', 'nobody']), id])),
    store: z.optional(id),
    q: z.optional(z.string().check(z.maxLength(120))),
  }),
  result: z.object({ requests: z.array(requestSummary), next: nextCursor }),
  problems: ['bad-input'],
});

export const fileRequest = endpoint({
  id: 'requests.file',
  method: 'post',
  path: '/api/:producer/requests',
  access: { kind: 'may', action: 'create', subject: 'Request' },
  params: producerParams,
  body: z.strictObject({
    storeId: id,
    kind: z.enum(requestKinds, fault('choice')),
    freezerId: z._default(z.nullable(id), null),
    words: z._default(words(2000), ''),
  }),
  status: 201,
  result: request,
  problems: ['bad-input', 'not-found', 'not-allowed', 'freezer-elsewhere'],
});

const requestParams = withProducer({ requestId: id });

export const readRequest = endpoint({
  id: 'requests.read',
  method: 'get',
  path: '/api/:producer/requests/:requestId',
  access: { kind: 'may', action: 'read', subject: 'Request' },
  params: requestParams,
  result: request,
  problems: ['not-found'],
});

/** Assign, move to another state, schedule. `version` is the one the person saw. */
export const changeRequest = endpoint({
  id: 'requests.change',
  method: 'patch',
  path: '/api/:producer/requests/:requestId',
  access: { kind: 'may', action: 'update', subject: 'Request' },
  params: requestParams,
  body: z.strictObject({
    version: z.int(),
    state: z.optional(z.enum(['open', 'waiting-on-store', 'scheduled', 'solved', 'closed'], fault('choice'))),
    scheduledDay: z.optional(day),
    assigneeId: z.optional(z.nullable(id)),
  }),
  result: request,
  problems: ['bad-input', 'not-found', 'not-allowed', 'request-changed', 'step-not-possible', 'day-needed', 'day-past', 'unknown-person'],
});

/** The store takes its request back. */
export const cancelRequest = endpoint({
  id: 'requests.cancel',
  method: 'delete',
  path: '/api/:producer/requests/:requestId',
  access: { kind: 'may', action: 'cancel', subject: 'Request' },
  params: requestParams,
  result: request,
  problems: ['not-found', 'not-allowed', 'request-ended'],
});

export const replyToRequest = endpoint({
  id: 'requests.reply',
  method: 'post',
  path: '/api/:producer/requests/:requestId/replies',
  access: { kind: 'may', action: 'reply', subject: 'Request' },
  params: requestParams,
  body: z.strictObject({ words: words(4000, 1) }),
  status: 201,
  result: request,
  problems: ['bad-input', 'not-found', 'not-allowed', 'request-ended'],
});

/** A note the store never sees. */
export const noteOnRequest = endpoint({
  id: 'requests.note',
  method: 'post',
  path: '/api/:producer/requests/:requestId/notes',
  access: { kind: 'may', action: 'create', subject: 'Note' },
  params: requestParams,
  body: z.strictObject({ words: words(4000, 1) }),
  status: 201,
  result: request,
  problems: ['bad-input', 'not-found', 'not-allowed'],
});

/** One to five files named `photos`; JPEG, PNG or WebP by their content. */
export const addPhotos = endpoint({
  id: 'requests.addPhotos',
  method: 'post',
  path: '/api/:producer/requests/:requestId/photos',
  access: { kind: 'may', action: 'create', subject: 'Request' },
  params: requestParams,
  bodyType: 'multipart/form-data',
  status: 201,
  result: request,
  problems: ['not-found', 'not-allowed', 'request-ended', 'photo-unreadable', 'photo-too-large', 'too-many-photos', 'storage-full'],
});

export const readPhoto = endpoint({
  id: 'requests.readPhoto',
  method: 'get',
  path: '/api/:producer/requests/:requestId/photos/:photoId',
  access: { kind: 'may', action: 'read', subject: 'Request' },
  params: withProducer({ requestId: id, photoId: id }),
  answer: 'file',
  problems: ['not-found'],
});

/** Whom a request can be given to. */
export const listAssignees = endpoint({
  id: 'requests.assignees',
  method: 'get',
  path: '/api/:producer/assignees',
  access: { kind: 'may', action: 'update', subject: 'Request' },
  params: producerParams,
  result: z.object({ assignees: z.array(member) }),
  problems: [],
});
