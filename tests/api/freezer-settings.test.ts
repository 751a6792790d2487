import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { and, asc, auditEntries, desc, eq, freezers, lanes, models, products, producerDb, sensors, stores, installs, type ProducerDb } from '../../server/db';
import { alder, alderPeople, birch } from '../cast';
import { hour, idOf, morning } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
let ada: Agent;
let db: ProducerDb;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
  ada = browserOf(server, alderPeople.admin);
  db = producerDb(server.db, idOf(alder.slug, 'producer'));
});
afterEach(() => server.close());

const at = `/api/${alder.slug}`;
const id = (thing: string) => idOf(alder.namespace, thing);
const theirs = (thing: string) => idOf(birch.namespace, thing);
const mount = { channelDropIn: 2, rackIn: 4, headroomIn: 4 };
const lane = (product: string, widthShare: number) => ({ productId: id(product), widthShare });
const halves = [lane('small bag', 0.5), lane('large bag', 0.5)];
const side = {
  storeId: id('lantern'),
  modelId: id('model'),
  assetNumber: 'S-100',
  name: 'Side freezer',
  placement: 'indoor',
  condition: 'new',
  mount,
  lanes: halves,
};
const create = (body: object = {}) => ada.post(`${at}/freezers`).send({ ...side, ...body });
const change = (freezer: string, body: object) => ada.patch(`${at}/freezers/${freezer}`).send(body);
const settings = async (freezer: string) => (await ada.get(`${at}/freezers/${freezer}/settings`).expect(200)).body;
const tie = (freezer: string, body: object, who = ada) => who.put(`${at}/freezers/${freezer}/sensor`).send({ probesIn: [12, 35, 58], ...body });
const takeOff = (freezer: string, who = ada) => who.delete(`${at}/freezers/${freezer}/sensor`);
const problemOf = (type: string) => ({ type: `urn:nilas:problem:${type}` });
const front = id('lantern freezer');
const retire = {
  store: (name: string) => db.update(stores, id(name), { retiredAt: 1 }),
  model: () => db.update(models, id('model'), { retiredAt: 1 }),
  product: (name: string) => db.update(products, id(name), { retiredAt: 1 }),
};
const lanesOf = (freezerId: string) =>
  db.select({ id: lanes.id, position: lanes.position, productId: lanes.productId, widthShare: lanes.widthShare }).from(lanes).where(eq(lanes.freezerId, freezerId)).orderBy(asc(lanes.position)).all();
const hung = (freezerId: string) =>
  db.select({ sensorId: installs.sensorId, probesIn: installs.probesIn, from: installs.from, to: installs.to }).from(installs).where(eq(installs.freezerId, freezerId)).orderBy(asc(installs.from)).all();
const trailOf = (freezerId: string) =>
  db.select({ act: auditEntries.act, changes: auditEntries.changes }).from(auditEntries).where(and(eq(auditEntries.subject, 'Freezer'), eq(auditEntries.subjectId, freezerId))).orderBy(desc(auditEntries.seq)).all().map(({ act, changes }) => ({ act, changes: JSON.parse(changes) }));
const listed = async (store: string): Promise<{ id: string; serial: string | null; pounds: number | null; lanes: unknown[] }[]> =>
  (await ada.get(`${at}/freezers?store=${id(store)}`).expect(200)).body.freezers;

describe('a new freezer', () => {
  test('is there with all that was entered, last in its store and in the list', async () => {
    const { body } = await create().expect(201);
    expect(body).toMatchObject({ ...side, retired: false, version: 1 });
    expect(await settings(body.id)).toEqual(body);
    expect(db.find(freezers, body.id)).toMatchObject({ position: 1, ...mount });
    expect((await listed('lantern')).map((row) => row.id).sort()).toEqual([front, body.id].sort());
    const { body: second } = await create({ assetNumber: 'S-101' }).expect(201);
    expect(db.find(freezers, second.id)?.position).toBe(2);
  });

  test('an asset number that is taken is said at its field', async () => {
    const taken = { ...problemOf('bad-input'), errors: [{ pointer: '/assetNumber', fault: 'taken' }] };
    expect((await create({ assetNumber: `A-0 ${alder.mark}` }).expect(400)).body).toMatchObject(taken);
    const { body } = await create().expect(201);
    expect((await change(body.id, { version: 1, assetNumber: `A-0 ${alder.mark}` }).expect(400)).body).toMatchObject(taken);
    await create({ assetNumber: `A-0 ${birch.mark}` }).expect(201);
  });

  test.each([
    ['place-unknown', 'another producer’s store', { storeId: theirs('lantern') }],
    ['place-unknown', 'a model that is not there', { modelId: idOf('nowhere', 'model') }],
    ['unknown-product', 'another producer’s product', { lanes: [{ productId: theirs('small bag'), widthShare: 1 }] }],
    ['setup-impossible', 'no room for ice', { mount: { channelDropIn: 40, rackIn: 15, headroomIn: 5 } }],
  ])('%s: %s', async (type, _what, body) => {
    expect((await create(body).expect(422)).body).toMatchObject(problemOf(type));
    expect(await listed('lantern')).toHaveLength(1);
  });

  test.each([
    ['place-unknown', () => retire.store('lantern')],
    ['place-unknown', () => retire.model()],
    ['unknown-product', () => retire.product('large bag')],
  ])('%s: what is retired takes nothing new', async (type, plant) => {
    plant();
    expect((await create().expect(422)).body).toMatchObject(problemOf(type));
  });

  test.each([
    ['/lanes', { lanes: [] }],
    ['/lanes', { lanes: [lane('small bag', 0.5), lane('large bag', 0.4)] }],
    ['/lanes', { lanes: [lane('small bag', 0.5), lane('large bag', 0.504)] }],
    ['/lanes/0/widthShare', { lanes: [lane('small bag', 0), lane('large bag', 1)] }],
    ['/mount/rackIn', { mount: { ...mount, rackIn: -1 } }],
    ['/placement', { placement: 'roof' }],
    ['/assetNumber', { assetNumber: '' }],
  ])('what is wrong is said at %s', async (pointer, body) => {
    const answer = await create(body).expect(400);
    expect(answer.body.errors.map((error: { pointer: string }) => error.pointer)).toContain(pointer);
  });
});

describe('changing a freezer', () => {
  test('changes what is given, and the trail keeps what differs', async () => {
    const before = await settings(front);
    const { body } = await change(front, { version: 1, name: 'Front', placement: before.placement, mount: { ...mount, rackIn: 5 } }).expect(200);
    expect(body).toEqual({ ...before, name: 'Front', mount: { ...mount, rackIn: 5 }, version: 2 });
    expect(trailOf(front)[0]).toEqual({ act: 'change-freezer', changes: { name: 'Front', mount: { ...mount, rackIn: 5 } } });
  });

  test('whoever saw another version is told so', async () => {
    await change(front, { version: 1, name: 'Front' }).expect(200);
    expect((await change(front, { version: 1, name: 'Rear' }).expect(409)).body).toMatchObject(problemOf('changed-meanwhile'));
  });

  test('lanes keep their rows by position, more are added and the rest go', async () => {
    const [first, second] = lanesOf(front);
    const thirds = [lane('large bag', 0.34), lane('small bag', 0.33), lane('large bag', 0.33)];
    await change(front, { version: 1, lanes: thirds }).expect(200);
    const three = lanesOf(front);
    expect(three.map(({ id: _id, position: _position, ...rest }) => rest)).toEqual(thirds);
    expect(three.map(({ position }) => position)).toEqual([0, 1, 2]);
    expect(three.slice(0, 2).map((row) => row.id)).toEqual([first?.id, second?.id]);
    await change(front, { version: 2, lanes: [lane('small bag', 1)] }).expect(200);
    expect(lanesOf(front)).toEqual([{ id: first?.id, position: 0, productId: id('small bag'), widthShare: 1 }]);
    expect((await listed('lantern'))[0]?.lanes).toHaveLength(1);
  });

  test('a lane keeps a product that was retired meanwhile; a new one cannot have it', async () => {
    retire.product('large bag');
    await change(front, { version: 1, lanes: [lane('large bag', 0.6), lane('small bag', 0.4)] }).expect(200);
    await change(front, { version: 2, lanes: [lane('small bag', 1)] }).expect(200);
    expect((await change(front, { version: 3, lanes: halves }).expect(422)).body).toMatchObject(problemOf('unknown-product'));
  });

  test('moves to the end of another store, which must be in use', async () => {
    const { body } = await create({ storeId: id('juniper') }).expect(201);
    await change(front, { version: 1, storeId: id('juniper') }).expect(200);
    expect(db.find(freezers, front)).toMatchObject({ storeId: id('juniper'), position: 2 });
    expect((await listed('juniper')).map((row) => row.id)).toContain(front);
    retire.store('campo');
    for (const storeId of [id('campo'), theirs('lantern')]) {
      expect((await change(body.id, { version: 1, storeId }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    }
  });

  test('a model must leave room for the probes that hang in it', async () => {
    const narrow = { name: 'Narrow', insideWidthIn: 40, insideDepthIn: 30, insideHeightIn: 60, doors: 1, ratedPounds: 700, defrost: 'auto' };
    const { body: model } = await ada.post(`${at}/models`).send(narrow).expect(201);
    expect((await change(front, { version: 1, modelId: model.id }).expect(422)).body).toMatchObject(problemOf('setup-impossible'));
    await takeOff(front).expect(204);
    await change(front, { version: 1, modelId: model.id }).expect(200);
    expect((await change(front, { version: 2, modelId: theirs('model') }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
  });
});

describe('retiring a freezer', () => {
  test('frees its sensor, hides it, and keeps its history', async () => {
    expect((await change(front, { version: 1, retired: true }).expect(200)).body).toMatchObject({ retired: true, version: 2 });
    expect(hung(front)).toMatchObject([{ sensorId: id('lantern sensor'), to: morning }]);
    expect(await listed('lantern')).toEqual([]);
    await ada.get(`${at}/freezers/${front}`).expect(404);
    expect(await settings(front)).toMatchObject({ retired: true });
    const { body } = await ada.get(`${at}/unclaimed-sensors`).expect(200);
    expect(body.sensors.map((sensor: { id: string }) => sensor.id)).toContain(id('lantern sensor'));
  });

  test('it comes back without a sensor, if its store and model are in use', async () => {
    await change(front, { version: 1, retired: true }).expect(200);
    retire.store('lantern');
    expect((await change(front, { version: 2, retired: false }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    retire.model();
    expect((await change(front, { version: 2, retired: false, storeId: id('juniper') }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    db.update(models, id('model'), { retiredAt: null });
    await change(front, { version: 2, retired: false, storeId: id('juniper') }).expect(200);
    expect((await listed('juniper')).find((row) => row.id === front)).toMatchObject({ serial: null, pounds: null });
  });

  test('it comes back only as something whose level can be told', async () => {
    await change(front, { version: 1, retired: true }).expect(200);
    db.update(models, id('model'), { insideHeightIn: 10 });
    expect((await change(front, { version: 2, retired: false }).expect(422)).body).toMatchObject(problemOf('setup-impossible'));
  });
});

describe('tying a sensor', () => {
  const spare = id('spare sensor');
  beforeEach(() => db.insert(sensors, { id: spare, no: 900, serial: 'urn:dev:ow:spare', createdAt: morning - hour }));

  test('hangs it from now on and takes off what hung there', async () => {
    server.clock.now += hour;
    await tie(front, { sensorId: spare, probesIn: [10, 60] }).expect(204);
    const [old, now] = hung(front);
    expect(old).toMatchObject({ sensorId: id('lantern sensor'), to: morning + hour });
    expect(now).toEqual({ sensorId: spare, probesIn: [10, 60], from: morning + hour, to: null });
    expect((await listed('lantern'))[0]).toMatchObject({ serial: 'urn:dev:ow:spare', pounds: null });
    expect(trailOf(front)[0]).toEqual({ act: 'tie-sensor', changes: { sensorId: spare, probesIn: [10, 60] } });
  });

  test('one that hangs elsewhere moves only if that is said; the freezer it left knows', async () => {
    const juniper = id('juniper freezer');
    expect((await tie(front, { sensorId: id('juniper sensor') }).expect(409)).body).toMatchObject(problemOf('sensor-elsewhere'));
    expect(hung(front)).toMatchObject([{ to: null }]);
    server.clock.now += hour;
    await tie(front, { sensorId: id('juniper sensor'), move: true }).expect(204);
    expect(hung(juniper)).toMatchObject([{ sensorId: id('juniper sensor'), to: morning + hour }]);
    expect(hung(front)).toMatchObject([{ to: morning + hour }, { sensorId: id('juniper sensor'), to: null }]);
    expect((await listed('juniper'))[0]).toMatchObject({ serial: null, pounds: null });
    expect(trailOf(juniper)[0]).toEqual({ act: 'tie-sensor', changes: { sensorId: null } });
  });

  test('out of a freezer they may not see a technician takes none', async () => {
    const body = { sensorId: id('juniper sensor'), probesIn: [12, 35, 58], move: true };
    const tried = await browserOf(server, alderPeople.technician).put(`/api/${alder.slug}/freezers/${front}/sensor`).send(body).expect(409);
    expect(tried.body).toMatchObject(problemOf('sensor-elsewhere'));
    expect(hung(id('juniper freezer'))).toMatchObject([{ to: null }]);
  });

  test('again with other probes begins anew; with the same ones nothing begins', async () => {
    server.clock.now += hour;
    const own = { sensorId: id('lantern sensor') };
    await tie(front, own).expect(204);
    expect(hung(front)).toHaveLength(1);
    await tie(front, { ...own, probesIn: [11, 35, 58] }).expect(204);
    expect(hung(front)).toMatchObject([
      { probesIn: [12, 35, 58], to: morning + hour },
      { probesIn: [11, 35, 58], from: morning + hour, to: null },
    ]);
  });

  test.each([
    ['unknown-sensor', 422, { sensorId: theirs('lantern sensor') }],
    ['unknown-sensor', 422, { sensorId: idOf('nowhere', 'sensor') }],
    ['setup-impossible', 422, { sensorId: spare, probesIn: [12, 71] }],
    ['bad-input', 400, { sensorId: spare, probesIn: [] }],
    ['bad-input', 400, { sensorId: spare, probesIn: [35, 12] }],
    ['bad-input', 400, { sensorId: 'spare' }],
  ])('%s changes nothing', async (type, status, body) => {
    expect((await tie(front, body).expect(status)).body).toMatchObject(problemOf(type));
    expect(hung(front)).toMatchObject([{ sensorId: id('lantern sensor'), to: null }]);
  });

  test('a freezer that is retired or another producer’s is not there', async () => {
    await change(front, { version: 1, retired: true }).expect(200);
    for (const freezer of [front, theirs('lantern freezer')]) {
      await tie(freezer, { sensorId: spare }).expect(404);
      await takeOff(freezer).expect(404);
    }
  });

  test('technicians do so in freezers of stores they may read, and others not at all', async () => {
    const theo = browserOf(server, alderPeople.technician);
    await tie(front, { sensorId: spare }, theo).expect(204);
    await tie(id('juniper freezer'), { sensorId: spare }, theo).expect(404);
    await takeOff(id('juniper freezer'), theo).expect(404);
    await takeOff(front, theo).expect(204);
    for (const person of [alderPeople.agent, alderPeople.dispatcher, alderPeople.manager]) {
      await tie(front, { sensorId: spare }, browserOf(server, person)).expect(403);
      await takeOff(front, browserOf(server, person)).expect(403);
    }
  });
});

describe('taking a sensor off', () => {
  test('ends what hangs there, once', async () => {
    server.clock.now += hour;
    await takeOff(front).expect(204);
    expect(hung(front)).toMatchObject([{ sensorId: id('lantern sensor'), to: morning + hour }]);
    expect((await listed('lantern'))[0]).toMatchObject({ serial: null, pounds: null });
    expect(trailOf(front)[0]).toEqual({ act: 'take-sensor-off', changes: { sensorId: null } });
    expect((await takeOff(front).expect(404)).body).toMatchObject(problemOf('not-found'));
  });
});

test('only admins read and write settings', async () => {
  for (const person of [alderPeople.agent, alderPeople.dispatcher, alderPeople.technician, alderPeople.manager]) {
    const agent = browserOf(server, person);
    await agent.get(`${at}/freezers/${front}/settings`).expect(403);
    await agent.patch(`${at}/freezers/${front}`).send({ version: 1, name: 'x' }).expect(403);
    await agent.post(`${at}/freezers`).send(side).expect(403);
  }
  await ada.get(`${at}/freezers/${theirs('lantern freezer')}/settings`).expect(404);
  await change(theirs('lantern freezer'), { version: 1, name: 'x' }).expect(404);
});
