import { createHash } from 'node:crypto';
import {
  accounts,
  auditEntries,
  counters,
  deliveries,
  deliveryLines,
  districts,
  fillFleetRows,
  freezers,
  freezerStates,
  installs,
  lanes,
  membershipScopes,
  memberships,
  models,
  nextTruckLoads,
  nextTrucks,
  people,
  photos,
  producerDb,
  producers,
  products,
  quarantinedReadings,
  requestEntries,
  requests,
  sensors,
  stores,
  telemetryKeys,
  type Database,
  type ProducerDb,
} from '../server/db';
import type { RequestKind, RequestState } from '../server/contract/words';
import { stateOf } from './states';
import { lotWord, noteWord, places, type Member, type ProducerCast, type StoreName } from './cast';

/** Tuesday, December 1, 2026, 9:00 in Chicago (UTC−6). */
export const morning = Date.UTC(2026, 11, 1, 15);
export const hour = 3_600_000;
export const day = 24 * hour;

/** A UUID made of words, so that tests can name what they mean; version 8 as RFC 9562 sets apart for such. */
export function idOf(namespace: string, thing: string): string {
  const hex = createHash('sha256').update(`${namespace} ${thing}`).digest('hex');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-8${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}

export const telemetryKeyOf = ({ slug }: ProducerCast): string => `key-of-${slug}-long-enough`;
export const serialOf = ({ namespace }: ProducerCast, store: StoreName): string => `urn:dev:ow:${namespace}${store}`;

/** A world of one producer with its people: everything a page can show, with the producer's mark in every text. */
export function plantProducer(db: Database, cast: ProducerCast, members: Record<string, Member>, firstSensorNo: number): void {
  const producerId = idOf(cast.slug, 'producer');
  const { slug, name, language, mark } = cast;
  db.insert(producers)
    .values({ id: producerId, slug, name: `${name} ${mark}`, timeZone: 'America/Chicago', language, urgentPhone: `555-0100 ${mark}`, logo: logoFileOf(cast), createdAt: morning - 400 * day })
    .run();
  const garden: Garden = { cast, db: producerDb(db, producerId), id: (thing) => idOf(cast.namespace, thing), text: (words) => `${words} ${mark}` };
  plantPlaces(garden);
  plantMembers(db, garden, members);
  plantFreezers(garden, firstSensorNo);
  plantTrucks(garden);
  plantRequests(garden, Object.keys(members));
  plantRecords(garden);
  fillFleetRows(garden.db);
}

interface Garden {
  cast: ProducerCast;
  db: ProducerDb;
  id: (thing: string) => string;
  text: (words: string) => string;
}

const storeNames = Object.keys(places) as StoreName[];

function plantPlaces({ db, id, text }: Garden): void {
  const createdAt = morning - 300 * day;
  for (const name of ['chain', 'corner']) db.insert(accounts, { id: id(name), number: name, name: text(name), terms: text('net 30'), language: 'en', createdAt });
  for (const name of ['north', 'south']) db.insert(districts, { id: id(name), name: text(name), createdAt });
  for (const [name, { account, district, language, timeZone }] of Object.entries(places)) {
    db.insert(stores, {
      id: id(name),
      accountId: id(account),
      districtId: id(district),
      name: text(name),
      kind: 'convenience',
      street: text('1 Main Street'),
      city: text('Alder Gap'),
      region: text('MO'),
      postalCode: text('65000'),
      latitude: 37,
      longitude: -93,
      timeZone,
      language,
      phone: text('555-0123'),
      openHours: [6, 22],
      receivingHours: [{ days: [1, 2, 3, 4, 5], from: '07:00', to: '11:00' }],
      deliveryDays: [2, 4],
      driverNotes: text('ring twice'),
      createdAt,
    });
  }
}

function plantMembers(raw: Database, { db, id, text }: Garden, members: Record<string, Member>): void {
  for (const [key, { name, email, language, role, side, grants, scopes = [], deactivated, left }] of Object.entries(members)) {
    const createdAt = morning - 200 * day;
    const personId = idOf('person', email);
    raw.insert(people).values({ id: personId, email, name: ['both', 'left'].includes(key) ? name : text(name), language, deactivatedAt: deactivated ? morning - day : null, createdAt }).onConflictDoNothing().run();
    db.insert(memberships, { id: id(key), personId, role, side, grants, deactivatedAt: left ? morning - day : null, createdAt });
    scopes.forEach(({ store, district, account }, i) =>
      db.insert(membershipScopes, {
        id: id(`${key} scope ${i}`),
        membershipId: id(key),
        storeId: store ? id(store) : null,
        districtId: district ? id(district) : null,
        accountId: account ? id(account) : null,
      }),
    );
  }
}

const probesIn = [12, 35, 58];

function plantFreezers({ cast, db, id, text }: Garden, firstSensorNo: number): void {
  const createdAt = morning - 150 * day;
  db.insert(products, { id: id('small bag'), name: text('7 lb bag'), bagPounds: 7, createdAt });
  db.insert(products, { id: id('large bag'), name: text('20 lb bag'), bagPounds: 20, createdAt });
  db.insert(models, {
    id: id('model'),
    name: text('Two-door 1500'),
    insideWidthIn: 70,
    insideDepthIn: 30,
    insideHeightIn: 60,
    doors: 2,
    ratedPounds: 1500,
    defrost: 'auto',
    createdAt,
  });
  storeNames.forEach((store, i) => {
    const freezerId = id(`${store} freezer`);
    db.insert(freezers, {
      id: freezerId,
      storeId: id(store),
      modelId: id('model'),
      assetNumber: text(`A-${i}`),
      name: text('Front freezer'),
      placement: 'outdoor',
      condition: text('good'),
      channelDropIn: 2,
      rackIn: 4,
      headroomIn: 4,
      createdAt,
    });
    for (const [position, product] of ['small bag', 'large bag'].entries()) {
      db.insert(lanes, { id: id(`${store} lane ${position}`), freezerId, position, productId: id(product), widthShare: 0.5 });
    }
    db.insert(sensors, { id: id(`${store} sensor`), no: firstSensorNo + i, serial: serialOf(cast, store), firstHeardAt: createdAt, createdAt });
    db.insert(installs, { id: id(`${store} install`), sensorId: id(`${store} sensor`), freezerId, probesIn, from: createdAt });
    const state = stateOf(id, { at: morning - 12 * 60_000, likely: morning + 3 * day, products: ['small bag', 'large bag'], supplyV: 3 + firstSensorNo / 1000 });
    const { at, level, airF, warmSince, runOut } = state;
    const row = { at, pounds: level.pounds, capacityPounds: level.capacityPounds, share: level.share, airF, warmSince };
    db.insert(freezerStates, { id: freezerId, ...row, runOutEarly: runOut.early, runOutLikely: runOut.likely, runOutLate: runOut.late, state });
  });
}

/** Lantern's truck comes today, so that it is a stop of the driver; campo's in three days. */
function plantTrucks({ db, id }: Garden): void {
  for (const [store, inDays] of [['lantern', 0], ['campo', 3]] as const) {
    const from = morning + inDays * day + 2 * hour;
    const local = new Date(from).toISOString().slice(0, 10);
    db.insert(nextTrucks, { id: id(`${store} truck`), storeId: id(store), day: local, from, to: from + hour, updatedAt: morning - hour });
    db.insert(nextTruckLoads, { id: id(`${store} load`), nextTruckId: id(`${store} truck`), productId: id('small bag'), bags: 40 });
  }
  for (const [store, daysAgo] of [['lantern', 2], ['lantern', 5], ['juniper', 3]] as const) {
    const deliveryId = id(`${store} delivery ${daysAgo}`);
    const at = morning - daysAgo * day;
    db.insert(deliveries, { id: deliveryId, storeId: id(store), at, createdAt: at });
    const line = { deliveryId, freezerId: id(`${store} freezer`), productId: id('small bag'), bags: 43, takenBack: 1 };
    db.insert(deliveryLines, { id: id(`${store} line ${daysAgo}`), ...line, lot: `${lotWord}-${id('lot').slice(0, 6)}` });
  }
}

interface Planted {
  number: number;
  name: string;
  store: StoreName;
  kind: RequestKind;
  state: RequestState;
  daysAgo: number;
  assignee?: string;
}

const plantedRequests: Planted[] = [
  { number: 1001, name: 'cold request', store: 'lantern', kind: 'not-cooling', state: 'open', daysAgo: 1, assignee: 'technician' },
  { number: 1002, name: 'sooner request', store: 'juniper', kind: 'ice-sooner', state: 'new', daysAgo: 0.5 },
  { number: 1003, name: 'solved request', store: 'lantern', kind: 'leak', state: 'solved', daysAgo: 4 },
  { number: 1004, name: 'closed request', store: 'campo', kind: 'light', state: 'closed', daysAgo: 30 },
  { number: 1005, name: 'lantern sooner', store: 'lantern', kind: 'ice-sooner', state: 'new', daysAgo: 0.25 },
];

function plantRequests({ cast, db, id, text }: Garden, members: string[]): void {
  const someone = members.includes('manager') ? 'manager' : 'stranger';
  for (const { number, name, store, kind, state, daysAgo, assignee } of plantedRequests) {
    const openedAt = morning - daysAgo * day;
    const ended = state === 'solved' || state === 'closed';
    const assigneeId = assignee ? id(members.includes(assignee) ? assignee : 'strangerTechnician') : null;
    db.insert(requests, {
      id: id(name),
      number: cast.namespace === 'birch' ? number + 500 : number,
      storeId: id(store),
      freezerId: id(`${store} freezer`),
      kind,
      words: text(`about ${name}`),
      language: places[store].language,
      state,
      assigneeId,
      openedBy: id(someone),
      openedAt,
      changedAt: openedAt,
      endedAt: ended ? openedAt + hour : null,
    });
    const entry = { requestId: id(name), authorId: id(someone) };
    db.insert(requestEntries, { id: id(`${name} opened`), ...entry, at: openedAt, kind: 'opened', words: text('opened') });
    db.insert(requestEntries, { id: id(`${name} reply`), ...entry, at: openedAt + hour, kind: 'reply', words: text('a reply') });
    db.insert(requestEntries, { id: id(`${name} note`), ...entry, at: openedAt + hour + 1, kind: 'note', words: text(noteWord) });
    db.insert(photos, { id: id(`${name} photo`), ...{ requestId: id(name), addedBy: id(someone) }, file: photoFileOf(cast, name), width: 8, height: 8, createdAt: openedAt });
  }
}

export const photoFileOf = (cast: ProducerCast, request: string): string => `${idOf(cast.slug, `${request} photo`)}.jpg`;
export const logoFileOf = (cast: ProducerCast): string => `${idOf(cast.slug, 'logo')}.png`;
export const photoFiles = (cast: ProducerCast): string[] => [...plantedRequests.map(({ name }) => photoFileOf(cast, name)), logoFileOf(cast)];

function plantRecords({ cast, db, id, text }: Garden): void {
  const keyHash = createHash('sha256').update(telemetryKeyOf(cast)).digest('base64url');
  db.insert(telemetryKeys, { id: id('key'), name: text('gateway'), keyHash, lastUsedAt: morning, createdAt: morning - 90 * day });
  db.insert(counters, { id: 'request', value: cast.namespace === 'birch' ? 1700 : cast.slug === 'twin-ice' ? 1900 : 1005 });
  db.insert(quarantinedReadings, { id: id('quarantined'), serial: text('urn:dev:ow:x'), at: morning, reason: 'wrong-unit', body: text('[]'), receivedAt: morning });
  db.insert(auditEntries, {
    id: id('first audit'),
    seq: 1,
    at: morning - 90 * day,
    actor: 'operator',
    act: text('create-producer'),
    subject: 'Settings',
    subjectId: id('settings'),
    changes: '{}',
    previousHash: '',
    hash: text('start'),
  });
}
