import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { deliveries, deliveryLines, eq, freezerStates, gt, max, nextTrucks, readings, requests, sensors, stores, type ProducerDb } from '../../../server/db';
import { dayOf } from '../../../server/domain/civil';
import { puertoClaro } from '../../../server/demo/data/producers';
import { catchUp } from '../../../server/demo/play';
import { kept, keep } from '../../../server/demo/kept';
import { makeProducer, type Played } from '../../../server/demo/world';
import { testApp, type TestApp } from '../../support/server';

const DAY = 86_400_000;
const dataDir = mkdtempSync(path.join(tmpdir(), 'demo-'));
let app: TestApp;
let played: Played;

beforeAll(async () => {
  app = await testApp('nobody', (services) => ({ ...services, config: { ...services.config, dataDir } }));
  played = await makeProducer(app.services, puertoClaro);
}, 120_000);
afterAll(async () => {
  await app.close();
  rmSync(dataDir, { recursive: true });
});

/** All that does not depend on the ids of the run. */
const told = (db: TestApp['db'], scoped: ProducerDb) => ({
  stores: scoped.select({ name: stores.name, street: stores.street, latitude: stores.latitude, days: stores.deliveryDays }).from(stores).orderBy(stores.name).all(),
  deliveries: scoped.select({ at: deliveries.at, bags: deliveryLines.bags, lot: deliveryLines.lot }).from(deliveryLines).innerJoin(deliveries, eq(deliveries.id, deliveryLines.deliveryId)).orderBy(deliveries.at, deliveryLines.lot, deliveryLines.bags).all(),
  states: scoped.select({ at: freezerStates.at, pounds: freezerStates.pounds, airF: freezerStates.airF }).from(freezerStates).orderBy(freezerStates.at, freezerStates.pounds).all(),
  readings: db.select().from(readings).orderBy(readings.sensorNo, readings.at).limit(3000).all(),
});

test('the same moment makes the same world', async () => {
  const twin = await testApp('nobody');
  const again = await makeProducer(twin.services, puertoClaro);
  expect(told(twin.db, again.scoped)).toEqual(told(app.db, played.scoped));
  await twin.close();
}, 120_000);

test('a demo opened a week later is alive', async () => {
  keep(dataDir, [played]);
  const made = app.clock.now;
  app.clock.now = made + 7 * DAY;
  const known = kept(dataDir).get(puertoClaro.slug);
  if (!known) throw new Error('nothing was kept');
  const reopened = { ...played, ...known };
  await catchUp(app.services, app.url, [reopened]);

  const { scoped, demo } = reopened;
  const { now } = app.clock;
  const heard = played.fleet.filter(({ store }) => store.name !== demo.troubles.silent).map(({ id }) => scoped.find(freezerStates, id)?.at ?? 0);
  expect(Math.min(...heard)).toBeGreaterThan(now - 31 * 60_000);
  const since = scoped.select({ at: deliveries.at }).from(deliveries).where(gt(deliveries.at, made)).all();
  expect(since.length).toBeGreaterThan(20);
  const trucks = scoped.select({ day: nextTrucks.day }).from(nextTrucks).all();
  expect(trucks).toHaveLength(18);
  for (const { day } of trucks) expect(day >= dayOf(now, 'America/Chicago')).toBe(true);
  for (const { day } of scoped.select({ day: requests.scheduledDay }).from(requests).where(eq(requests.state, 'scheduled')).all()) expect(day && day >= dayOf(now, 'America/Chicago')).toBe(true);
  expect(app.db.$client.pragma('foreign_key_check')).toEqual([]);
});

test('what was lived but not remembered is lived again alike', async () => {
  const count = () => ({
    readings: app.db.$client.prepare('select count(*) as n from reading').get(),
    deliveries: played.scoped.select({ at: deliveries.at }).from(deliveries).all().length,
    newest: app.db.select({ at: max(readings.at) }).from(readings).get(),
    sensors: played.scoped.select({ no: sensors.no }).from(sensors).all().length,
  });
  const known = kept(dataDir).get(puertoClaro.slug);
  if (!known) throw new Error('nothing was kept');
  const before = structuredClone(known);
  app.clock.now += DAY / 2;
  await catchUp(app.services, app.url, [{ ...played, ...known }]);
  const once = count();
  await catchUp(app.services, app.url, [{ ...played, ...before }]);
  expect(count()).toEqual(once);
});

test('what the door refused is not remembered', async () => {
  const known = kept(dataDir).get(puertoClaro.slug);
  if (!known) throw new Error('nothing was kept');
  const before = structuredClone(known.memory.at);
  app.clock.now += DAY / 24;
  await expect(catchUp(app.services, app.url, [{ ...played, ...known, key: 'a-key-that-nobody-was-given' }])).rejects.toThrow('401');
  expect(known.memory.at).toEqual(before);
});
