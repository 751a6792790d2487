import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { freezers } from '../../server/db';
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
const small = `7 lb bag ${alder.mark}`;
const problemOf = (type: string) => ({ type: `urn:nilas:problem:${type}` });
const taken = { ...problemOf('bad-input'), errors: [{ pointer: '/name', fault: 'taken' }] };
const retireFreezers = () => acrossProducers('a test', () => server.db.update(freezers).set({ retiredAt: 1 }).run());

describe('products', () => {
  const cubes = { name: '10 lb cubes', bagPounds: 10, gtin: '' };
  const names = async (query = '') => (await ada.get(`${at}/products${query}`).expect(200)).body.products.map(({ name }: { name: string }) => name);
  const create = (body: object = {}) => ada.post(`${at}/products`).send({ ...cubes, ...body });
  const change = (product: string, body: object) => ada.patch(`${at}/products/${product}`).send(body);

  test('are listed by the size of the bag, the retired last and only when asked for', async () => {
    const { body } = await create().expect(201);
    expect(body).toMatchObject({ ...cubes, retired: false, version: 1 });
    expect(await names()).toEqual([small, '10 lb cubes', `20 lb bag ${alder.mark}`]);
    await change(body.id, { version: 1, retired: true }).expect(200);
    expect(await names()).toEqual([small, `20 lb bag ${alder.mark}`]);
    expect(await names('?retired=too')).toEqual([small, `20 lb bag ${alder.mark}`, '10 lb cubes']);
    await change(body.id, { version: 2, retired: false }).expect(200);
    expect(await names()).toHaveLength(3);
  });

  test('a GTIN is kept without its spaces, taken away again, and refused when its check digit is wrong', async () => {
    const { body } = await create({ gtin: '6291041 50021-3' }).expect(201);
    expect(body.gtin).toBe('6291041500213');
    expect((await change(body.id, { version: 1, gtin: '' }).expect(200)).body).toMatchObject({ gtin: '', version: 2 });
    expect((await change(body.id, { version: 2, gtin: '6291041500214' }).expect(400)).body.errors).toEqual([{ pointer: '/gtin', fault: 'gtin' }]);
  });

  test('a name that is taken is said at its field', async () => {
    expect((await create({ name: small }).expect(400)).body).toMatchObject(taken);
    expect((await change(id('large bag'), { version: 1, name: small }).expect(400)).body).toMatchObject(taken);
  });

  test('one that hangs in a freezer in use stays; its name is free, its pounds are not', async () => {
    for (const body of [{ retired: true }, { bagPounds: 8 }]) {
      expect((await change(id('small bag'), { version: 1, ...body }).expect(409)).body).toMatchObject(problemOf('still-in-use'));
    }
    const { body } = await change(id('small bag'), { version: 1, name: 'Seven', bagPounds: 7, gtin: '95050003' }).expect(200);
    expect(body).toMatchObject({ name: 'Seven', bagPounds: 7, gtin: '95050003', version: 2 });
    const { body: list } = await ada.get(`${at}/freezers`).expect(200);
    expect(list.freezers[0].lanes[0].product).toBe('Seven');
  });

  test('once its freezers are retired it can be too, though its pounds stay what was delivered', async () => {
    retireFreezers();
    expect((await change(id('small bag'), { version: 1, bagPounds: 8 }).expect(409)).body).toMatchObject(problemOf('still-in-use'));
    await change(id('small bag'), { version: 1, retired: true }).expect(200);
  });

  test('one that was never named anywhere can change its pounds', async () => {
    const { body } = await create().expect(201);
    expect((await change(body.id, { version: 1, bagPounds: 12 }).expect(200)).body).toMatchObject({ bagPounds: 12, version: 2 });
  });

  test('whoever saw another version is told so', async () => {
    await change(id('small bag'), { version: 1, name: 'Seven' }).expect(200);
    expect((await change(id('small bag'), { version: 1, name: 'Sept' }).expect(409)).body).toMatchObject(problemOf('changed-meanwhile'));
  });

  test('drivers read them, only admins write, another producer’s is not there', async () => {
    await browserOf(server, alderPeople.driver).get(`${at}/products`).expect(200);
    for (const person of [alderPeople.driver, alderPeople.technician]) await browserOf(server, person).post(`${at}/products`).send(cubes).expect(403);
    await change(idOf(birch.namespace, 'small bag'), { version: 1, name: 'x' }).expect(404);
  });
});

describe('models', () => {
  const chest = { name: 'Chest 400', insideWidthIn: 40, insideDepthIn: 24, insideHeightIn: 30, doors: 1, ratedPounds: 400, defrost: 'cold_wall' };
  const models = async (query = '') => (await ada.get(`${at}/models${query}`).expect(200)).body.models;
  const create = (body: object = {}) => ada.post(`${at}/models`).send({ ...chest, ...body });
  const change = (model: string, body: object) => ada.patch(`${at}/models/${model}`).send(body);

  test('are listed by name with their freezers in use, the retired last and only when asked for', async () => {
    const { body } = await create().expect(201);
    expect(body).toMatchObject({ ...chest, freezers: 0, retired: false, version: 1 });
    const counted = async (query = '') => (await models(query)).map(({ name, freezers: count }: { name: string; freezers: number }) => [name, count]);
    expect(await counted()).toEqual([['Chest 400', 0], [`Two-door 1500 ${alder.mark}`, 4]]);
    await change(body.id, { version: 1, retired: true }).expect(200);
    expect(await counted()).toEqual([[`Two-door 1500 ${alder.mark}`, 4]]);
    expect(await counted('?retired=too')).toEqual([[`Two-door 1500 ${alder.mark}`, 4], ['Chest 400', 0]]);
  });

  test.each([
    ['insideWidthIn', 71],
    ['insideDepthIn', 31],
    ['insideHeightIn', 61],
    ['ratedPounds', 1501],
    ['doors', 3],
    ['defrost', 'cold_wall'],
    ['retired', true],
  ])('%s stays while freezers of it are in use', async (field, value) => {
    expect((await change(id('model'), { version: 1, [field]: value }).expect(409)).body).toMatchObject(problemOf('still-in-use'));
    retireFreezers();
    expect((await change(id('model'), { version: 1, [field]: value }).expect(200)).body).toMatchObject({ [field]: value, version: 2 });
  });

  test('its name is free, and the same measures are no change', async () => {
    expect((await change(id('model'), { version: 1, name: 'Two', insideWidthIn: 70, doors: 2 }).expect(200)).body).toMatchObject({ name: 'Two', version: 2 });
    expect((await change(id('model'), { version: 1, name: 'Deux' }).expect(409)).body).toMatchObject(problemOf('changed-meanwhile'));
  });

  test('a name that is taken is said at its field', async () => {
    expect((await create({ name: `Two-door 1500 ${alder.mark}` }).expect(400)).body).toMatchObject(taken);
    const { body } = await create().expect(201);
    expect((await change(body.id, { version: 1, name: `Two-door 1500 ${alder.mark}` }).expect(400)).body).toMatchObject(taken);
  });

  test('technicians add and change them, support only reads', async () => {
    await browserOf(server, alderPeople.technician).post(`${at}/models`).send(chest).expect(201);
    await browserOf(server, alderPeople.agent).get(`${at}/models`).expect(200);
    await browserOf(server, alderPeople.agent).post(`${at}/models`).send(chest).expect(403);
  });
});
