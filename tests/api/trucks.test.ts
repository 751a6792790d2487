import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { auditEntries, fleetRows, freezerStates, installs, nextTruckLoads, producerDb, stores, type ProducerDb } from '../../server/db';
import { alderPeople, type AlderPerson } from '../cast';
import { day, hour, idOf, morning } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
let alderDb: ProducerDb;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
  alderDb = producerDb(server.db, idOf('alder-ice', 'producer'));
});
afterEach(() => server.close());

const id = (thing: string): string => idOf('alder', thing);
const as = (name: AlderPerson): Agent => browserOf(server, alderPeople[name]);
const at = '/api/alder-ice/next-trucks';

interface Row {
  store: { id: string; name: string };
  truck: { day: string; version: number } | null;
  usual: { day: string; from: string; to: string } | null;
  runOutLikely: number | null;
}
const list = async (query = ''): Promise<Row[]> => (await as('dispatcher').get(`${at}?${query}`).expect(200)).body.rows;
const names = (rows: Row[]): string[] => rows.map(({ store }) => store.name.split(' ')[0] ?? '');
const storeOf = async (store: string): Promise<Row> => {
  const found = (await list()).find((row) => row.store.id === id(store));
  if (!found) throw new Error(`${store} is not listed`);
  return found;
};

describe('next trucks', () => {
  test('are those who may set them', async () => {
    for (const who of ['manager', 'rep', 'agent', 'driver', 'technician'] as const) await as(who).get(at).expect(403);
    await as('admin').get(at).expect(200);
  });

  test('are listed by store with the truck told and the usual one', async () => {
    const rows = await list();
    expect(names(rows)).toEqual(['campo', 'juniper', 'lantern', 'quarry']);
    // Tuesdays and Thursdays, 7:00 to 11:00; it is Tuesday, 9:00 in Chicago.
    expect(rows[1]).toEqual({
      store: expect.objectContaining({ id: id('juniper'), timeZone: 'America/Chicago' }),
      truck: null,
      usual: { day: '2026-12-01', from: '07:00', to: '11:00' },
      runOutLikely: morning + 3 * day,
    });
    expect(rows[2]?.truck).toEqual({ day: '2026-12-01', from: morning + 2 * hour, to: morning + 3 * hour, version: 1 });
  });

  test('leave the usual one out where a store has no days', async () => {
    alderDb.update(stores, id('juniper'), { deliveryDays: [] });
    expect((await storeOf('juniper')).usual).toBeNull();
  });

  test('go by the first freezer to be empty, of those that are heard', async () => {
    alderDb.update(freezerStates, id('juniper freezer'), { runOutLikely: morning + hour });
    expect((await storeOf('juniper')).runOutLikely).toBe(morning + hour);
    alderDb.update(installs, id('juniper install'), { to: morning });
    expect((await storeOf('juniper')).runOutLikely).toBeNull();
  });

  test.each([
    ['q=unip', ['juniper']],
    ['q=corner', ['juniper', 'quarry']],
    [`district=${id('south')}`, ['campo', 'quarry']],
    [`account=${id('chain')}`, ['campo', 'lantern']],
    [`account=${id('chain')}&district=${id('south')}`, ['campo']],
    [`district=${idOf('birch', 'south')}`, []],
    ['truck=today', ['lantern']],
    ['truck=none', ['juniper', 'quarry']],
    ['truck=late', []],
  ])('%s', async (query, wanted) => {
    expect(names(await list(query))).toEqual(wanted);
  });

  test('of retired stores are not listed', async () => {
    alderDb.update(stores, id('campo'), { retiredAt: morning });
    expect(names(await list())).toEqual(['juniper', 'lantern', 'quarry']);
  });

  test('come in pages that join', async () => {
    const first = (await as('dispatcher').get(`${at}?limit=3`).expect(200)).body;
    const second = (await as('dispatcher').get(`${at}?limit=3&after=${first.next}`).expect(200)).body;
    expect(names([...first.rows, ...second.rows])).toEqual(['campo', 'juniper', 'lantern', 'quarry']);
    expect(second.next).toBeNull();
  });
});

describe('telling many stores', () => {
  const truck = (store: string, over: object = {}) => ({ storeId: id(store), day: '2026-12-03', from: '09:00', to: '10:30', version: null, ...over });
  const tell = async (trucks: object[]) => (await as('dispatcher').put(at).send({ trucks }).expect(200)).body;
  const told = () => alderDb.select({ act: auditEntries.act, subject: auditEntries.subject }).from(auditEntries).all().filter(({ act }) => act === 'set-next-trucks');

  test('sets each in its own time, leaves the load as it was, and says so in the trail', async () => {
    const answer = await tell([truck('juniper'), truck('campo', { version: 1 })]);
    expect(answer).toEqual({ set: [id('juniper'), id('campo')], refused: [] });
    expect((await storeOf('juniper')).truck).toEqual({ day: '2026-12-03', from: Date.UTC(2026, 11, 3, 15), to: Date.UTC(2026, 11, 3, 16, 30), version: morning });
    expect((await storeOf('campo')).truck).toEqual({ day: '2026-12-03', from: Date.UTC(2026, 11, 3, 16), to: Date.UTC(2026, 11, 3, 17, 30), version: 2 });
    expect(alderDb.find(nextTruckLoads, id('campo load'))).toMatchObject({ bags: 40 });
    expect(told()).toEqual([{ act: 'set-next-trucks', subject: 'NextTruck' }, { act: 'set-next-trucks', subject: 'NextTruck' }]);
  });

  test('shows in the list of freezers, until the truck has come or is taken away', async () => {
    const truckFrom = () => alderDb.find(fleetRows, id('juniper freezer'))?.truckFrom;
    await tell([truck('juniper')]);
    expect(truckFrom()).toBe(Date.UTC(2026, 11, 3, 15));
    await as('dispatcher').delete(`/api/alder-ice/stores/${id('juniper')}/next-truck`).expect(204);
    expect(truckFrom()).toBeNull();
    await tell([truck('juniper', { day: '2026-12-01' })]);
    expect(truckFrom()).toBe(morning);
    const came = { at: morning, lines: [{ productId: id('small bag'), bags: 1 }] };
    await as('dispatcher').post(`/api/alder-ice/stores/${id('juniper')}/deliveries`).send(came).expect(201);
    expect(truckFrom()).toBeNull();
  });

  test('refuses some and tells the others', async () => {
    alderDb.update(stores, id('quarry'), { retiredAt: morning });
    const answer = await tell([
      truck('juniper'),
      { ...truck('lantern'), storeId: idOf('birch', 'lantern') },
      truck('quarry'),
      truck('campo', { day: '2026-11-30', version: 1 }),
      truck('lantern'),
    ]);
    expect(answer.set).toEqual([id('juniper')]);
    expect(answer.refused).toEqual([
      { storeId: idOf('birch', 'lantern'), problem: 'not-found' },
      { storeId: id('quarry'), problem: 'not-found' },
      { storeId: id('campo'), problem: 'day-past' },
      { storeId: id('lantern'), problem: 'truck-changed' },
    ]);
    expect((await storeOf('lantern')).truck?.version).toBe(1);
    expect(told()).toHaveLength(1);
  });

  test('is no act where every one is refused', async () => {
    const answer = await tell([truck('juniper', { from: '10:30', to: '10:30' }), truck('campo', { version: 7 })]);
    expect(answer).toEqual({
      set: [],
      refused: [
        { storeId: id('juniper'), problem: 'window-backwards' },
        { storeId: id('campo'), problem: 'truck-changed' },
      ],
    });
    expect(told()).toEqual([]);
  });

  test('takes the first of two words about one store', async () => {
    const answer = await tell([truck('juniper'), truck('juniper', { from: '08:00' })]);
    expect(answer).toEqual({ set: [id('juniper')], refused: [{ storeId: id('juniper'), problem: 'truck-changed' }] });
    expect((await storeOf('juniper')).truck).toMatchObject({ from: Date.UTC(2026, 11, 3, 15), version: morning });
  });

  test('is for those who may, with at least one store', async () => {
    await as('agent').put(at).send({ trucks: [truck('juniper')] }).expect(403);
    await as('dispatcher').put(at).send({ trucks: [] }).expect(400);
  });
});
