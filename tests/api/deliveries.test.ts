import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { alderPeople, type AlderPerson } from '../cast';
import { day, hour, idOf, morning } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
});
afterEach(() => server.close());

const id = (thing: string): string => idOf('alder', thing);
const as = (name: AlderPerson): Agent => browserOf(server, alderPeople[name]);
const typeOf = (body: { type?: string }): string | undefined => body.type?.replace('urn:nilas:problem:', '');
const truckOf = (store: string): string => `/api/alder-ice/stores/${id(store)}/next-truck`;
const deliveriesOf = (store: string): string => `/api/alder-ice/stores/${id(store)}/deliveries`;
const small = id('small bag');
const truck = (over: object = {}) => ({ day: '2026-12-03', from: '09:00', to: '10:30', load: [{ productId: small, bags: 30 }], version: null, ...over });

describe('the next truck', () => {
  test('is told in the store’s own time', async () => {
    const chicago = (await as('dispatcher').put(truckOf('juniper')).send(truck()).expect(200)).body;
    // 9:00 in Chicago in winter is 15:00 UTC, in Denver 16:00 UTC.
    expect(chicago).toMatchObject({ day: '2026-12-03', from: Date.UTC(2026, 11, 3, 15), to: Date.UTC(2026, 11, 3, 16, 30), version: morning });
    const denver = (await as('dispatcher').put(truckOf('campo')).send(truck({ version: 1 })).expect(200)).body;
    expect(denver.from).toBe(Date.UTC(2026, 11, 3, 16));
    const page = (await as('managerOfThree').get(`/api/alder-ice/stores/${id('juniper')}`).expect(200)).body;
    expect(page.nextTruck).toEqual(chicago);
  });

  test('holds each product once, and none of nothing', async () => {
    const load = [{ productId: small, bags: 10 }, { productId: small, bags: 5 }, { productId: id('large bag'), bags: 0 }];
    const { body } = await as('dispatcher').put(truckOf('juniper')).send(truck({ load })).expect(200);
    expect(body.load).toEqual([expect.objectContaining({ productId: small, bags: 15 })]);
  });

  test.each([
    [{ day: '2026-11-30' }, 422, 'day-past'],
    [{ from: '10:30', to: '10:30' }, 422, 'window-backwards'],
    [{ from: '10:30', to: '09:00' }, 422, 'window-backwards'],
    [{ load: [{ productId: idOf('birch', 'small bag'), bags: 1 }] }, 422, 'unknown-product'],
    [{ version: 1 }, 409, 'truck-changed'],
    [{ day: '2026-02-30' }, 400, 'bad-input'],
    [{ load: [{ productId: small, bags: -1 }] }, 400, 'bad-input'],
    [{ load: [{ productId: small, bags: 1.5 }] }, 400, 'bad-input'],
    [{ day: '9999-12-31' }, 200, undefined],
  ])('%j is answered %i %s', async (over, status, problem) => {
    const answer = await as('dispatcher').put(truckOf('juniper')).send(truck(over));
    expect([answer.status, typeOf(answer.body)]).toEqual([status, problem]);
  });

  test('of two dispatchers the one who looked at an older truck is told', async () => {
    const first = await as('dispatcher').put(truckOf('campo')).send(truck({ version: 1 })).expect(200);
    expect(first.body.version).toBe(2);
    await as('admin').put(truckOf('campo')).send(truck({ version: 1 })).expect(409);
  });

  test('can be taken away once', async () => {
    await as('dispatcher').delete(truckOf('campo')).expect(204);
    await as('dispatcher').delete(truckOf('campo')).expect(404);
  });

  test('through the night the clocks change', async () => {
    // On March 14, 2027 it is 2:00 for no moment in Chicago; the window still runs forward.
    const { body } = await as('dispatcher').put(truckOf('juniper')).send(truck({ day: '2027-03-14', from: '01:30', to: '03:30' })).expect(200);
    expect(body.to - body.from).toBe(hour);
  });
});

describe('a delivery', () => {
  const left = (over: object = {}) => ({ at: morning - hour, lines: [{ productId: small, bags: 20, takenBack: 2, lot: ' L-7 ', freezerId: id('lantern freezer') }], ...over });

  test('is recorded, and the truck that was told has come', async () => {
    server.clock.now = morning + 4 * hour;
    const { body } = await as('driver').post(deliveriesOf('lantern')).send(left({ at: morning + 3 * hour })).expect(201);
    expect(body).toMatchObject({ toldFrom: morning + 2 * hour, toldTo: morning + 3 * hour });
    expect(body.lines).toEqual([expect.objectContaining({ bags: 20, takenBack: 2, lot: 'L-7', bagPounds: 7 })]);
    const page = (await as('manager').get(`/api/alder-ice/stores/${id('lantern')}`).expect(200)).body;
    expect(page.nextTruck).toBeNull();
    expect(page.deliveries[0].id).toBe(body.id);
  });

  test('of yesterday leaves today’s truck as it is', async () => {
    await as('dispatcher').post(deliveriesOf('lantern')).send(left({ at: morning - day })).expect(201);
    expect((await as('manager').get(`/api/alder-ice/stores/${id('lantern')}`)).body.nextTruck).not.toBeNull();
  });

  test.each([
    [{ at: morning + 6 * 60_000 }, 422, 'time-ahead'],
    [{ lines: [{ productId: idOf('birch', 'small bag'), bags: 1 }] }, 422, 'unknown-product'],
    [{ lines: [{ productId: small, bags: 1, freezerId: id('juniper freezer') }] }, 422, 'freezer-elsewhere'],
    [{ lines: [] }, 400, 'bad-input'],
    [{ at: 1.5 }, 400, 'bad-input'],
    [{ lines: [{ productId: small, bags: 2001 }] }, 400, 'bad-input'],
  ])('%j is refused: %i %s', async (over, status, problem) => {
    const answer = await as('dispatcher').post(deliveriesOf('lantern')).send(left(over));
    expect([answer.status, typeOf(answer.body)]).toEqual([status, problem]);
  });

  test.each([Number.MIN_SAFE_INTEGER, -8.64e15, 0])('at %d is answered without failing', async (at) => {
    const answer = await as('dispatcher').post(deliveriesOf('lantern')).send(left({ at }));
    expect(answer.status).toBeLessThan(500);
    expect((await as('dispatcher').get(deliveriesOf('lantern'))).status).toBe(200);
  });

  test('pages join, youngest first', async () => {
    for (let i = 0; i < 5; i += 1) await as('dispatcher').post(deliveriesOf('quarry')).send(left({ at: morning - i * day, lines: [{ productId: small, bags: i + 1 }] })).expect(201);
    const found: number[] = [];
    let after = '';
    for (let pages = 0; pages < 9; pages += 1) {
      const { body } = await as('agent').get(`${deliveriesOf('quarry')}?limit=2${after}`).expect(200);
      found.push(...body.deliveries.map(({ lines }: { lines: { bags: number }[] }) => lines[0]?.bags));
      if (!body.next) break;
      after = `&after=${body.next}`;
    }
    expect(found).toEqual([1, 2, 3, 4, 5]);
  });
});

describe('stores', () => {
  interface Listed {
    name: string;
    attention: string;
    openRequests: number;
    nextTruck: object | null;
  }
  const list = async (who: Agent, query = ''): Promise<Listed[]> => (await who.get(`/api/alder-ice/stores?${query}`).expect(200)).body.stores;
  const names = async (who: Agent, query = '') => (await list(who, query)).map(({ name }) => name.split(' ')[0]);

  test.each<[AlderPerson, string[]]>([
    ['manager', ['lantern']],
    ['managerOfThree', ['campo', 'juniper', 'lantern']],
    ['rep', ['juniper', 'lantern']],
    ['storeRep', ['campo', 'lantern']],
    ['driver', ['lantern']],
    ['technician', ['lantern']],
    ['agent', ['campo', 'juniper', 'lantern', 'quarry']],
  ])('%s sees %j', async (name, wanted) => {
    expect(await names(as(name))).toEqual(wanted);
  });

  test.each([
    ['q=unip', ['juniper']],
    ['q=%25', []],
    ['q=Alder%20Gap', ['campo', 'juniper', 'lantern', 'quarry']],
    ['truck=today', ['lantern']],
    ['truck=none', ['juniper', 'quarry']],
    ['truck=late', []],
  ])('%s', async (query, wanted) => {
    expect(await names(as('agent'), query)).toEqual(wanted);
  });

  test('a truck past its window is late', async () => {
    server.clock.now = morning + 3 * hour + 1;
    expect(await names(as('agent'), 'truck=late')).toEqual(['lantern']);
  });

  test('tells how much is left of what can be held, and what is open', async () => {
    const [lantern] = await list(as('manager'));
    expect(lantern).toMatchObject({ pounds: 700, share: 700 / 1500, openRequests: 2, freezers: 1 });
  });

  test('pages join', async () => {
    const first = (await as('agent').get('/api/alder-ice/stores?limit=3').expect(200)).body;
    const second = (await as('agent').get(`/api/alder-ice/stores?limit=3&after=${first.next}`).expect(200)).body;
    expect([...first.stores, ...second.stores].map(({ name }: Listed) => name.split(' ')[0])).toEqual(['campo', 'juniper', 'lantern', 'quarry']);
    expect(second.next).toBeNull();
  });

  test('the page holds the store, its freezers, truck, requests and deliveries', async () => {
    const { body } = await as('manager').get(`/api/alder-ice/stores/${id('lantern')}`).expect(200);
    expect(body.freezers).toHaveLength(1);
    expect(body.freezers[0].sensor.probesIn).toEqual([12, 35, 58]);
    expect(body.requests.map(({ number }: { number: number }) => number)).toEqual([1005, 1001, 1003]);
    expect(body.deliveries).toHaveLength(2);
  });
});
