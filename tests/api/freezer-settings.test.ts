import { describe, expect, test } from 'vitest';
import { asc, eq, freezers, lanes, models, products, stores } from '../../server/db';
import { alder, alderPeople, birch } from '../cast';
import { idOf, morning } from '../factories';
import { browserOf } from '../support/server';
import { at, freezerDesk, front, id, problemOf } from './freezer-desk';

const { bed, change, hung, trailOf, listed } = freezerDesk();
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
const create = (body: object = {}) => bed.ada.post(`${at}/freezers`).send({ ...side, ...body });
const settings = async (freezer: string) => (await bed.ada.get(`${at}/freezers/${freezer}/settings`).expect(200)).body;
const retire = {
  store: (name: string) => bed.db.update(stores, id(name), { retiredAt: 1 }),
  model: () => bed.db.update(models, id('model'), { retiredAt: 1 }),
  product: (name: string) => bed.db.update(products, id(name), { retiredAt: 1 }),
};
const lanesOf = (freezerId: string) =>
  bed.db.select({ id: lanes.id, position: lanes.position, productId: lanes.productId, widthShare: lanes.widthShare }).from(lanes).where(eq(lanes.freezerId, freezerId)).orderBy(asc(lanes.position)).all();

describe('a new freezer', () => {
  test('is there with all that was entered, last in its store and in the list', async () => {
    const { body } = await create().expect(201);
    expect(body).toMatchObject({ ...side, retired: false, version: 1 });
    expect(await settings(body.id)).toEqual(body);
    expect(bed.db.find(freezers, body.id)).toMatchObject({ position: 1, ...mount });
    expect((await listed('lantern')).map((row) => row.id).sort()).toEqual([front, body.id].sort());
    const { body: second } = await create({ assetNumber: 'S-101' }).expect(201);
    expect(bed.db.find(freezers, second.id)?.position).toBe(2);
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
    expect(bed.db.find(freezers, front)).toMatchObject({ storeId: id('juniper'), position: 2 });
    expect((await listed('juniper')).map((row) => row.id)).toContain(front);
    retire.store('campo');
    for (const storeId of [id('campo'), theirs('lantern')]) {
      expect((await change(body.id, { version: 1, storeId }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    }
  });

  test('a model must leave room for the probes that hang in it', async () => {
    const narrow = { name: 'Narrow', insideWidthIn: 40, insideDepthIn: 30, insideHeightIn: 60, doors: 1, ratedPounds: 700, defrost: 'auto' };
    const { body: model } = await bed.ada.post(`${at}/models`).send(narrow).expect(201);
    expect((await change(front, { version: 1, modelId: model.id }).expect(422)).body).toMatchObject(problemOf('setup-impossible'));
    await bed.ada.delete(`${at}/freezers/${front}/sensor`).expect(204);
    await change(front, { version: 1, modelId: model.id }).expect(200);
    expect((await change(front, { version: 2, modelId: theirs('model') }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
  });
});

describe('retiring a freezer', () => {
  test('frees its sensor, hides it, and keeps its history', async () => {
    expect((await change(front, { version: 1, retired: true }).expect(200)).body).toMatchObject({ retired: true, version: 2 });
    expect(hung(front)).toMatchObject([{ sensorId: id('lantern sensor'), to: morning }]);
    expect(await listed('lantern')).toEqual([]);
    await bed.ada.get(`${at}/freezers/${front}`).expect(404);
    expect(await settings(front)).toMatchObject({ retired: true });
    const { body } = await bed.ada.get(`${at}/unclaimed-sensors`).expect(200);
    expect(body.sensors.map((sensor: { id: string }) => sensor.id)).toContain(id('lantern sensor'));
  });

  test('it comes back without a sensor, if its store and model are in use', async () => {
    await change(front, { version: 1, retired: true }).expect(200);
    retire.store('lantern');
    expect((await change(front, { version: 2, retired: false }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    retire.model();
    expect((await change(front, { version: 2, retired: false, storeId: id('juniper') }).expect(422)).body).toMatchObject(problemOf('place-unknown'));
    bed.db.update(models, id('model'), { retiredAt: null });
    await change(front, { version: 2, retired: false, storeId: id('juniper') }).expect(200);
    expect((await listed('juniper')).find((row) => row.id === front)).toMatchObject({ serial: null, pounds: null });
  });

  test('it comes back only as something whose level can be told', async () => {
    await change(front, { version: 1, retired: true }).expect(200);
    bed.db.update(models, id('model'), { insideHeightIn: 10 });
    expect((await change(front, { version: 2, retired: false }).expect(422)).body).toMatchObject(problemOf('setup-impossible'));
  });
});

test('only admins read and write settings', async () => {
  for (const person of [alderPeople.agent, alderPeople.dispatcher, alderPeople.technician, alderPeople.manager]) {
    const agent = browserOf(bed.server, person);
    await agent.get(`${at}/freezers/${front}/settings`).expect(403);
    await agent.patch(`${at}/freezers/${front}`).send({ version: 1, name: 'x' }).expect(403);
    await agent.post(`${at}/freezers`).send(side).expect(403);
  }
  await bed.ada.get(`${at}/freezers/${theirs('lantern freezer')}/settings`).expect(404);
  await change(theirs('lantern freezer'), { version: 1, name: 'x' }).expect(404);
});
