import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { accounts, auditEntries, desc, districts, eq, freezers, inArray, stores } from '../../server/db';
import { acrossProducers } from '../../server/db/statement-hook';
import { alder, alderPeople, birch } from '../cast';
import { idOf } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
let ada: Agent;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
  ada = browserOf(server, alderPeople.admin);
});
afterEach(() => server.close());

const at = `/api/${alder.slug}`;
const id = (thing: string) => idOf(alder.namespace, thing);
const heron = {
  name: 'Heron Dock',
  accountId: id('chain'),
  districtId: id('north'),
  kind: 'bait',
  street: '9 Ferry Road',
  city: 'Tern Point',
  region: 'AR',
  postalCode: '72600',
  latitude: 36.1,
  longitude: -93.2,
  timeZone: 'America/Chicago',
  language: 'es',
  phone: '555-0150',
  urgentPhone: '555-0151',
  openHours: [5.5, 24],
  receivingHours: [
    { days: [1, 2, 3, 4, 5], from: '06:00', to: '10:30' },
    { days: [1, 3, 5], from: '14:00', to: '16:00' },
  ],
  deliveryDays: [2, 5],
  driverNotes: 'ask for Walt',
};
const create = (body: object = {}) => ada.post(`${at}/stores`).send({ ...heron, ...body });
const change = (store: string, body: object) => ada.patch(`${at}/stores/${id(store)}`).send(body);
const settings = async (store: string) => (await ada.get(`${at}/stores/${id(store)}/settings`).expect(200)).body;
const problemOf = (type: string) => ({ type: `urn:nilas:problem:${type}` });
const newest = () => acrossProducers('a test', () => server.db.select().from(auditEntries).orderBy(desc(auditEntries.at), desc(auditEntries.seq)).get());

/** As it would be after an admin retired them, without the way there. */
const planted = {
  account: (name: string) => acrossProducers('a test', () => server.db.update(accounts).set({ retiredAt: 1 }).where(eq(accounts.id, id(name))).run()),
  district: (name: string) => acrossProducers('a test', () => server.db.update(districts).set({ retiredAt: 1 }).where(eq(districts.id, id(name))).run()),
  freezersOf: (store: string) => acrossProducers('a test', () => server.db.update(freezers).set({ retiredAt: 1 }).where(eq(freezers.storeId, id(store))).run()),
};

describe('a new store', () => {
  test('is there with all that was entered, for its page and for the list', async () => {
    const { body } = await create().expect(201);
    expect(body).toMatchObject({ ...heron, retired: false, version: 1 });
    expect((await ada.get(`${at}/stores/${body.id}/settings`).expect(200)).body).toEqual(body);
    const { body: list } = await ada.get(`${at}/stores?q=heron`).expect(200);
    expect(list.stores.map((store: { id: string }) => store.id)).toEqual([body.id]);
  });

  test('belongs to an account and a district that are there and in use', async () => {
    for (const body of [{ accountId: idOf('nowhere', 'chain') }, { accountId: idOf(birch.namespace, 'chain') }, { districtId: idOf(birch.namespace, 'north') }]) {
      expect((await create(body).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    }
    planted.account('chain');
    expect((await create().expect(422)).body).toMatchObject(problemOf('place-unknown'));
    planted.district('south');
    expect((await create({ accountId: id('corner'), districtId: id('south') }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    await create({ accountId: id('corner') }).expect(201);
  });

  test.each([
    ['/openHours/1', { openHours: [22, 6] }],
    ['/receivingHours/0/to', { receivingHours: [{ days: [1], from: '10:00', to: '10:00' }] }],
    ['/latitude', { latitude: 91 }],
    ['/longitude', { longitude: 'x' }],
    ['/timeZone', { timeZone: 'Mars/Olympus' }],
    ['/kind', { kind: 'corner shop' }],
    ['/deliveryDays/0', { deliveryDays: [8] }],
    ['/street', { street: '' }],
  ])('what is wrong is said at %s', async (pointer, body) => {
    const answer = await create(body).expect(400);
    expect(answer.body.errors.map((error: { pointer: string }) => error.pointer)).toEqual([pointer]);
  });
});

describe('changing a store', () => {
  test('changes what is given, and the trail keeps what differs without the notes’ words', async () => {
    const before = await settings('lantern');
    const { body } = await change('lantern', { version: 1, city: before.city, phone: '555-0160', openHours: [7, 23], driverNotes: 'ask for Walt' }).expect(200);
    expect(body).toEqual({ ...before, phone: '555-0160', openHours: [7, 23], driverNotes: 'ask for Walt', version: 2 });
    const line = newest();
    expect(line).toMatchObject({ act: 'change-store', subject: 'Store', subjectId: id('lantern'), actor: id('admin') });
    expect(JSON.parse(line?.changes ?? '')).toEqual({ phone: '555-0160', openHours: [7, 23], driverNotes: true });
  });

  test('of two admins who edit it, the second is told and sends again with the newer version', async () => {
    await change('lantern', { version: 1, phone: '555-0160' }).expect(200);
    expect((await change('lantern', { version: 1, city: 'Quill' }).expect(409)).body).toMatchObject(problemOf('changed-meanwhile'));
    const { body } = await change('lantern', { version: 2, city: 'Quill' }).expect(200);
    expect(body).toMatchObject({ phone: '555-0160', city: 'Quill', version: 3 });
  });

  test('another district acts on its rep’s next request', async () => {
    const rhea = browserOf(server, alderPeople.rep);
    await rhea.get(`${at}/stores/${id('lantern')}`).expect(200);
    await change('lantern', { version: 1, districtId: id('south') }).expect(200);
    await rhea.get(`${at}/stores/${id('lantern')}`).expect(404);
  });

  test('moves only to places that are there and in use; those it has it may send again', async () => {
    planted.account('corner');
    planted.account('chain');
    expect((await change('lantern', { version: 1, accountId: id('corner') }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    expect((await change('lantern', { version: 1, districtId: idOf(birch.namespace, 'north') }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    await change('lantern', { version: 1, accountId: id('chain'), name: 'Lantern' }).expect(200);
  });

  test('its freezers are listed under its new name', async () => {
    await change('lantern', { version: 1, name: 'Lighthouse' }).expect(200);
    const { body } = await ada.get(`${at}/freezers?store=${id('lantern')}`).expect(200);
    expect(body.freezers.map((freezer: { store: string }) => freezer.store)).toEqual(['Lighthouse']);
    expect((await ada.get(`${at}/freezers?q=lighthouse`).expect(200)).body.freezers).toHaveLength(1);
  });
});

describe('retiring a store', () => {
  test('waits for its freezers; then nobody sees it in use, and its settings stay', async () => {
    expect((await change('lantern', { version: 1, retired: true }).expect(409)).body).toMatchObject(problemOf('still-in-use'));
    planted.freezersOf('lantern');
    expect((await change('lantern', { version: 1, retired: true }).expect(200)).body).toMatchObject({ retired: true, version: 2 });
    await ada.get(`${at}/stores/${id('lantern')}`).expect(404);
    await browserOf(server, alderPeople.manager).get(`${at}/stores/${id('lantern')}`).expect(404);
    expect(await settings('lantern')).toMatchObject({ retired: true });
  });

  test.each(['account', 'district'] as const)('it comes back only while its %s is in use', async (kind) => {
    planted.freezersOf('lantern');
    await change('lantern', { version: 1, retired: true }).expect(200);
    planted[kind](kind === 'account' ? 'chain' : 'north');
    expect((await change('lantern', { version: 2, retired: false }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    const elsewhere = kind === 'account' ? { accountId: id('corner') } : { districtId: id('south') };
    expect((await change('lantern', { version: 2, retired: false, ...elsewhere }).expect(200)).body).toMatchObject({ ...elsewhere, retired: false });
    await ada.get(`${at}/stores/${id('lantern')}`).expect(200);
  });

  test('its account and district can be retired once none of their stores is in use', async () => {
    await ada.patch(`${at}/districts/${id('north')}`).send({ version: 1, retired: true }).expect(409);
    for (const store of ['lantern', 'juniper']) {
      planted.freezersOf(store);
      await change(store, { version: 1, retired: true }).expect(200);
    }
    await ada.patch(`${at}/districts/${id('north')}`).send({ version: 1, retired: true }).expect(200);
  });
});

test('only admins read and write settings; a store that is not there is not found', async () => {
  for (const person of [alderPeople.agent, alderPeople.dispatcher, alderPeople.rep, alderPeople.manager]) {
    const agent = browserOf(server, person);
    await agent.get(`${at}/stores/${id('lantern')}/settings`).expect(403);
    await agent.patch(`${at}/stores/${id('lantern')}`).send({ version: 1, phone: '1' }).expect(403);
    await agent.post(`${at}/stores`).send(heron).expect(403);
  }
  await ada.get(`${at}/stores/${idOf(birch.namespace, 'lantern')}/settings`).expect(404);
  await ada.patch(`${at}/stores/${idOf(birch.namespace, 'lantern')}`).send({ version: 1, phone: '1' }).expect(404);
  const theirs = acrossProducers('a test', () => server.db.select().from(stores).where(inArray(stores.id, [idOf(birch.namespace, 'lantern')])).get());
  expect(theirs).toMatchObject({ version: 1 });
});
