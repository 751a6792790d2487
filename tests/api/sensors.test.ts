import { afterEach, beforeEach, expect, test } from 'vitest';
import { senmlType } from '../../server/contract/telemetry';
import { alder, alderPeople } from '../cast';
import { hour, idOf, morning, telemetryKeyOf } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
let ada: Agent;
beforeEach(async () => {
  server = await testApp('alder');
  ada = browserOf(server, alderPeople.admin);
});
afterEach(() => server.close());

const at = `/api/${alder.slug}`;
const old = idOf(alder.namespace, 'key');
const door = (key: string, body: unknown = []) =>
  fetch(`${server.url}/api/telemetry`, { method: 'POST', headers: { authorization: `Bearer ${key}`, 'content-type': senmlType }, body: JSON.stringify(body) });

test('a new key opens the door, is shown once, and only its hash is kept', async () => {
  const { body } = await ada.post(`${at}/telemetry-keys`).send({ name: 'North gateway' }).expect(201);
  expect((await door(body.secret)).status).toBe(202);
  const listed = await ada.get(`${at}/telemetry-keys`).expect(200);
  expect(listed.body.keys.map(({ name }: { name: string }) => name)).toContain('North gateway');
  expect(listed.text).not.toContain(body.secret);
  expect(JSON.stringify(server.db.$client.prepare('select * from telemetry_key where producer_id = ?').all(idOf(alder.slug, 'producer')))).not.toContain(body.secret);
});

test('a key that is replaced opens the door until its time is over', async () => {
  const { body } = await ada.post(`${at}/telemetry-keys`).send({ name: 'Successor', replaces: old, overlapHours: 2 }).expect(201);
  expect((await door(telemetryKeyOf(alder))).status).toBe(202);
  server.clock.now = morning + 2 * hour + 1;
  expect((await door(telemetryKeyOf(alder))).status).toBe(401);
  expect((await door(body.secret)).status).toBe(202);
});

test('a revoked key opens nothing at once, and cannot be revoked or replaced again', async () => {
  await ada.delete(`${at}/telemetry-keys/${old}`).expect(204);
  expect((await door(telemetryKeyOf(alder))).status).toBe(401);
  await ada.delete(`${at}/telemetry-keys/${old}`).expect(404);
  await ada.post(`${at}/telemetry-keys`).send({ name: 'Late', replaces: old }).expect(404);
});

test.each([
  [{ name: '' }, '/name', 'required'],
  [{ name: 'x', overlapHours: -1 }, '/overlapHours', 'number'],
  [{ name: 'x', replaces: 'that one' }, '/replaces', 'id'],
])('%j is refused at its field', async (body, pointer, fault) => {
  const answer = await ada.post(`${at}/telemetry-keys`).send(body).expect(400);
  expect(answer.body.errors).toEqual([expect.objectContaining({ pointer, fault })]);
});

test('sensors that speak and hang in no freezer, page by page', async () => {
  const pack = ['c', 'a', 'b'].map((name) => ({ bn: `urn:dev:os:32473-${name}:`, n: 'probe1', u: 'm', v: 0.5, bt: morning / 1000 }));
  expect((await door(telemetryKeyOf(alder), pack)).status).toBe(202);
  const theo = browserOf(server, alderPeople.technician);
  const first = await theo.get(`${at}/unclaimed-sensors?limit=2`).expect(200);
  expect(first.body.sensors).toEqual([
    expect.objectContaining({ serial: 'urn:dev:os:32473-a', firstHeardAt: morning, lastReadingAt: morning }),
    expect.objectContaining({ serial: 'urn:dev:os:32473-b' }),
  ]);
  const second = await theo.get(`${at}/unclaimed-sensors?limit=2&after=${first.body.next}`).expect(200);
  expect(second.body).toEqual({ sensors: [expect.objectContaining({ serial: 'urn:dev:os:32473-c' })], next: null });
});

test('readings that were not believed, youngest first, with their reasons', async () => {
  server.clock.now = morning + hour;
  await door(telemetryKeyOf(alder), [{ bn: 'urn:dev:os:32473-a:', bt: morning / 1000, n: 'probe1', u: 'cm', v: 50 }]);
  const { body } = await browserOf(server, alderPeople.agent).get(`${at}/quarantined-readings?limit=1`).expect(200);
  expect(body.readings).toEqual([
    { id: expect.any(String), serial: 'urn:dev:os:32473-a', at: morning, reason: 'wrong-unit', records: ['probe1'], receivedAt: morning + hour },
  ]);
  expect(body.next).not.toBeNull();
});
