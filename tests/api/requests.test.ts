import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { asc, auditEntries, eq } from '../../server/db';
import { auditHash } from '../../server/http/run-action';
import { alder, alderPeople, noteWord, type AlderPerson } from '../cast';
import { idOf } from '../factories';
import { browserOf, deliveredMail, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
beforeEach(async () => {
  server = await testApp('alder');
});
afterEach(() => server.close());

const root = '/api/alder-ice/requests';
const id = (thing: string): string => idOf('alder', thing);
const as = (name: AlderPerson): Agent => browserOf(server, alderPeople[name]);
const typeOf = (body: { type?: string }): string | undefined => body.type?.replace('urn:nilas:problem:', '');

interface Entry {
  kind: string;
  words: string;
  state: string | null;
  author: { name: string } | null;
}
interface Told {
  id: string;
  number: number;
  state: string;
  version: number;
  entries: Entry[];
  scheduledDay: string | null;
  assignee: { id: string; name: string } | null;
}
const kinds = ({ entries }: Told): string[] => entries.map(({ kind, state }) => (state ? `${kind} ${state}` : kind));

async function file(who: Agent, over: object = {}): Promise<Told> {
  const body = { storeId: id('lantern'), kind: 'not-cooling', freezerId: id('lantern freezer'), words: ' No enfría ', ...over };
  return (await who.post(root).send(body).expect(201)).body;
}
const change = (who: Agent, request: Told, body: object) => who.patch(`${root}/${request.id}`).send({ version: request.version, ...body });
/** Who was written to since the last look, with the subject. */
async function news(): Promise<string[]> {
  const all = await deliveredMail(server);
  const fresh = all.slice(seen);
  seen = all.length;
  return fresh.map(({ to, subject }) => `${to}: ${subject}`).sort();
}
let seen = 0;
beforeEach(() => {
  seen = 0;
});

describe('filing', () => {
  test('gives the next number, the words as written, and news to store and staff in their languages', async () => {
    const filed = await file(as('manager'));
    expect(filed).toMatchObject({ number: 1006, state: 'new', version: 1, words: 'No enfría', store: `lantern ${alder.mark}` });
    expect(kinds(filed)).toEqual(['opened']);
    const mails = await deliveredMail(server);
    const html = Object.fromEntries(mails.map((mail) => [mail.to, mail.html]));
    // Marta reads Spanish, Tess and the agents English.
    expect(html[alderPeople.manager.email]).toContain('lang="es"');
    expect(html[alderPeople.managerOfThree.email]).toContain('lang="en"');
    expect(html[alderPeople.agent.email]).toContain('lang="en"');
    expect(html[alderPeople.agent.email]).toContain('No enfría');
    expect(html[alderPeople.agent.email]).toContain(`http://portal.example/alder-ice/requests/${filed.id}`);
    expect(Object.keys(html).sort()).toEqual([alderPeople.agent, alderPeople.both, alderPeople.manager, alderPeople.managerOfThree].map(({ email }) => email).sort());
    expect((await file(as('manager'))).number).toBe(1007);
  });

  test('ice sooner goes to the dispatcher too', async () => {
    await file(as('otherManager'), { storeId: id('juniper'), freezerId: null, kind: 'ice-sooner' });
    expect((await news()).join()).toContain(alderPeople.dispatcher.email);
  });

  test('names the freezer of that store only', async () => {
    const refused = await as('managerOfThree').post(root).send({ storeId: id('lantern'), kind: 'leak', freezerId: id('juniper freezer') }).expect(422);
    expect(typeOf(refused.body)).toBe('freezer-elsewhere');
    expect(await news()).toEqual([]);
  });

  test('words are kept as they are, whatever they look like', async () => {
    const words = '<script>alert(1)</script> {{producer}} $t(footer) %s \' " & "; drop table request';
    const filed = await file(as('manager'), { words });
    expect(filed.entries[0]?.words).toBe(words);
    const toAgent = (await deliveredMail(server)).find(({ to }) => to === alderPeople.agent.email);
    expect(toAgent?.text).toContain(words);
    expect(toAgent?.html).not.toContain('<script>');
    expect(toAgent?.html).toContain('{{producer}} $t(footer)');
  });
});

describe('the desk', () => {
  test('assigns, schedules, waits, solves and closes, and the right people hear of it', async () => {
    const filed = await file(as('manager'));
    await news();
    const agnes = as('agent');
    const assigned: Told = (await change(agnes, filed, { assigneeId: id('technician') }).expect(200)).body;
    expect(assigned.assignee?.name).toContain('Theo');
    expect(await news()).toEqual([expect.stringContaining(alderPeople.technician.email)]);

    const scheduled: Told = (await change(as('technician'), assigned, { state: 'scheduled', scheduledDay: '2026-12-03' }).expect(200)).body;
    expect(scheduled).toMatchObject({ state: 'scheduled', scheduledDay: '2026-12-03' });
    const told = await news();
    expect(told).toHaveLength(2);
    expect(told.join()).toContain('jueves, 3 de diciembre');
    expect(told.join()).toContain('Thursday, December 3');

    const solved: Told = (await change(agnes, scheduled, { state: 'solved' }).expect(200)).body;
    expect(solved).toMatchObject({ state: 'solved', scheduledDay: null });
    const closed: Told = (await change(agnes, solved, { state: 'closed' }).expect(200)).body;
    expect(kinds(closed)).toEqual(['opened', 'assigned', 'state scheduled', 'state solved', 'state closed']);
    expect(typeOf((await change(agnes, closed, { state: 'open' }).expect(409)).body)).toBe('step-not-possible');
    expect(typeOf((await agnes.post(`${root}/${filed.id}/replies`).send({ words: 'x' }).expect(409)).body)).toBe('request-ended');
  });

  test('of two who act on what they saw, the second is told', async () => {
    const filed = await file(as('manager'));
    await change(as('agent'), filed, { state: 'open' }).expect(200);
    expect(typeOf((await change(as('admin'), filed, { state: 'solved' }).expect(409)).body)).toBe('request-changed');
  });

  test('of twenty changes at once one is taken', async () => {
    const filed = await file(as('manager'));
    const answers = await Promise.all(Array.from({ length: 20 }, () => change(as('agent'), filed, { state: 'open' })));
    expect(answers.map(({ status }) => status).filter((status) => status === 200)).toHaveLength(1);
  });

  test.each([
    [{ state: 'scheduled' }, 'day-needed'],
    [{ state: 'scheduled', scheduledDay: '2026-11-30' }, 'day-past'],
    [{ assigneeId: idOf('alder', 'driver') }, 'unknown-person'],
    [{ assigneeId: idOf('alder', 'manager') }, 'unknown-person'],
    [{ assigneeId: idOf('alder', 'gone') }, 'unknown-person'],
    [{ assigneeId: idOf('alder', 'left') }, 'unknown-person'],
    [{ assigneeId: idOf('birch', 'strangerAgent') }, 'unknown-person'],
  ])('%j is refused: %s', async (body, problem) => {
    const filed = await file(as('manager'));
    expect(typeOf((await change(as('agent'), filed, body).expect(422)).body)).toBe(problem);
  });

  test('today is the store’s day, not the server’s', async () => {
    // 23:30 on December 1 in Chicago is December 2 in UTC.
    server.clock.now = Date.UTC(2026, 11, 2, 5, 30);
    const filed = await file(as('manager'));
    await change(as('agent'), filed, { state: 'scheduled', scheduledDay: '2026-12-01' }).expect(200);
  });

  test('lists whom a request can be given to: staff at work', async () => {
    const { body } = await as('agent').get('/api/alder-ice/assignees').expect(200);
    const names: string[] = body.assignees.map(({ name }: { name: string }) => name.split(' ')[0]);
    expect(names.sort()).toEqual(['Ada', 'Agnes', 'Bea', 'Dale', 'Theo']);
  });
});

describe('words between store and staff', () => {
  test('a reply goes to the other side', async () => {
    const filed = await file(as('manager'));
    await news();
    await as('agent').post(`${root}/${filed.id}/replies`).send({ words: 'Vamos en camino' }).expect(201);
    expect((await news()).map((line) => line.split(':')[0])).toEqual([alderPeople.manager.email, alderPeople.managerOfThree.email]);
    await as('manager').post(`${root}/${filed.id}/replies`).send({ words: 'Gracias' }).expect(201);
    expect((await news()).map((line) => line.split(':')[0])).toEqual([alderPeople.agent.email, alderPeople.both.email].sort());
  });

  test('the store’s answer opens what waited for it, and what was solved too soon', async () => {
    const filed = await file(as('manager'));
    const waiting: Told = (await change(as('agent'), filed, { state: 'waiting-on-store' })).body;
    const answered: Told = (await as('manager').post(`${root}/${filed.id}/replies`).send({ words: 'here' })).body;
    expect(answered.state).toBe('open');
    expect(answered.version).toBeGreaterThan(waiting.version);
    await change(as('agent'), answered, { state: 'solved' }).expect(200);
    const again: Told = (await as('manager').post(`${root}/${filed.id}/replies`).send({ words: 'still warm' })).body;
    expect(again.state).toBe('open');
  });

  test('a note is for staff: no store sees it, nobody is written to', async () => {
    const filed = await file(as('manager'));
    await news();
    await as('agent').post(`${root}/${filed.id}/notes`).send({ words: noteWord }).expect(201);
    expect(await news()).toEqual([]);
    const path = `${root}/${filed.id}`;
    for (const name of ['manager', 'managerOfThree', 'storeRep'] as const) expect((await as(name).get(path).expect(200)).text, name).not.toContain(noteWord);
    for (const name of ['agent', 'dispatcher', 'rep', 'admin', 'driver'] as const) expect((await as(name).get(path).expect(200)).text, name).toContain(noteWord);
    const before: Told = (await as('manager').get(path)).body;
    expect([before.version, before.state]).toEqual([1, 'new']);
  });
});

test('a store takes its request back once', async () => {
  const filed = await file(as('manager'));
  await news();
  const cancelled: Told = (await as('manager').delete(`${root}/${filed.id}`).expect(200)).body;
  expect(cancelled.state).toBe('cancelled');
  expect((await news()).join()).toContain(alderPeople.agent.email);
  expect(typeOf((await as('manager').delete(`${root}/${filed.id}`).expect(409)).body)).toBe('request-ended');
});

describe('the queue', () => {
  const numbers = async (who: Agent, query: string): Promise<number[]> => (await who.get(`${root}?${query}`).expect(200)).body.requests.map(({ number }: Told) => number);

  test.each([
    ['', [1005, 1002, 1001]],
    ['state=any', [1005, 1002, 1001, 1003, 1004]],
    ['state=closed', [1004]],
    ['kind=ice-sooner', [1005, 1002]],
    ['assignee=nobody', [1005, 1002]],
    [`assignee=${idOf('alder', 'technician')}`, [1001]],
    [`store=${idOf('alder', 'juniper')}`, [1002]],
    ['q=SR-1002', [1002]],
    ['q=1001', [1001]],
    ['q=juniper', [1002]],
    ['q=%25', []],
    ['q=_', []],
    ["q=' or 1=1 --", []],
  ])('%s', async (query, wanted) => {
    expect(await numbers(as('agent'), query)).toEqual(wanted);
  });

  test('mine are mine', async () => {
    expect(await numbers(as('technician'), 'assignee=me')).toEqual([1001]);
    expect(await numbers(as('agent'), 'assignee=me')).toEqual([]);
  });

  test('pages join without a gap or a repeat', async () => {
    const found: number[] = [];
    let after = '';
    for (let pages = 0; pages < 9; pages += 1) {
      const { body } = await as('agent').get(`${root}?state=any&limit=2${after}`).expect(200);
      found.push(...body.requests.map(({ number }: Told) => number));
      if (!body.next) break;
      after = `&after=${body.next}`;
    }
    expect(found).toEqual([1005, 1002, 1001, 1003, 1004]);
  });
});

test('the audit trail tells each act, names nobody, and holds together', async () => {
  const filed = await file(as('manager'));
  await change(as('agent'), filed, { state: 'open', assigneeId: id('technician') }).expect(200);
  await as('agent').post(`${root}/${filed.id}/replies`).send({ words: 'secret words' }).expect(201);
  const lines = server.db.select().from(auditEntries).where(eq(auditEntries.producerId, idOf(alder.slug, 'producer'))).orderBy(asc(auditEntries.seq)).all();
  expect(lines.map(({ act }) => act).slice(1)).toEqual(['file-request', 'change-request', 'reply-to-request']);
  lines.slice(1).forEach((line, i) => {
    expect(line.previousHash).toBe(lines[i]?.hash);
    expect(line.hash).toBe(auditHash(line));
  });
  expect(JSON.stringify(lines.slice(1))).not.toMatch(/Marta|Agnes|@|secret words/);
});
