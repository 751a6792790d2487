import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { deliveries, deliveryLines, freezers, installs, producerDb, readings, requests, sensors, type ProducerDb } from '../../server/db';
import { alderPeople, type AlderPerson } from '../cast';
import { day, hour, idOf, morning } from '../factories';
import { browserOf, testApp, type TestApp } from '../support/server';

let server: TestApp;
let alderDb: ProducerDb;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
  alderDb = producerDb(server.db, idOf('alder-ice', 'producer'));
});
afterEach(() => server.close());

const id = (thing: string): string => idOf('alder', thing);
const pageOf = (freezer: string): string => `/api/alder-ice/freezers/${id(freezer)}`;
const asked = (who: AlderPerson, freezer = 'lantern freezer') => browserOf(server, alderPeople[who]).get(pageOf(freezer));
const read = async (who: AlderPerson, freezer?: string) => (await asked(who, freezer).expect(200)).body;
/** Alder's sensors are numbered from 1 in the order of the stores; lantern's is the first. */
const heard = (sensorNo: number, at: number, airC: number | null) => server.db.insert(readings).values({ sensorNo, at, probes: [0.5, 0.5, 0.5], airC }).run();

describe('the page of a freezer', () => {
  test('holds it, its store, truck, requests, deliveries and sensors', async () => {
    const page = await read('manager');
    expect(page.freezer).toMatchObject({ id: id('lantern freezer'), sensor: { probesIn: [12, 35, 58] } });
    expect(page.store).toMatchObject({ id: id('lantern'), timeZone: 'America/Chicago', account: expect.stringMatching(/^chain/), district: expect.stringMatching(/^north/) });
    expect(page.nextTruck).toMatchObject({ from: morning + 2 * hour });
    expect(page.requests.map(({ number }: { number: number }) => number)).toEqual([1005, 1001, 1003]);
    expect(page.deliveries.map(({ id: own }: { id: string }) => own)).toEqual([id('lantern delivery 2'), id('lantern delivery 5')]);
    expect(page.sensors).toEqual([{ serial: 'urn:dev:ow:alderlantern', from: morning - 150 * day, to: null }]);
  });

  test('leaves out what its reader may not see', async () => {
    const page = await read('technician');
    expect([page.nextTruck, page.deliveries]).toEqual([null, []]);
    // The one that is the technician's; the others of this freezer are not.
    expect(page.requests.map(({ number }: { number: number }) => number)).toEqual([1001]);
    await asked('otherManager').expect(404);
  });

  test('is not there once the freezer is retired', async () => {
    alderDb.update(freezers, id('lantern freezer'), { retiredAt: morning });
    await asked('admin').expect(404);
  });

  test('shows the last ten requests about this freezer alone', async () => {
    alderDb.update(requests, id('lantern sooner'), { freezerId: null });
    for (let i = 0; i < 12; i += 1) {
      const at = morning - i * hour;
      const filed = { storeId: id('lantern'), freezerId: id('lantern freezer'), kind: 'leak', words: '', language: 'en', state: 'closed' } as const;
      alderDb.insert(requests, { id: id(`more ${i}`), number: 2000 + i, ...filed, openedAt: at, changedAt: at, endedAt: at });
    }
    expect((await read('agent')).requests.map(({ number }: { number: number }) => number)).toEqual([2000, 2001, 2002, 2003, 2004, 2005, 2006, 2007, 2008, 2009]);
  });

  test('shows deliveries to this freezer or to none in particular', async () => {
    const { id: other, ...copied } = { ...alderDb.find(freezers, id('lantern freezer')), id: id('second freezer') };
    const { producerId: _, ...second } = { ...copied, assetNumber: 'A-2nd' };
    alderDb.insert(freezers, { id: other, ...second } as Parameters<typeof alderDb.insert<typeof freezers>>[1]);
    const left = (name: string, freezerIds: (string | null)[]) => {
      alderDb.insert(deliveries, { id: id(name), storeId: id('lantern'), at: morning, createdAt: morning });
      freezerIds.forEach((freezerId, i) => alderDb.insert(deliveryLines, { id: id(`${name} ${i}`), deliveryId: id(name), freezerId, productId: id('small bag'), bags: 1 }));
    };
    left('to both', [id('lantern freezer'), other]);
    left('to the second', [other]);
    left('to the store', [null]);
    const shown = (page: { deliveries: { id: string }[] }) => page.deliveries.map((one) => one.id).sort();
    const first = [id('to both'), id('to the store'), id('lantern delivery 2'), id('lantern delivery 5')];
    expect(shown(await read('manager'))).toEqual(first.sort());
    expect(shown(await read('manager', 'second freezer'))).toEqual([id('to both'), id('to the second'), id('to the store')].sort());
  });
});

describe('the air of a freezer', () => {
  test('is that of its sensors while they hung in it, in Fahrenheit, oldest first', async () => {
    alderDb.update(installs, id('lantern install'), { to: morning - day });
    alderDb.insert(sensors, { id: id('new sensor'), no: 50, serial: 'urn:dev:ow:new', createdAt: morning });
    alderDb.insert(installs, { id: id('new install'), sensorId: id('new sensor'), freezerId: id('lantern freezer'), probesIn: [12], from: morning - day });
    heard(1, morning - 5 * day, -20);
    heard(1, morning - 3 * day, -10);
    heard(1, morning - 2 * day, null);
    heard(1, morning - day, -30);
    heard(50, morning - day - hour, -30);
    heard(50, morning - day, 0);
    heard(50, morning, -5);
    heard(50, morning + hour, -30);
    const page = await read('manager');
    expect(page.air).toEqual([[morning - 3 * day, 14], [morning - day, 32], [morning, 23]]);
    expect(page.sensors.map(({ serial, to }: { serial: string; to: number | null }) => [serial, to])).toEqual([['urn:dev:ow:new', null], ['urn:dev:ow:alderlantern', morning - day]]);
  });

  test('is thinned to two hundred points that keep its warm moments', async () => {
    for (let i = 0; i < 4 * 24 * 12; i += 1) heard(1, morning - i * 300_000, i === 500 ? 10 : -10);
    const { air } = await read('manager');
    expect(air).toHaveLength(200);
    expect(air.filter(([, airF]: [number, number]) => airF === 50)).toEqual([[morning - 500 * 300_000, 50]]);
    expect(air.map(([at]: [number, number]) => at)).toEqual([...air.map(([at]: [number, number]) => at)].sort((a, b) => a - b));
  });

  test('of another producer’s freezer stays there', async () => {
    heard(101, morning - hour, -10);
    expect((await read('manager')).air).toEqual([]);
  });
});

describe('sensors found', () => {
  interface Found {
    serial: string;
    lastReadingAt: number | null;
    probes: number;
    freezer: { name: string; store: string } | null;
  }
  const find = async (words: string): Promise<Found[]> =>
    (await browserOf(server, alderPeople.technician).get('/api/alder-ice/sensors').query({ q: words }).expect(200)).body.sensors;

  test('are those whose serial contains the words, the unclaimed first', async () => {
    alderDb.insert(sensors, { id: id('stray'), no: 60, serial: 'urn:dev:ow:zzlanternstray', createdAt: morning });
    heard(60, morning - hour, -10);
    heard(60, morning - 2 * hour, -10);
    const found = await find('LANTERN');
    expect(found.map(({ serial }) => serial)).toEqual(['urn:dev:ow:zzlanternstray', 'urn:dev:ow:alderlantern']);
    expect(found[0]).toMatchObject({ lastReadingAt: morning - hour, probes: 3, freezer: null });
    expect(found[1]).toMatchObject({ lastReadingAt: null, probes: 0, freezer: { store: expect.stringMatching(/^lantern/) } });
  });

  test('are at most twenty, and none that only look alike', async () => {
    for (let i = 0; i < 25; i += 1) alderDb.insert(sensors, { id: id(`many ${i}`), no: 300 + i, serial: `urn:dev:ow:many${i}`, createdAt: morning });
    expect(await find('many')).toHaveLength(20);
    expect(await find('man%1')).toEqual([]);
    expect(await find('birch')).toEqual([]);
  });

  test('need words', async () => {
    await browserOf(server, alderPeople.technician).get('/api/alder-ice/sensors?q=').expect(400);
    await browserOf(server, alderPeople.manager).get('/api/alder-ice/sensors?q=a').expect(403);
  });
});
