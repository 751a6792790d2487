import { row } from '../../contract/ability';
import { api } from '../../contract';
import type { Query } from '../../contract/endpoint';
import type { Request } from '../../contract/requests';
import { and, contains, eq, isNull, requests, sql, stores, type SQL } from '../../db';
import { membersByRole } from '../../db/views/people';
import { readableRequests, requestsView, requestView } from '../../db/views/requests';
import { live } from '../../db/views/stores';
import type { ProducerContext } from '../../http/context';
import { orNotFound } from '../../http/problem';
import { route } from '../../http/route';
import { requireSession } from '../../http/session';
import { pageOf, readCursor } from '../cursor';
import { cancelRequest, changeRequest, fileRequest, load, noteOnRequest, replyToRequest, ruled } from './actions';
import { addPhotos, readPhoto, takePhotos } from './photos';

export const requestsRoutes = [
  route(api.requests.list, ({ db, ability, viewer }, { query }) => {
    const limit = query.limit ?? 50;
    const cursor = readCursor(query.after, ['number', 'string']);
    const where = and(
      readableRequests(ability),
      ...filters(query, viewer.membershipId),
      cursor ? sql`(${requests.openedAt}, ${requests.id}) < (${cursor[0]}, ${cursor[1]})` : undefined,
    );
    const page = pageOf(requestsView(db, where ?? sql`1`, limit + 1), limit, ({ openedAt, id }) => [openedAt, id]);
    return { requests: page.rows, next: page.next };
  }),

  route(api.requests.file, (ctx, { body }) => written(ctx, fileRequest(ctx, body))),

  route(api.requests.read, (ctx, { params }) => whole(ctx, params.requestId)),

  route(api.requests.change, (ctx, { params, body }) => {
    changeRequest(ctx, params.requestId, body);
    return written(ctx, params.requestId);
  }),

  route(api.requests.cancel, (ctx, { params }) => {
    cancelRequest(ctx, params.requestId);
    return whole(ctx, params.requestId);
  }),

  route(api.requests.reply, (ctx, { params, body }) => {
    replyToRequest(ctx, params.requestId, body.words);
    return whole(ctx, params.requestId);
  }),

  route(api.requests.note, (ctx, { params, body }) => {
    noteOnRequest(ctx, params.requestId, body.words);
    return whole(ctx, params.requestId);
  }),

  route(
    api.requests.addPhotos,
    async (ctx, { params, req }) => {
      await addPhotos(ctx, params.requestId, req);
      return whole(ctx, params.requestId);
    },
    (services) => [requireSession(services), takePhotos],
  ),

  route(api.requests.readPhoto, async (ctx, { params, res }) => {
    load(ctx, params.requestId, ctx);
    const bytes = await readPhoto(ctx, params.requestId, params.photoId);
    res.set('cache-control', 'private, max-age=31536000, immutable').type('image/jpeg').send(bytes);
    return undefined;
  }),

  route(api.requests.assignees, ({ db }) => ({
    assignees: membersByRole(db, ['support-agent', 'dispatcher', 'technician', 'producer-admin']).map(({ id, name, role }) => ({ id, name, role })),
  })),
];

const whole = (ctx: ProducerContext, id: string): Request => present(ctx, and(eq(requests.id, id), readableRequests(ctx.ability)));

/** As one's own act left it: a technician may file, or give away, what they then no longer see. */
const written = (ctx: ProducerContext, id: string): Request => present(ctx, eq(requests.id, id));

function present({ db, ability }: ProducerContext, where: SQL | undefined): Request {
  return orNotFound(where && requestView(db, where, (request) => ability.can('read', row('Note', ruled(request)))));
}

function filters({ state = 'live', kind, assignee, store, q }: Query<typeof api.requests.list>, me: string): (SQL | undefined)[] {
  return [
    state === 'any' ? undefined : state === 'live' ? sql`${requests.state} in (${live})` : eq(requests.state, state),
    kind ? eq(requests.kind, kind) : undefined,
    assignee === 'nobody' ? isNull(requests.assigneeId) : assignee ? eq(requests.assigneeId, assignee === 'me' ? me : assignee) : undefined,
    store ? eq(requests.storeId, store) : undefined,
    q ? matches(q) : undefined,
  ];
}

/** A number with or without `SR-`, or a part of the store's name or of the words. */
function matches(q: string): SQL {
  const number = /^(?:sr-?)?(\d{1,9})$/i.exec(q.trim())?.[1];
  if (number) return eq(requests.number, Number(number));
  return contains(q, stores.name, requests.words);
}
