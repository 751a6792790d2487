import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { eq, people, signInLinks } from '../../server/db';
import { alderPeople } from '../cast';
import { askForLink, browser, deliveredMail, signIn, testApp, type Agent, type TestApp } from '../support/server';
import { redemptionFindings } from './redemption';

let server: TestApp;
let agent: Agent;
beforeEach(async () => {
  server = await testApp('alder');
  agent = browser(server);
});
afterEach(() => server.close());

const marta = alderPeople.manager.email;
const minute = 60_000;
const typeOf = (body: { type?: string }): string | undefined => body.type?.replace('urn:nilas:problem:', '');
const redeem = (who: Agent, given: object) => who.post('/api/auth/session').send(given);

describe('asking for a link', () => {
  const ask = (email: unknown) => browser(server).post('/api/auth/link').send({ email });
  const told = async (email: unknown) => {
    const { status, text, headers } = await ask(email);
    const { date: _date, 'set-cookie': cookie, ratelimit: _left, 'ratelimit-policy': _policy, ...rest } = headers as Record<string, unknown>;
    return JSON.stringify([status, text, rest, Array.isArray(cookie) ? cookie.map((one) => String(one).replace(/=[\w-]+;/, '=…;').replace(/Expires=[^;]+/, '')) : cookie]);
  };

  test('answers the same bytes whoever it is', async () => {
    const known = await told(marta);
    expect(known).toContain('202');
    expect(await told('nobody@nowhere.example')).toBe(known);
    expect(await told(alderPeople.gone.email)).toBe(known);
    expect(await told(` ${marta.toUpperCase()} `)).toBe(known);
  });

  test('refuses what is no address, alike for known and unknown', async () => {
    const nobody = 'nobody@nowhere.example';
    const odd: ((email: string) => unknown)[] = [(email) => [email], (email) => ({ email }), (email) => `${email},${email}`, (email) => `${email}\r\nbcc: ${email}`, () => null, () => 7, () => ''];
    for (const shape of odd) {
      const answer = await told(shape(marta));
      expect(answer).toMatch(/^\[400,/);
      expect(await told(shape(nobody))).toBe(answer);
    }
  });

  test('writes to nobody but a person who may sign in', async () => {
    for (const email of ['nobody@nowhere.example', alderPeople.gone.email, marta]) await ask(email).expect(202);
    expect((await deliveredMail(server)).map(({ to }) => to)).toEqual([marta]);
  });

  test('takes as long for a stranger, within 5 ms on average over 500', async () => {
    const spent = { known: 0, unknown: 0 };
    for (let i = 0; i < 500; i += 1) {
      const which = i % 2 === 0 ? 'known' : 'unknown';
      const body = JSON.stringify({ email: which === 'known' ? marta : 'nobod@lantern.example' });
      const started = performance.now();
      await (await fetch(`${server.url}/api/auth/link`, { method: 'POST', body, headers: { 'content-type': 'application/json' } })).arrayBuffer();
      if (i >= 20) spent[which] += performance.now() - started;
    }
    expect(Math.abs(spent.known - spent.unknown) / 240).toBeLessThan(5);
  });

  test('writes in the person’s language, with a link to this portal and a code', async () => {
    const spanish = await askForLink(server, agent, marta);
    expect(spanish.mail.html).toContain('<html lang="es">');
    expect(spanish.mail.text).toContain('http://portal.example/sign-in/confirm#token=');
    expect(spanish.mail.subject).toContain(spanish.code);
    const english = await askForLink(server, agent, alderPeople.agent.email);
    expect(english.mail.html).toContain('<html lang="en">');
    expect(english.mail.subject).not.toBe(spanish.mail.subject);
  });

  test('builds the link on nothing the request says', async () => {
    await agent.post('/api/auth/link').set('host', 'evil.example').set('x-forwarded-host', 'evil.example').set('x-forwarded-proto', 'https').send({ email: marta }).expect(202);
    const [mail] = await deliveredMail(server);
    expect(JSON.stringify(mail)).not.toContain('evil');
  });

  test('keeps neither token nor code, and the link says nothing of the person', async () => {
    const { token, code } = await askForLink(server, agent, marta);
    const kept = JSON.stringify(server.db.select().from(signInLinks).all());
    expect(kept).not.toContain(token);
    expect(kept).not.toContain(code);
    expect(Buffer.from(token.split('.')[1] ?? '', 'base64url').toString()).not.toMatch(/marta|lantern|person/i);
  });
});

describe('the link', () => {
  test('of twenty redemptions at once one wins', async () => {
    expect(await redemptionFindings(server)).toEqual([]);
  });

  test('outlives a mail scanner: HEAD and five GETs leave it usable', async () => {
    const { token } = await askForLink(server, agent, marta);
    const path = `/sign-in/confirm?token=${token}`;
    const scanner = browser(server);
    await scanner.head(path);
    for (let i = 0; i < 5; i += 1) await scanner.get(path);
    expect((await scanner.get('/api/auth/session').expect(200)).body).toEqual({ me: null });
    await redeem(agent, { token }).expect(204);
  });

  test('lasts ten minutes', async () => {
    const { token } = await askForLink(server, agent, marta);
    server.clock.now += 10 * minute - 1;
    const late = await askForLink(server, browser(server), marta);
    server.clock.now += 1;
    expect(typeOf((await redeem(agent, { token }).expect(410)).body)).toBe('link-expired');
    expect(late.token).not.toBe(token);
  });

  test('is refused when forged, altered, or of another time', async () => {
    const { token } = await askForLink(server, agent, marta);
    const [head, body] = token.split('.');
    for (const forged of ['x', `${head}.${body}.`, `${token}x`, `eyJhbGciOiJub25lIn0.${body}.`]) await redeem(agent, { token: forged }).expect(410);
    await redeem(agent, { token }).expect(204);
  });

  test('does not let in somebody deactivated meanwhile', async () => {
    const { token } = await askForLink(server, agent, marta);
    server.db.update(people).set({ deactivatedAt: 1 }).where(eq(people.email, marta)).run();
    await redeem(agent, { token });
    await agent.get('/api/me').expect(401);
  });
});

describe('nothing but having asked', () => {
  test.each([{}, { token: '' }, { code: '' }, { token: null }, { token: ['x'] }, { token: '', code: '' }])('%j lets nobody in', async (given) => {
    await askForLink(server, agent, marta);
    await redeem(agent, given).expect(400);
    await agent.get('/api/me').expect(401);
  });
});

describe('another browser', () => {
  test('is told so, and gets in with link and code', async () => {
    const { token, code } = await askForLink(server, agent, marta);
    const phone = browser(server);
    expect(typeOf((await redeem(phone, { token }).expect(409)).body)).toBe('link-other-browser');
    expect(typeOf((await redeem(phone, { token, code: wrong(code) }).expect(422)).body)).toBe('code-wrong');
    await redeem(phone, { token, code }).expect(204);
    await phone.get('/api/me').expect(200);
    await redeem(agent, { token }).expect(410);
  });

  test('cannot use a code alone', async () => {
    const { code } = await askForLink(server, agent, marta);
    await redeem(browser(server), { code }).expect(410);
    await redeem(agent, { code: `${code.slice(0, 3)} ${code.slice(3)}` }).expect(204);
  });
});

describe('the code', () => {
  test('may be tried five times', async () => {
    const { code, token } = await askForLink(server, agent, marta);
    for (let i = 0; i < 5; i += 1) expect(typeOf((await redeem(agent, { code: wrong(code) })).body)).toBe('code-wrong');
    const refused = await redeem(agent, { code }).expect(429);
    expect(typeOf(refused.body)).toBe('too-many-tries');
    expect(refused.headers['retry-after']).toMatch(/^\d+$/);
    await redeem(browser(server), { token, code }).expect(429);
  });

  test('tries are counted when they come at once', async () => {
    const { code } = await askForLink(server, agent, marta);
    const answers = await Promise.all(Array.from({ length: 12 }, () => redeem(agent, { code: wrong(code) })));
    expect(answers.filter(({ status }) => status === 422)).toHaveLength(5);
  });
});

describe('where the person was going', () => {
  test.each([
    ['/alder-ice/requests?state=live', '/alder-ice/requests?state=live'],
    ['/alder-ice/stores/1', '/alder-ice/stores/1'],
    ['//evil.example', '/'],
    ['/\\evil.example', '/'],
    ['https://evil.example/', '/'],
    ['javascript:alert(1)', '/'],
    ['/%2f/evil.example', '/%2f/evil.example'],
    ['/@evil.example', '/'],
    ['/a\r\nlocation: https://evil.example', '/'],
    ['/a#b', '/'],
    ['/ /evil.example', '/'],
    ['\t//evil.example', '/'],
    ['/api/auth/session', '/'],
    ['/dev/people', '/'],
    ['/x/../api/me', '/'],
    ['/.//evil.example', '/'],
    ['/..//evil.example', '/'],
    ['', '/'],
  ])('%j leads to %j', async (next, wanted) => {
    const { next: kept } = await askForLink(server, agent, marta, next);
    expect(kept).toBe(wanted);
    expect(new URL(kept, 'http://portal.example').origin).toBe('http://portal.example');
  });
});

test('signing out ends the session', async () => {
  await signIn(server, agent, alderPeople.manager);
  await agent.delete('/api/auth/session').expect(204);
  await agent.get('/api/me').expect(401);
});

const wrong = (code: string): string => String((Number(code) + 1) % 1_000_000).padStart(6, '0');
