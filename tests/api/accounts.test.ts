import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { accounts, auditEntries, desc, stores } from '../../server/db';
import { acrossProducers } from '../../server/db/statement-hook';
import { alder, alderPeople, birch } from '../cast';
import { hour, idOf } from '../factories';
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
const nadia = { name: 'Nadia Brook', work: 'buyer', email: 'nadia@bluff.example', phone: '555-0144' };
const bluff = { number: '2001', name: 'Bluff Markets', terms: 'net 15', language: 'es', contacts: [nadia] };

interface Listed {
  id: string;
  name: string;
  number: string;
  stores: number;
  retired: boolean;
}
const listed = async (query = ''): Promise<Listed[]> => (await ada.get(`${at}/accounts${query}`).expect(200)).body.accounts;
const create = (body: object = {}) => ada.post(`${at}/accounts`).send({ ...bluff, ...body });
const change = (account: string, body: object) => ada.patch(`${at}/accounts/${account}`).send(body);
const problemOf = (type: string) => ({ type: `urn:nilas:problem:${type}` });
const trail = () => acrossProducers('a test', () => server.db.select().from(auditEntries).orderBy(desc(auditEntries.at), desc(auditEntries.seq)).all());
const retireStores = () => acrossProducers('a test', () => server.db.update(stores).set({ retiredAt: 1 }).run());

describe('accounts', () => {
  test('one that is added is there with all that was entered', async () => {
    const { body } = await create().expect(201);
    expect(body).toMatchObject({ ...bluff, stores: 0, retired: false, version: 1 });
    expect((await ada.get(`${at}/accounts/${body.id}`).expect(200)).body).toEqual(body);
  });

  test('are listed by name with their stores in use, and page by page without a gap', async () => {
    for (const [i, name] of ['Corner', 'Able', 'Corner'].entries()) await create({ name, number: `n${i}` }).expect(201);
    const all = await listed();
    expect(all.map(({ name }) => name)).toEqual([...all.map(({ name }) => name)].sort());
    expect(all.filter(({ id: own }) => [id('chain'), id('corner')].includes(own)).map((account) => account.stores)).toEqual([2, 2]);
    const paged: Listed[] = [];
    let after = '';
    do {
      const { body } = await ada.get(`${at}/accounts?limit=2${after}`).expect(200);
      paged.push(...body.accounts);
      after = body.next ? `&after=${body.next}` : '';
    } while (after);
    expect(paged).toEqual(all);
  });

  test('are found by name and by number, as typed', async () => {
    await create({ number: '50%', name: 'Half_way' }).expect(201);
    for (const q of ['half_', '50%', '%', '_']) expect((await listed(`?q=${encodeURIComponent(q)}`)).map(({ number }) => number)).toEqual(['50%']);
    expect(await listed('?q=nothing-like-it')).toEqual([]);
  });

  test('what is given is changed, and the trail keeps it without naming contacts', async () => {
    const { body: made } = await create().expect(201);
    const { body } = await change(made.id, { version: 1, terms: 'net 30', name: bluff.name, contacts: [{ ...nadia, name: 'Otto Lind' }] }).expect(200);
    expect(body).toMatchObject({ terms: 'net 30', number: '2001', version: 2, contacts: [{ name: 'Otto Lind' }] });
    const [changed, created] = trail();
    expect(JSON.parse(changed?.changes ?? '')).toEqual({ terms: 'net 30', contacts: true });
    expect(JSON.parse(created?.changes ?? '')).toEqual({ number: '2001', name: 'Bluff Markets', terms: 'net 15', language: 'es', contacts: true });
  });

  test('whoever saw another version is told so, and nothing is changed', async () => {
    await change(id('chain'), { version: 1, terms: 'cash' }).expect(200);
    expect((await change(id('chain'), { version: 1, terms: 'net 90' }).expect(409)).body).toMatchObject(problemOf('changed-meanwhile'));
    expect((await ada.get(`${at}/accounts/${id('chain')}`)).body).toMatchObject({ terms: 'cash', version: 2 });
  });

  test('a number that is taken is said at its field; its own is not taken', async () => {
    const taken = { ...problemOf('bad-input'), errors: [{ pointer: '/number', fault: 'taken' }] };
    expect((await create({ number: 'corner' }).expect(400)).body).toMatchObject(taken);
    expect((await change(id('chain'), { version: 1, number: 'corner' }).expect(400)).body).toMatchObject(taken);
    await change(id('chain'), { version: 1, number: 'chain', name: 'Chain' }).expect(200);
  });

  test('another producer may have the same number', async () => {
    acrossProducers('a test', () => server.db.insert(accounts).values({ id: id('theirs'), producerId: idOf(birch.slug, 'producer'), number: '2001', name: 'x', language: 'en', createdAt: 1 }).run());
    await create().expect(201);
  });

  test('one with stores in use stays; without them it is retired, shown apart, and comes back', async () => {
    expect((await change(id('chain'), { version: 1, retired: true }).expect(409)).body).toMatchObject(problemOf('still-in-use'));
    retireStores();
    const { body } = await change(id('chain'), { version: 1, retired: true }).expect(200);
    expect(body).toMatchObject({ retired: true, stores: 0, version: 2 });
    expect((await listed()).map((account) => account.id)).toEqual([id('corner')]);
    expect((await listed('?retired=only')).map((account) => account.id)).toEqual([id('chain')]);
    await change(id('chain'), { version: 2, retired: false }).expect(200);
    expect(await listed('?retired=only')).toEqual([]);
  });

  test('a new name shows on the freezers of its stores', async () => {
    const numbers = async () => {
      const { body } = await ada.get(`${at}/freezers?account=${id('chain')}`).expect(200);
      return new Set(body.freezers.map(({ accountNumber }: { accountNumber: string }) => accountNumber));
    };
    expect(await numbers()).toEqual(new Set(['chain']));
    await change(id('chain'), { version: 1, number: 'C-77' }).expect(200);
    expect(await numbers()).toEqual(new Set(['C-77']));
  });

  test.each([
    ['/number', { number: ' ' }],
    ['/name', { name: 'x'.repeat(121) }],
    ['/language', { language: 'fr' }],
    ['/contacts/0/email', { contacts: [{ ...nadia, email: 'nobody' }] }],
    ['/contacts/0/name', { contacts: [{ ...nadia, name: '' }] }],
    ['/producerId', { producerId: 'x' }],
  ])('what is wrong is said at %s', async (pointer, body) => {
    const answer = await create(body).expect(400);
    expect(answer.body.errors.map((error: { pointer: string }) => error.pointer)).toEqual([pointer]);
  });

  test('support and dispatch read, only admins write, nobody else sees any', async () => {
    for (const person of [alderPeople.agent, alderPeople.dispatcher]) {
      await browserOf(server, person).get(`${at}/accounts`).expect(200);
      await browserOf(server, person).post(`${at}/accounts`).send(bluff).expect(403);
    }
    for (const person of [alderPeople.rep, alderPeople.manager, alderPeople.driver, alderPeople.technician]) {
      await browserOf(server, person).get(`${at}/accounts`).expect(403);
    }
  });
});

describe('districts', () => {
  const districts = async () => (await ada.get(`${at}/districts`).expect(200)).body.districts;
  const rename = (district: string, body: object) => ada.patch(`${at}/districts/${district}`).send(body);

  test('are added, and listed by name with their stores in use, the retired last', async () => {
    const { body } = await ada.post(`${at}/districts`).send({ name: 'Airport' }).expect(201);
    expect(body).toMatchObject({ name: 'Airport', stores: 0, retired: false, version: 1 });
    await rename(body.id, { version: 1, retired: true }).expect(200);
    expect((await districts()).map(({ name, stores: count, retired }: Listed) => [name, count, retired])).toEqual([
      [`north ${alder.mark}`, 2, false],
      [`south ${alder.mark}`, 2, false],
      ['Airport', 0, true],
    ]);
  });

  test('a name that is taken is said at its field', async () => {
    const taken = { ...problemOf('bad-input'), errors: [{ pointer: '/name', fault: 'taken' }] };
    expect((await ada.post(`${at}/districts`).send({ name: `north ${alder.mark}` }).expect(400)).body).toMatchObject(taken);
    expect((await rename(id('south'), { version: 1, name: `north ${alder.mark}` }).expect(400)).body).toMatchObject(taken);
  });

  test('one with stores in use stays, and an older version is refused', async () => {
    expect((await rename(id('north'), { version: 1, retired: true }).expect(409)).body).toMatchObject(problemOf('still-in-use'));
    await rename(id('north'), { version: 1, name: 'Uplands' }).expect(200);
    expect((await rename(id('north'), { version: 1, name: 'Hills' }).expect(409)).body).toMatchObject(problemOf('changed-meanwhile'));
    server.clock.now += hour;
    retireStores();
    expect((await rename(id('north'), { version: 2, retired: true }).expect(200)).body).toMatchObject({ retired: true, version: 3 });
    expect((await rename(id('north'), { version: 3, retired: false }).expect(200)).body).toMatchObject({ retired: false, name: 'Uplands' });
  });

  test('one that is not there is not found', async () => {
    await rename(idOf(birch.namespace, 'north'), { version: 1, name: 'x' }).expect(404);
  });
});
