import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { alder, alderPeople, birchPeople } from '../cast';
import { idOf } from '../factories';
import { browser, browserOf, signIn, testApp, waitingMail, type Agent, type TestApp } from '../support/server';

let server: TestApp;
let ada: Agent;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
  ada = browserOf(server, alderPeople.admin);
});
afterEach(() => server.close());

const at = `/api/${alder.slug}`;
const id = (thing: string) => idOf(alder.namespace, thing);
const lantern = { kind: 'store', id: id('lantern') };
const newcomer = { email: 'nell@lantern.example', name: 'Nell', language: 'es', role: 'store-manager', scopes: [lantern] };
const invite = (body: object) => ada.post(`${at}/people`).send({ ...newcomer, ...body });
const change = (who: string, body: object) => ada.patch(`${at}/people/${id(who)}`).send(body);

describe('inviting', () => {
  test('writes in their language, and they sign in and see what they are assigned and nothing else', async () => {
    const { body } = await invite({}).expect(201);
    expect(body).toMatchObject({ name: 'Nell', role: 'store-manager', side: 'store', active: true, scopes: [{ kind: 'store', id: lantern.id }] });
    expect(waitingMail(server).at(-1)).toMatchObject({ to: newcomer.email, subject: expect.stringContaining('le invita a Nilas') });
    const nell = browser(server);
    await signIn(server, nell, newcomer);
    const { body: list } = await nell.get(`${at}/stores`).expect(200);
    expect(list.stores.map((store: { id: string }) => store.id)).toEqual([lantern.id]);
    await nell.get(`${at}/stores/${id('juniper')}`).expect(404);
    await nell.get(`${at}/people`).expect(403);
  });

  test('somebody of another producer is added without being told apart', async () => {
    const stranger = birchPeople.strangerAgent;
    await invite({ email: stranger.email.toUpperCase(), name: 'Whoever', role: 'dispatcher', scopes: [] }).expect(201);
    const { body } = await browserOf(server, stranger).get('/api/me').expect(200);
    expect(body.memberships.map(({ producer }: { producer: { slug: string } }) => producer.slug).sort()).toEqual([alder.slug, 'birch-ice']);
  });

  test.each([
    ['already-member', { email: alderPeople.manager.email }, 409],
    ['scope-needed', { scopes: [] }, 422],
    ['scope-unknown', { scopes: [{ kind: 'store', id: idOf('birch', 'lantern') }] }, 422],
    ['bad-input', { email: 'nell' }, 400],
    ['bad-input', { role: 'owner' }, 400],
  ])('%s is said and nothing is kept', async (type, body, status) => {
    const before = (await ada.get(`${at}/people`)).text;
    const answer = await invite(body).expect(status);
    expect(answer.body.type).toBe(`urn:nilas:problem:${type}`);
    expect((await ada.get(`${at}/people`)).text).toBe(before);
    expect(waitingMail(server)).toEqual([]);
  });

  test('can be sent again', async () => {
    await ada.post(`${at}/people/${id('manager')}/invitations`).expect(202);
    expect(waitingMail(server).map(({ to }) => to)).toEqual([alderPeople.manager.email]);
  });
});

describe('changing', () => {
  test('another district acts on the next request', async () => {
    const rhea = browserOf(server, alderPeople.rep);
    const stores = async () => (await rhea.get(`${at}/stores`)).body.stores.map((store: { id: string }) => store.id).sort();
    expect(await stores()).toEqual([id('juniper'), id('lantern')].sort());
    await change('rep', { scopes: [{ kind: 'district', id: id('south') }] }).expect(200);
    expect(await stores()).toEqual([id('campo'), id('quarry')].sort());
  });

  test('another role brings its own rules and drops what was assigned', async () => {
    const { body } = await change('manager', { role: 'support-agent' }).expect(200);
    expect(body).toMatchObject({ role: 'support-agent', side: 'producer', scopes: [] });
    await browserOf(server, alderPeople.manager).get(`${at}/stores/${id('quarry')}`).expect(200);
  });

  test('somebody deactivated is out on the next request, and their requests go to whoever takes over', async () => {
    const theo = browserOf(server, alderPeople.technician);
    await theo.get(`${at}/requests/${id('cold request')}`).expect(200);
    await change('technician', { active: false, handOverTo: id('agent') }).expect(200);
    await theo.get(`${at}/requests/${id('cold request')}`).expect(404);
    const { body } = await ada.get(`${at}/requests/${id('cold request')}`).expect(200);
    expect(body).toMatchObject({ assignee: { id: id('agent') }, version: 2 });
    await change('technician', { active: true }).expect(200);
    await theo.get(`${at}/requests`).expect(200);
  });

  test('the last admin stays', async () => {
    for (const body of [{ active: false }, { role: 'dispatcher' }]) {
      expect((await change('admin', body).expect(409)).body.type).toBe('urn:nilas:problem:last-admin');
    }
    await invite({ email: 'second@alder.example', role: 'producer-admin', scopes: [] }).expect(201);
    await change('admin', { active: false }).expect(200);
    await ada.get(`${at}/people`).expect(404);
  });

  test('nobody outside this producer can take over', async () => {
    expect((await change('technician', { active: false, handOverTo: idOf('birch', 'strangerAgent') }).expect(404)).body.type).toBe('urn:nilas:problem:not-found');
    await browserOf(server, alderPeople.technician).get(`${at}/requests`).expect(200);
  });
});

test('people by name, by role, page by page', async () => {
  const names = async (query: string) => (await ada.get(`${at}/people${query}`).expect(200)).body.people.map(({ email }: { email: string }) => email);
  expect(await names('?role=producer-admin')).toContain(alderPeople.admin.email);
  expect(await names(`?q=${alderPeople.rep.email}`)).toEqual([alderPeople.rep.email]);
  const all = await names('?limit=200');
  const first = (await ada.get(`${at}/people?limit=3`)).body;
  const second = (await ada.get(`${at}/people?limit=200&after=${first.next}`)).body;
  expect([...first.people, ...second.people].map(({ email }: { email: string }) => email)).toEqual(all);
});
