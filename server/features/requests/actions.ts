import type { Body } from '../../contract/endpoint';
import type { changeRequest as changeEndpoint, fileRequest as fileEndpoint, Request, RequestSummary } from '../../contract/requests';
import type { EntryKind, Language, RequestState } from '../../contract/words';
import { and, eq, requestEntries, requests } from '../../db';
import { memberById } from '../../db/views/people';
import { readableRequests, requestsView } from '../../db/views/requests';
import { storeView } from '../../db/views/stores';
import { dayOf } from '../../domain/civil';
import { afterStoreReply, hasEnded, nextSteps } from '../../domain/request-steps';
import type { ActionTx, ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { freezerOfStore } from '../deliveries/actions';
import { nextNumber } from '../numbers';
import { tellMember, tellStaff, tellStore } from './notify';

const FIRST_NUMBER = 1001;

/** Files a service request for a store the viewer may see. Answers its id. */
export function fileRequest(ctx: ProducerContext, { storeId, kind, freezerId, words }: Body<typeof fileEndpoint>): string {
  const { act, now, newId, viewer } = ctx;
  const store = orNotFound(storeView(ctx.db, ctx.ability, storeId));
  return act('file-request', (tx) => {
    tx.authorise('create', 'Request', { storeId, kind, assigneeId: null });
    if (freezerId) freezerOfStore(tx.db, freezerId, storeId);
    const id = newId();
    tx.db.insert(requests, {
      id,
      number: nextNumber(tx.db, 'request', FIRST_NUMBER),
      storeId,
      freezerId,
      kind,
      words,
      language: languageOf(tx, viewer, store.language),
      state: 'new',
      openedBy: viewer.membershipId,
      openedAt: now,
      changedAt: now,
    });
    addEntry(ctx, tx, id, { kind: 'opened', words });
    tx.audit('Request', id, { storeId, freezerId, kind });
    const news = { ctx, tx, request: load(tx, id), words };
    tellStore(news, 'request-filed-store');
    tellStaff(news, 'request-filed-staff');
    return id;
  });
}

/** The store's own person is answered in their language, anybody else in the store's. */
const languageOf = (tx: ActionTx, { side, membershipId }: ProducerContext['viewer'], store: Language): Language =>
  (side === 'store' ? memberById(tx.db, membershipId)?.language : undefined) ?? store;

/** Assigns, moves and schedules; refuses a change that was made looking at an older version. */
export function changeRequest(ctx: ProducerContext, id: string, change: Body<typeof changeEndpoint>): void {
  ctx.act('change-request', (tx) => {
    const request = load(tx, id, ctx);
    tx.authorise('update', 'Request', ruled(request));
    if (request.version !== change.version) throw problem('request-changed');
    const step = stepOf(ctx, request, change);
    const assigneeId = change.assigneeId === undefined ? (request.assignee?.id ?? null) : change.assigneeId;
    if (change.assigneeId && !assignable(tx, change.assigneeId)) throw problem('unknown-person');
    tx.db.update(requests, id, {
      state: step.state,
      scheduledDay: step.day,
      assigneeId,
      version: request.version + 1,
      changedAt: ctx.now,
      endedAt: step.state === 'solved' || hasEnded(step.state) ? ctx.now : null,
    });
    if (step.moved) addEntry(ctx, tx, id, { kind: 'state', state: step.state, day: step.day });
    if (assigneeId !== (request.assignee?.id ?? null)) addEntry(ctx, tx, id, { kind: 'assigned', assigneeId });
    tx.audit('Request', id, { state: step.state, scheduledDay: step.day, assigneeId });
    const news = { ctx, tx, request: load(tx, id), words: request.words };
    if (step.moved && step.state !== 'new') tellStore(news, `request-${step.state}`);
    if (assigneeId && assigneeId !== request.assignee?.id) tellMember(news, 'request-assigned', assigneeId);
  });
}

export function cancelRequest(ctx: ProducerContext, id: string): void {
  ctx.act('cancel-request', (tx) => {
    const request = load(tx, id, ctx);
    tx.authorise('cancel', 'Request', ruled(request));
    if (!nextSteps(request.state).includes('cancelled')) throw problem('request-ended');
    const row = { state: 'cancelled' as const, version: request.version + 1, changedAt: ctx.now, endedAt: ctx.now };
    tx.db.update(requests, id, row);
    addEntry(ctx, tx, id, { kind: 'state', state: 'cancelled' });
    tx.audit('Request', id, { state: 'cancelled' });
    tellStaff({ ctx, tx, request }, 'request-cancelled');
  });
}

/** Words for the other side. From the store they also open again what waited for them. */
export function replyToRequest(ctx: ProducerContext, id: string, words: string): void {
  ctx.act('reply-to-request', (tx) => {
    const request = load(tx, id, ctx);
    tx.authorise('reply', 'Request', ruled(request));
    if (hasEnded(request.state)) throw problem('request-ended');
    addEntry(ctx, tx, id, { kind: 'reply', words });
    const fromStore = ctx.viewer.side === 'store';
    const state = fromStore ? afterStoreReply(request.state) : request.state;
    const moved = state !== request.state;
    tx.db.update(requests, id, { state, changedAt: ctx.now, ...(moved ? { version: request.version + 1, endedAt: null } : {}) });
    if (moved) addEntry(ctx, tx, id, { kind: 'state', state });
    tx.audit('Request', id, { replied: true, state });
    const news = { ctx, tx, request, words };
    if (fromStore) tellStaff(news, 'request-reply');
    else tellStore(news, 'request-reply');
  });
}

export function noteOnRequest(ctx: ProducerContext, id: string, words: string): void {
  ctx.act('note-on-request', (tx) => {
    const request = load(tx, id, ctx);
    tx.authorise('create', 'Note', ruled(request));
    addEntry(ctx, tx, id, { kind: 'note', words });
    tx.audit('Note', id, { noted: true });
  });
}

interface Entry {
  kind: EntryKind;
  words?: string;
  state?: RequestState;
  day?: string | null;
  assigneeId?: string | null;
}

export function addEntry({ newId, now, viewer }: ProducerContext, tx: ActionTx, requestId: string, entry: Entry): void {
  tx.db.insert(requestEntries, { id: newId(), requestId, at: now, authorId: viewer.membershipId, ...entry });
}

type Loaded = ReturnType<typeof requestsView>[number];

/** The request as its readers see it; for a viewer who may not see it, it does not exist. */
export function load(tx: Pick<ActionTx, 'db'>, id: string, ctx?: ProducerContext): Loaded {
  const where = and(eq(requests.id, id), ctx ? readableRequests(ctx.ability) : undefined);
  const [found] = where ? requestsView(tx.db, where, 1) : [];
  if (!found) throw problem('not-found');
  return found;
}

/** What rules ask about a request. */
export const ruled = ({ id, storeId, kind, assignee, openedBy }: RequestSummary & Pick<Request, 'openedBy'>) => ({
  id,
  storeId,
  kind,
  assigneeId: assignee?.id ?? null,
  openedBy: openedBy?.id ?? null,
});

function stepOf({ now }: ProducerContext, request: Loaded, change: Body<typeof changeEndpoint>) {
  const state: RequestState = change.state ?? request.state;
  const day = state === 'scheduled' ? (change.scheduledDay ?? request.scheduledDay) : null;
  const moved = state !== request.state || day !== request.scheduledDay;
  if (moved && !nextSteps(request.state).includes(state)) throw problem('step-not-possible');
  if (state === 'scheduled' && !day) throw problem('day-needed');
  if (moved && day && day < dayOf(now, request.timeZone)) throw problem('day-past');
  return { state, day, moved };
}

const STAFF = ['support-agent', 'dispatcher', 'technician', 'producer-admin'];
const assignable = (tx: ActionTx, membershipId: string): boolean => STAFF.includes(memberById(tx.db, membershipId)?.role ?? '');
