import { afterAll, beforeAll, expect, test } from 'vitest';
import { endpoints } from '../../server/contract';
import { alder, alderMembers, alderPeople, type AlderMember } from '../cast';
import { idOf, morning } from '../factories';
import { call, shown } from '../isolation/call';
import { cases } from '../isolation/cases';
import { browserOf, cookieOf, testApp, type Agent, type TestApp } from '../support/server';

const id = (thing: string) => idOf(alder.namespace, thing);
const at = `/api/${alder.slug}`;
let bed: TestApp;
beforeAll(async () => {
  bed = await testApp('all');
});
afterAll(() => bed.close());

const seeAs = async (agent: Agent, name: string) => agent.post(`${at}/people/${id(name)}/view`);
const reads = cases.filter(({ endpoint }) => endpoint.method === 'get' && (endpoint.access.kind === 'may' || ['me.read', 'auth.readSession'].includes(endpoint.id)));
const writes = cases.filter(({ endpoint }) => endpoint.method !== 'get' && ['may', 'person'].includes(endpoint.access.kind));

test('the routes below are all there are to read and to write', () => {
  const asked = new Set([...reads, ...writes].map(({ endpoint }) => endpoint.id));
  const left = endpoints.filter(({ id: name, access }) => ['may', 'person'].includes(access.kind) && !asked.has(name)).map(({ id: name }) => name);
  expect(left).toEqual(['me.sessions']);
});

test.each(alderMembers.filter((name) => name !== 'admin'))('seeing as %s, every route answers byte for byte what their own session is answered', async (name: AlderMember) => {
  await bed.undone(async () => {
    const own = cookieOf(bed, alderPeople[name].email);
    const admin = cookieOf(bed, alderPeople.admin.email);
    await seeAs(browserOf(bed, alderPeople.admin), name).then(({ status }) => expect(status).toBe(204));
    const differing: string[] = [];
    for (const one of reads) {
      const [theirs, seen] = [await call(bed, one, own), await call(bed, one, admin)];
      const same = theirs.status === seen.status && theirs.body === seen.body;
      if (!same) differing.push(`${one.endpoint.id}: ${shown(theirs)} / ${shown(seen)}`);
    }
    expect(differing).toEqual([]);
  });
});

test('nothing can be changed meanwhile, and the way out stays open', async () => {
  await bed.undone(async () => {
    const admin = browserOf(bed, alderPeople.admin);
    await seeAs(admin, 'manager');
    const cookie = cookieOf(bed, alderPeople.admin.email);
    for (const one of writes.filter(({ endpoint }) => !['auth.signOut', 'auth.endSeeing'].includes(endpoint.id))) {
      const { status, body } = await call(bed, one, cookie);
      expect([status, body.includes('seeing-only')], one.endpoint.id).toEqual([403, true]);
    }
    const { body } = await admin.get('/api/auth/seeing').expect(200);
    expect(body.seeing).toMatchObject({ producer: alder.slug, memberId: id('manager'), name: expect.stringContaining('Marta') });
    await admin.delete('/api/auth/seeing').expect(204);
    expect((await admin.get('/api/auth/seeing')).body.seeing).toBeNull();
    await admin.get(`${at}/people`).expect(200);
  });
});

test('it is recorded before anything is seen', async () => {
  await bed.undone(async () => {
    const admin = browserOf(bed, alderPeople.admin);
    await seeAs(admin, 'manager');
    await admin.delete('/api/auth/seeing');
    const { body } = await admin.get(`${at}/audit?subjectId=${id('manager')}`).expect(200);
    expect(body.entries[0]).toMatchObject({ act: 'see-as', subject: 'Person', actor: { id: id('admin') } });
  });
});

test('another producer of the person is not seen, and is not named', async () => {
  await bed.undone(async () => {
    const admin = browserOf(bed, alderPeople.admin);
    await seeAs(admin, 'both');
    const { body } = await admin.get('/api/me').expect(200);
    expect(body.memberships.map(({ producer }: { producer: { slug: string } }) => producer.slug)).toEqual([alder.slug]);
    await admin.get('/api/birch-ice/stores').expect(404);
    expect((await admin.get('/api/me/sessions').expect(200)).body.sessions).toEqual([]);
  });
});

test('it ends by itself, and with the rights of either', async () => {
  await bed.undone(async () => {
    const admin = browserOf(bed, alderPeople.admin);
    await seeAs(admin, 'manager');
    bed.clock.now = morning + 31 * 60_000;
    await admin.get(`${at}/people`).expect(200);
    bed.clock.now = morning;
    await seeAs(admin, 'manager');
    bed.db.$client.prepare('update membership set role = ? where producer_id = ? and id = ?').run('driver', idOf(alder.slug, 'producer'), id('admin'));
    await admin.get(`${at}/people`).expect(403);
    expect((await admin.get('/api/me')).body.person.name).toContain('Ada');
  });
});

test('nobody sees as themselves, as somebody gone or of another producer, and only who manages people does', async () => {
  await bed.undone(async () => {
    const admin = browserOf(bed, alderPeople.admin);
    for (const name of ['admin', 'left', 'nobody at all']) expect((await seeAs(admin, name)).status, name).toBe(404);
    expect((await admin.post(`${at}/people/${idOf('birch', 'stranger')}/view`)).status).toBe(404);
    expect((await seeAs(browserOf(bed, alderPeople.agent), 'manager')).status).toBe(403);
  });
});
