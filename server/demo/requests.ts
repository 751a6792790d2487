import sharp from 'sharp';
import { counters, eq, freezers, memberships, people, photos, requestEntries, requests, stores, type ProducerDb } from '../db';
import type { Services } from '../http/context';
import { addDays, dayOf } from '../domain/civil';
import { demoRequests, type DemoRequest } from './data/requests';

const HOUR = 3_600_000;
const FIRST_NUMBER = 2186;

/** Puts the photos of the demo's requests into storage; answers their file names by picture and request. */
export async function keepPictures({ storage, newId }: Services, slug: string): Promise<Map<DemoRequest, string>> {
  const files = new Map<DemoRequest, string>();
  for (const request of demoRequests[slug] ?? []) {
    if (!request.photo) continue;
    const file = `${newId()}.jpg`;
    await storage.put(file, await drawn(request.photo));
    files.set(request, file);
  }
  return files;
}

/** Service requests in every state, with what was said about them. */
export function createRequests(services: Services, scoped: ProducerDb, slug: string, pictures: Map<DemoRequest, string>): void {
  const list = [...(demoRequests[slug] ?? [])].sort((a, b) => b.openedAgo - a.openedAgo);
  list.forEach((request, i) => createRequest(services, scoped, request, FIRST_NUMBER + i, pictures.get(request) ?? null));
  scoped.insert(counters, { id: 'request', value: FIRST_NUMBER + list.length - 1 });
}

/** A visit that was due while the demo stood still is tomorrow. */
export function putOffVisits({ newId, now }: Services, scoped: ProducerDb): void {
  const at = now();
  const scheduled = scoped
    .select({ id: requests.id, day: requests.scheduledDay, version: requests.version, assigneeId: requests.assigneeId, timeZone: stores.timeZone })
    .from(requests)
    .innerJoin(stores, eq(stores.id, requests.storeId))
    .where(eq(requests.state, 'scheduled'))
    .all();
  for (const { id, day, version, assigneeId, timeZone } of scheduled) {
    const today = dayOf(at, timeZone);
    if (day === null || day >= today) continue;
    const tomorrow = addDays(today, 1);
    scoped.update(requests, id, { scheduledDay: tomorrow, version: version + 1, changedAt: at });
    scoped.insert(requestEntries, { id: newId(), requestId: id, at, authorId: assigneeId, kind: 'state', state: 'scheduled', day: tomorrow });
  }
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
