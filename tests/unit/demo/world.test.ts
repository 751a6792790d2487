import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { roles, requestStates } from '../../../server/contract/words';
import { deliveries, deliveryLines, eq, freezers, freezerStates, memberships, nextTrucks, people, photos, requestEntries, requests, stores, type ProducerDb } from '../../../server/db';
import { dayOf } from '../../../server/domain/civil';
import { demoFile } from '../../../server/demo/demo-file';
import { openWorld, type Played } from '../../../server/demo/world';
import { testApp, type TestApp } from '../../support/server';

const HOUR = 3_600_000;
const dataDir = mkdtempSync(path.join(tmpdir(), 'demo-'));
let app: TestApp;
let played: Played[];

const worldOf = (slug: string): Played => {
  const found = played.find(({ demo }) => demo.slug === slug);
  if (!found) throw new Error(`no ${slug}`);
  return found;
};
const statesOf = (scoped: ProducerDb) => scoped.select({ id: freezerStates.id, share: freezerStates.share, at: freezerStates.at, state: freezerStates.state }).from(freezerStates).all();
const slugs = ['kestrel-bend', 'puerto-claro'];

beforeAll(async () => {
  app = await testApp('nobody', (services) => ({ ...services, config: { ...services.config, dataDir } }));
  played = await openWorld(app.services, () => {});
}, 180_000);
afterAll(async () => {
  await app.close();
  rmSync(dataDir, { recursive: true });
});

test('no reference is broken', () => {
  expect(app.db.$client.pragma('foreign_key_check')).toEqual([]);
});

test.each([
  ['kestrel-bend', 60, 84, 2],
  ['puerto-claro', 18, 24, 1],
])('%s has its size', (slug, storeCount, freezerCount, unfitted) => {
  const { scoped, fleet } = worldOf(slug);
  expect(scoped.select({ id: stores.id }).from(stores).all()).toHaveLength(storeCount);
  expect(scoped.select({ id: freezers.id }).from(freezers).all()).toHaveLength(freezerCount);
  expect(fleet).toHaveLength(freezerCount - unfitted);
});

test.each(slugs)('%s has somebody in every role, and nobody who might be real', (slug) => {
  const found = demoFile(app.services, played).people.filter(({ producer }) => producer === slug);
  expect(new Set(found.map(({ role }) => role))).toEqual(new Set(roles));
  for (const { email } of app.db.select().from(people).all()) expect(email).toMatch(/^[a-z]+@[a-z]+\.example$/);
  const phones = worldOf(slug).scoped.select({ phone: stores.phone }).from(stores).all();
  for (const { phone } of [...phones, { phone: worldOf(slug).demo.urgentPhone }]) expect(phone).toMatch(/^(\(\d{3}\) )?555-01\d\d$/);
});

test('somebody works with both producers', () => {
  const members = (slug: string) => worldOf(slug).scoped.select({ id: memberships.personId }).from(memberships).all().map(({ id }) => id);
  const [first = [], second = []] = slugs.map(members);
  expect(first.filter((id) => second.includes(id))).toHaveLength(1);
});

test('the file for checks from outside names people and sensors', () => {
  const file = demoFile(app.services, played);
  expect(Object.keys(file)).toEqual(['url', 'people', 'telemetry']);
  for (const person of file.people) {
    expect(Object.keys(person)).toEqual(['role', 'email', 'language', 'producer', 'signInUrl']);
    expect(person.signInUrl).toBe(`${file.url}/dev/people?email=${encodeURIComponent(person.email)}`);
  }
  expect(file.telemetry.map(({ producer }) => producer)).toEqual(slugs);
  for (const { key, sensors: listed } of file.telemetry) {
    expect(key.length).toBeGreaterThan(20);
    for (const { urn, probes } of listed) expect([urn, probes]).toEqual([expect.stringMatching(/^urn:dev:os:32473-(kb|pc)-\d{4}$/), 3]);
  }
});

test.each(slugs)('levels of %s can be, and none runs out in the past', (slug) => {
  const { scoped, fleet } = worldOf(slug);
  const states = statesOf(scoped);
  expect(states).toHaveLength(fleet.length);
  for (const { share, state, at } of states) {
    expect(share).toBeGreaterThanOrEqual(0);
    expect(share).toBeLessThanOrEqual(1);
    expect(at).toBeLessThanOrEqual(app.clock.now);
    for (const time of [state.runOut.early, state.runOut.likely, state.runOut.late]) expect(time === null || time >= at).toBe(true);
    expect(JSON.stringify(state)).not.toMatch(/NaN|Infinity/);
  }
});

test.each(slugs)('the lanes of %s fill the width', (slug) => {
  for (const { simulated } of worldOf(slug).fleet) {
    const { lanes, mount, model } = simulated.setup;
    expect(lanes.reduce((sum, { widthShare }) => sum + widthShare, 0)).toBeCloseTo(1, 9);
    for (const x of mount.probesIn) expect(x > 0 && x < model.insideWidthIn).toBe(true);
  }
});

test.each(slugs)('sensors of %s see what the trucks brought', (slug) => {
  const { scoped } = worldOf(slug);
  const lines = scoped
    .select({ freezerId: deliveryLines.freezerId, at: deliveries.at, bags: deliveryLines.bags })
    .from(deliveryLines)
    .innerJoin(deliveries, eq(deliveries.id, deliveryLines.deliveryId))
    .all();
  const recent = statesOf(scoped).flatMap(({ id, state }) => state.deliveries.map((seen) => ({ id, ...seen })));
  const unmatched = recent.filter(({ id, at }) => !lines.some((line) => line.freezerId === id && Math.abs(line.at - at) < 1.1 * HOUR));
  expect(recent.length).toBeGreaterThan(20);
  expect(unmatched.length / recent.length).toBeLessThan(0.05);
});

test.each(slugs)('what is the matter in %s can be seen', (slug) => {
  const { scoped, fleet, demo } = worldOf(slug);
  const { now } = app.clock;
  const first = (name: string) => fleet.find(({ store }) => store.name === name);
  const stateOf = (name: string) => scoped.find(freezerStates, first(name)?.id ?? '')?.state;
  const truckOf = (name: string) => scoped.select({ day: nextTrucks.day, from: nextTrucks.from, to: nextTrucks.to }).from(nextTrucks).where(eq(nextTrucks.storeId, first(name)?.store.id ?? '')).get();
  const { broken, silent, short, late, morning, hungry } = demo.troubles;

  expect(stateOf(broken)?.warmSince).toBeGreaterThan(now - 4 * HOUR);
  expect(now - (stateOf(silent)?.at ?? now)).toBeGreaterThan(24 * HOUR);
  const lane = first(short)?.simulated.setup.lanes.findIndex(({ bagPounds }) => bagPounds === 20) ?? -1;
  expect(stateOf(short)?.level.lanes[lane]?.bags).toBe(0);
  expect(truckOf(late)).toMatchObject({ day: dayOf(now, 'America/Chicago') });
  expect(truckOf(late)?.to).toBeLessThan(now);
  expect(stateOf(hungry)?.runOut.likely).toBeLessThan(truckOf(hungry)?.from ?? 0);
  expect(stateOf(demo.newlyFitted)?.rates[0]?.days).toBeLessThanOrEqual(1);
  const came = scoped.select({ at: deliveries.at }).from(deliveries).where(eq(deliveries.storeId, first(morning)?.store.id ?? '')).all().map(({ at }) => at);
  expect(dayOf(Math.max(...came), 'America/Chicago')).toBe(dayOf(now, 'America/Chicago'));
});

test.each(slugs)('service requests of %s stand in every state, with photos and notes', async (slug) => {
  const { scoped } = worldOf(slug);
  const states = new Set(scoped.select({ state: requests.state }).from(requests).all().map(({ state }) => state));
  expect(states).toEqual(new Set(requestStates));
  const kinds = new Set(scoped.select({ kind: requestEntries.kind }).from(requestEntries).all().map(({ kind }) => kind));
  for (const kind of ['opened', 'reply', 'note', 'assigned', 'state', 'photos'] as const) expect(kinds).toContain(kind);
  for (const { file } of scoped.select({ file: photos.file }).from(photos).all()) expect((await app.services.storage.get(file))?.subarray(0, 2)).toEqual(Buffer.from([0xff, 0xd8]));
});
