import sharp from 'sharp';
import { counters, eq, freezers, memberships, people, photos, requestEntries, requests, stores, type ProducerDb } from '../db';
import type { Services } from '../http/context';
import { addDays, dayOf } from '../domain/civil';
import { demoRequests, type DemoRequest } from './data/requests';

const HOUR = 3_600_000;
const FIRST_NUMBER = 2186;

/** Service requests in every state, with what was said about them. */
export async function createRequests(services: Services, scoped: ProducerDb, slug: string): Promise<void> {
  const list = [...(demoRequests[slug] ?? [])].sort((a, b) => b.openedAgo - a.openedAgo);
  const pictures = new Map<string, Buffer>();
  for (const { photo } of list) if (photo) pictures.set(photo, await drawn(photo));
  for (const [i, request] of list.entries()) {
    const file = request.photo ? `${services.newId()}.jpg` : null;
    const bytes = pictures.get(request.photo ?? '');
    if (file && bytes) await services.storage.put(file, bytes);
    services.db.$client.transaction(() => createRequest(services, scoped, request, FIRST_NUMBER + i, file))();
  }
  scoped.insert(counters, { id: 'request', value: FIRST_NUMBER + list.length - 1 });
}

function createRequest({ newId, now }: Services, scoped: ProducerDb, request: DemoRequest, number: number, file: string | null): void {
  const at = now();
  const { store: storeName, kind, words, state, openedAgo, scheduledIn, talk = [] } = request;
  const store = scoped.select({ id: stores.id, language: stores.language, timeZone: stores.timeZone }).from(stores).where(eq(stores.name, storeName)).get();
  if (!store) throw new Error(`the demo names ${storeName}, which is not there`);
  const freezer = scoped.select({ id: freezers.id }).from(freezers).where(eq(freezers.storeId, store.id)).orderBy(freezers.position).get();
  const openedBy = memberOf(scoped, 'dana') ?? memberOf(scoped, 'elena');
  const assigneeId = request.assignee ? memberOf(scoped, request.assignee) : null;
  const openedAt = at - openedAgo * HOUR;
  const ended = ['solved', 'closed', 'cancelled'].includes(state);
  const id = newId();
  const scheduledDay = scheduledIn === undefined ? null : addDays(dayOf(at, store.timeZone), scheduledIn);
  const changedAt = openedAt + Math.max(0.1, ...talk.map(({ after }) => after)) * HOUR;
  const voice = storePerson(scoped, storeName) ?? openedBy;
  const base = { id, number, storeId: store.id, freezerId: freezer?.id ?? null, kind, words, language: store.language };
  scoped.insert(requests, { ...base, state, assigneeId, scheduledDay, openedBy: voice, openedAt, changedAt, endedAt: ended ? changedAt : null });
  const entry = (when: number, authorId: string | null | undefined, rest: object) =>
    scoped.insert(requestEntries, { id: newId(), requestId: id, at: when, authorId, kind: 'opened', ...rest });
  entry(openedAt, voice, { words });
  if (file) {
    scoped.insert(photos, { id: newId(), requestId: id, file, width: 800, height: 600, addedBy: voice ?? '', createdAt: openedAt });
    entry(openedAt + 30_000, voice, { kind: 'photos', words: '1' });
  }
  if (assigneeId) entry(openedAt + 0.1 * HOUR, openedBy, { kind: 'assigned', assigneeId });
  for (const { by, words: said, after, note } of talk) entry(openedAt + after * HOUR, memberOf(scoped, by), { kind: note ? 'note' : 'reply', words: said });
  if (state !== 'new') entry(changedAt, assigneeId ?? openedBy, { kind: 'state', state, day: scheduledDay });
}

const memberOf = (scoped: ProducerDb, start: string): string | null =>
  scoped
    .select({ id: memberships.id, email: people.email })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .all()
    .find(({ email }) => email.startsWith(`${start}@`))?.id ?? null;

const voices: Record<string, string> = {
  'Ozark Lane Grocery': 'lena',
  'Lantern Corner 14': 'rosa',
  'Campo Verde Tienda': 'marisol',
  'Juniper Fuel & Bait': 'hank',
  'Tern Point Marina': 'hank',
  'Heron Dock': 'hank',
  'La Gaviota 3': 'ines',
  'Sandbar Fuel': 'kyle',
};
const storePerson = (scoped: ProducerDb, store: string): string | null => memberOf(scoped, voices[store] ?? '-');

/** A plain picture, as a phone might have taken it. */
async function drawn(what: string): Promise<Buffer> {
  const shape =
    what === 'hinge'
      ? '<rect x="180" y="60" width="440" height="480" fill="#dfe7e8" stroke="#5b6b73" stroke-width="10"/><rect x="150" y="120" width="70" height="110" rx="8" fill="#6f7d84"/><circle cx="185" cy="150" r="10" fill="#2c363b"/><circle cx="185" cy="200" r="10" fill="#2c363b"/><path d="M220 175 L300 190" stroke="#39464c" stroke-width="14"/>'
      : '<rect x="90" y="200" width="260" height="320" rx="60" fill="#cfe6ea" stroke="#8fb5bd" stroke-width="8"/><rect x="300" y="180" width="280" height="340" rx="60" fill="#c4dfe4" stroke="#8fb5bd" stroke-width="8"/><path d="M300 250 q60 80 0 200" stroke="#7aa3ac" stroke-width="12" fill="none"/>';
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="800" height="600"><rect width="800" height="600" fill="#9aa4a6"/><rect y="480" width="800" height="120" fill="#6d7678"/>${shape}</svg>`;
  return sharp(Buffer.from(svg)).blur(1.2).jpeg({ quality: 80 }).toBuffer();
}
