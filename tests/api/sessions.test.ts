import http from 'node:http';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { and, eq, memberships, membershipScopes, people, sessions } from '../../server/db';
import { acrossProducers } from '../../server/db/statement-hook';
import { expireSessions, hash, sessionCookie, sessionLimits } from '../../server/http/session';
import { alder, alderPeople } from '../cast';
import { day, hour, idOf } from '../factories';
import { askForLink, browser, browserOf, cookieOf, signIn, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
let agent: Agent;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
  agent = browser(server);
});
afterEach(() => server.close());

interface Listed {
  handle: string;
  device: string;
  current: boolean;
}
const listed = async (who: Agent): Promise<Listed[]> => (await who.get('/api/me/sessions').expect(200)).body.sessions;
const cookieIn = (headers: Record<string, unknown>): string => (Array.isArray(headers['set-cookie']) ? headers['set-cookie'].map(String).find((one) => one.startsWith(sessionCookie)) : undefined) ?? '';

describe('the cookie', () => {
  test('is new at every sign-in, whatever was brought along', async () => {
    const first = await askForLink(server, agent, alderPeople.manager.email);
    const one = cookieIn((await agent.post('/api/auth/session').send({ token: first.token })).headers);
    const second = await askForLink(server, agent, alderPeople.manager.email);
    const two = cookieIn((await agent.post('/api/auth/session').send({ token: second.token })).headers);
    expect(one).not.toBe('');
    expect(two.split(';')[0]).not.toBe(one.split(';')[0]);
    expect(await listed(agent)).toHaveLength(1);
  });

  test('planted by somebody else is not taken over', async () => {
    const planted = cookieOf(server, alderPeople.agent.email);
    const { token } = await askForLink(server, agent, alderPeople.manager.email);
    const answer = await agent.post('/api/auth/session').set('cookie', planted).send({ token });
    expect(cookieIn(answer.headers).split(';')[0]).not.toBe(planted);
    await browser(server).get('/api/me').set('cookie', planted).expect(401);
  });

  test('is out of reach of scripts and other sites, and kept as a hash only', async () => {
    const { token } = await askForLink(server, agent, alderPeople.manager.email);
    const cookie = cookieIn((await agent.post('/api/auth/session').send({ token })).headers);
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Lax/);
    const id = decodeURIComponent(cookie.split(';')[0] ?? '').replace(`${sessionCookie}=s:`, '').split('.')[0] ?? '';
    const kept = server.db.select({ id: sessions.id }).from(sessions).all();
    expect(kept.map((one) => one.id)).toContain(hash(id));
    expect(kept.map((one) => one.id)).not.toContain(id);
  });

  test('with a wrong signature is nobody', async () => {
    const cookie = cookieOf(server, alderPeople.manager.email);
    await browser(server).get('/api/me').set('cookie', cookie.slice(0, -3)).expect(401);
  });

  test('is given to nobody who only looks', async () => {
    for (const path of ['/api/me', '/api/alder-ice/stores', '/api/openapi.json']) expect(cookieIn((await agent.get(path)).headers), path).toBe('');
  });
});

describe('limits', () => {
  const cases = [
    ['store people', alderPeople.manager, sessionLimits.store, 30 * day, 180 * day],
    ['staff', alderPeople.agent, sessionLimits.staff, 12 * hour, 30 * day],
  ] as const;

  test.each(cases)('%s: idle', async (_who, person, { idle }, promised) => {
    expect(idle).toBe(promised);
    await signIn(server, agent, person);
    server.clock.now += idle - 1;
    await agent.get('/api/me').expect(200);
    server.clock.now += idle - 1;
    await agent.get('/api/me').expect(200);
    server.clock.now += idle;
    await agent.get('/api/me').expect(401);
  });

  test.each(cases)('%s: in all', async (_who, person, { idle, absolute }, _idle, promised) => {
    expect(absolute).toBe(promised);
    await signIn(server, agent, person);
    const start = server.clock.now;
    const step = idle - hour;
    while (server.clock.now + step < start + absolute) {
      server.clock.now += step;
      await agent.get('/api/me').expect(200);
    }
    server.clock.now = start + absolute;
    await agent.get('/api/me').expect(401);
  });

  test('what ran out is swept away', async () => {
    await signIn(server, agent, alderPeople.agent);
    expect(expireSessions(server.db, server.clock.now)).toBe(0);
    expect(expireSessions(server.db, server.clock.now + 13 * hour)).toBe(1);
  });
});

describe('rights are those of now', () => {
  test('a person deactivated is out at the next request', async () => {
    const ada = browserOf(server, alderPeople.admin);
    await ada.get('/api/alder-ice/stores').expect(200);
    server.db.update(people).set({ deactivatedAt: server.clock.now }).where(eq(people.email, alderPeople.admin.email)).run();
    await ada.get('/api/alder-ice/stores').expect(401);
    await ada.get('/api/me').expect(401);
  });

  test('a role changed acts at the next request', async () => {
    const dale = browserOf(server, alderPeople.dispatcher);
    await dale.delete(`/api/alder-ice/stores/${idOf('alder', 'campo')}/next-truck`).expect(204);
    acrossProducers('a test', () =>
      server.db.update(memberships).set({ role: 'support-agent' }).where(and(eq(memberships.id, idOf('alder', 'dispatcher')), eq(memberships.producerId, idOf(alder.slug, 'producer')))).run(),
    );
    await dale.delete(`/api/alder-ice/stores/${idOf('alder', 'lantern')}/next-truck`).expect(403);
  });

  test('a store taken away is gone at the next request', async () => {
    const marta = browserOf(server, alderPeople.manager);
    const path = `/api/alder-ice/stores/${idOf('alder', 'lantern')}`;
    await marta.get(path).expect(200);
    acrossProducers('a test', () => server.db.delete(membershipScopes).where(eq(membershipScopes.membershipId, idOf('alder', 'manager'))).run());
    await marta.get(path).expect(404);
    expect((await marta.get('/api/alder-ice/stores').expect(200)).body.stores).toEqual([]);
  });
});

/** Asks for something with its body still to come, and sends that after `meanwhile`. */
const slowly = (path: string, cookie: string, meanwhile: () => void): Promise<number> =>
  new Promise((resolve, reject) => {
    const headers = { cookie, 'sec-fetch-site': 'same-origin', 'content-type': 'application/json', 'content-length': 2 };
    const asked = http.request(`${server.url}${path}`, { method: 'POST', headers }, (answer) => resolve(answer.resume().statusCode ?? 0));
    asked.on('error', reject);
    asked.write('{', () => setTimeout(() => {
      meanwhile();
      asked.end('}');
    }, 100));
  });

describe('own sessions', () => {
  test('one that ends while it is being used stays ended', async () => {
    const cookie = cookieOf(server, alderPeople.admin.email);
    const ended = () => void server.db.delete(sessions).where(eq(sessions.id, hash(`session-of-${alderPeople.admin.email}`))).run();
    // Whom it sees as is written into the session, which is gone by then.
    expect(await slowly(`/api/alder-ice/people/${idOf('alder', 'manager')}/view`, cookie, ended)).toBe(204);
    await browser(server).get('/api/me').set('cookie', cookie).expect(401);
    expect(server.db.select().from(sessions).all()).toEqual([]);
  });

  test('are listed with their device, and any of them can be ended', async () => {
    const phone = browser(server).set('user-agent', 'Mozilla/5.0 (iPhone) Safari');
    await signIn(server, phone, alderPeople.manager);
    await signIn(server, agent, alderPeople.manager);
    const all = await listed(agent);
    expect(all).toHaveLength(2);
    expect(all.filter(({ current }) => current)).toHaveLength(1);
    const other = all.find(({ current }) => !current);
    expect(other?.device).toBe('Safari, iPhone');
    await agent.delete(`/api/me/sessions/${other?.handle}`).expect(204);
    await phone.get('/api/me').expect(401);
    await agent.get('/api/me').expect(200);
  });

  test('somebody else’s can be neither seen nor ended', async () => {
    await signIn(server, agent, alderPeople.manager);
    const agnes = browser(server);
    await signIn(server, agnes, alderPeople.agent);
    const [theirs] = await listed(agnes);
    const refused = await agent.delete(`/api/me/sessions/${theirs?.handle}`).expect(404);
    const absent = await agent.delete('/api/me/sessions/nobodyshandle').expect(404);
    expect(refused.text).toBe(absent.text);
    await agnes.get('/api/me').expect(200);
  });
});

test('a page that asks who is here is told, or told nobody', async () => {
  const asked = async (who: Agent): Promise<unknown> => (await who.get('/api/auth/session').expect(200)).body.me;
  const marta = browserOf(server, alderPeople.manager);
  expect(await asked(browser(server))).toBeNull();
  expect(await asked(browserOf(server, alderPeople.gone))).toBeNull();
  expect(await asked(marta)).toEqual((await marta.get('/api/me').expect(200)).body);
});

describe('me', () => {
  test('tells of every producer a person works with', async () => {
    const { body } = await browserOf(server, alderPeople.both).get('/api/me').expect(200);
    const told: { role: string; producer: { slug: string } }[] = body.memberships;
    expect(told.map(({ role, producer }) => [producer.slug, role])).toEqual(expect.arrayContaining([['alder-ice', 'support-agent'], ['birch-ice', 'store-manager']]));
    expect(told).toHaveLength(2);
  });

  test('takes language and name, trimmed, and nothing else', async () => {
    const marta = browserOf(server, alderPeople.manager);
    await marta.patch('/api/me').send({ language: 'en', name: '  Marta M. ' }).expect(204);
    expect((await marta.get('/api/me')).body.person).toMatchObject({ language: 'en', name: 'Marta M.', email: alderPeople.manager.email });
    for (const body of [{ email: 'x@y.example' }, { language: 'fr' }, { name: '' }, { name: 'x'.repeat(121) }]) await marta.patch('/api/me').send(body).expect(400);
  });
});
