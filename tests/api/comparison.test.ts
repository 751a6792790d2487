import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import type { ComparedStore } from '../../server/contract/comparison';
import { deliveries, freezerDays, freezers, installs, producerDb, requests, stores, type ProducerDb } from '../../server/db';
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
const asked = (who: AlderPerson, rest = '') => browserOf(server, alderPeople[who]).get(`/api/alder-ice/comparison${rest}`);
const compare = async (who: AlderPerson, rest = ''): Promise<ComparedStore[]> => (await asked(who, rest).expect(200)).body.stores;
const names = (rows: ComparedStore[]): string[] => rows.map(({ name }) => name.split(' ')[0] ?? '');
const lanternOf = async (who: AlderPerson): Promise<ComparedStore> => {
  const found = (await compare(who)).find((store) => store.id === id('lantern'));
  if (!found) throw new Error('lantern is not compared');
  return found;
};
const daySaid = (freezer: string, date: string, [outMinutes, warmMinutes, knownMinutes]: [number, number, number]) =>
  alderDb.insert(freezerDays, { id: `${id(freezer)} ${date}`, freezerId: id(freezer), storeId: alderDb.find(freezers, id(freezer))?.storeId ?? '', day: date, outMinutes, warmMinutes, knownMinutes });

/** A second freezer at lantern, with or without a sensor. */
function secondFreezer({ fitted }: { fitted: boolean }): void {
  const first = alderDb.find(freezers, id('lantern freezer'));
  if (!first) throw new Error('lantern has no freezer');
  const { producerId: _, ...copied } = first;
  alderDb.insert(freezers, { ...copied, id: id('second freezer'), assetNumber: 'A-2nd' });
  if (fitted) alderDb.insert(installs, { id: id('second install'), sensorId: id('juniper sensor'), freezerId: id('second freezer'), probesIn: [12], from: morning - 9 * day });
}

describe('the comparison', () => {
  test('takes of each day the worse freezer, and sums twenty-eight days', async () => {
    secondFreezer({ fitted: true });
    daySaid('lantern freezer', '2026-12-01', [60, 30, 540]);
    daySaid('second freezer', '2026-12-01', [300, 0, 540]);
    daySaid('lantern freezer', '2026-11-04', [420, 60, 1440]);
    daySaid('lantern freezer', '2026-11-03', [1440, 1440, 1440]);
    daySaid('juniper freezer', '2026-12-01', [1440, 1440, 1440]);
    const lantern = await lanternOf('agent');
    expect(lantern.outDays).toBeCloseTo((300 + 420) / 1440, 9);
    expect(lantern.warmHours).toBeCloseTo(1.5, 9);
    expect(lantern.known).toBeCloseTo((540 + 540 + 1440) / (2 * 28 * 1440), 9);
  });

  test('knows at most everything, and nothing without a sensor', async () => {
    for (let i = 4; i < 31; i += 1) daySaid('lantern freezer', `2026-11-${String(i).padStart(2, '0')}`, [0, 0, 1440]);
    secondFreezer({ fitted: false });
    for (let i = 4; i < 31; i += 1) daySaid('second freezer', `2026-11-${String(i).padStart(2, '0')}`, [0, 0, 1440]);
    expect((await lanternOf('agent')).known).toBe(1);
    alderDb.update(installs, id('lantern install'), { to: morning });
    expect((await lanternOf('agent')).known).toBe(0);
  });

  test('begins with the producer’s day twenty-seven days ago', async () => {
    const { body } = await asked('agent').expect(200);
    expect(body.since).toBe(Date.UTC(2026, 10, 4, 6));
  });

  test('counts what is open, what ended since, and the deliveries since', async () => {
    alderDb.update(requests, id('solved request'), { endedAt: Date.UTC(2026, 10, 4, 6) });
    alderDb.update(deliveries, id('lantern delivery 5'), { toldTo: morning - 5 * day - hour });
    alderDb.update(deliveries, id('lantern delivery 2'), { toldTo: morning - 2 * day });
    expect(await lanternOf('agent')).toMatchObject({ openRequests: 2, solvedRequests: 1, deliveries: 2, lateDeliveries: 1 });
    alderDb.update(requests, id('solved request'), { endedAt: Date.UTC(2026, 10, 4, 6) - 1 });
    alderDb.update(deliveries, id('lantern delivery 5'), { at: Date.UTC(2026, 10, 4, 6) - 1 });
    expect(await lanternOf('agent')).toMatchObject({ openRequests: 2, solvedRequests: 0, deliveries: 1, lateDeliveries: 0 });
  });

  test('counts only what its reader may see', async () => {
    alderDb.update(deliveries, id('lantern delivery 2'), { toldTo: morning - 3 * day });
    // Of lantern's requests one is the technician's; deliveries are not theirs to read.
    expect(await lanternOf('technician')).toMatchObject({ openRequests: 1, solvedRequests: 0, deliveries: 0, lateDeliveries: 0 });
    expect(await lanternOf('dispatcher')).toMatchObject({ openRequests: 2, solvedRequests: 1, deliveries: 2, lateDeliveries: 1 });
  });

  test.each<[AlderPerson, string[]]>([
    ['manager', ['lantern']],
    ['rep', ['juniper', 'lantern']],
    ['storeRep', ['campo', 'lantern']],
    ['agent', ['campo', 'juniper', 'lantern', 'quarry']],
  ])('shows %s %j', async (who, wanted) => {
    expect(names(await compare(who))).toEqual(wanted);
  });

  test('leaves retired stores out, and finds others by their words', async () => {
    expect(names(await compare('agent', '?q=corner'))).toEqual(['juniper', 'quarry']);
    alderDb.update(stores, id('quarry'), { retiredAt: morning });
    expect(names(await compare('agent', '?q=corner'))).toEqual(['juniper']);
  });

  test('comes in pages that join', async () => {
    const first = (await asked('agent', '?limit=3').expect(200)).body;
    const second = (await asked('agent', `?limit=3&after=${first.next}`).expect(200)).body;
    expect(names([...first.stores, ...second.stores])).toEqual(['campo', 'juniper', 'lantern', 'quarry']);
    expect(second.next).toBeNull();
  });
});

describe('the comparison as a file', () => {
  const file = async (who: AlderPerson, rest = '') => (await asked(who, `.csv${rest}`).expect(200)).text;

  test('is a table that spreadsheets open', async () => {
    const answer = await asked('agent', '.csv').expect(200);
    expect(answer.headers).toMatchObject({
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': 'attachment; filename="alder-ice-comparison-2026-12-01.csv"',
    });
    expect(answer.text).toMatch(/^\uFEFFStore,City,Account,Days out of ice,/);
    expect(answer.text.trimEnd().split('\r\n')).toHaveLength(5);
  });

  test('has its reader’s stores in their language', async () => {
    daySaid('lantern freezer', '2026-12-01', [720, 90, 540]);
    const [head, ...rows] = (await file('manager')).slice(1).trimEnd().split('\r\n');
    expect(head).toBe('Tienda,Ciudad,Cuenta,Días sin hielo,Horas con congelador tibio,Tiempo con lecturas (%),Solicitudes abiertas,Solicitudes resueltas,Entregas,Entregas tardías');
    expect(rows).toEqual(['lantern Quillfeather,Alder Gap Quillfeather,chain Quillfeather,0.5,1.5,1,2,1,2,0']);
  });

  test('keeps formulas from running and commas in their place', async () => {
    alderDb.update(stores, id('lantern'), { name: '=HYPERLINK("http://x.example","a")', city: '+1, Gap' });
    expect(await file('manager')).toContain(`"'=HYPERLINK(""http://x.example"",""a"")","'+1, Gap",chain Quillfeather,`);
  });

  test('holds the stores searched for', async () => {
    expect((await file('agent', '?q=unip')).trimEnd().split('\r\n').slice(1)).toEqual([expect.stringMatching(/^juniper/)]);
  });
});

test('days stay with the store where a freezer stood', async () => {
  daySaid('lantern freezer', '2026-11-20', [720, 0, 1440]);
  await browserOf(server, alderPeople.admin).patch(`/api/alder-ice/freezers/${id('lantern freezer')}`).send({ version: 1, storeId: id('juniper') }).expect(200);
  expect((await lanternOf('admin')).outDays).toBe(0.5);
  expect((await compare('admin')).find((store) => store.id === id('juniper'))?.outDays).toBe(0);
});
