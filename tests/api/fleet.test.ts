import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { parse } from 'csv-parse/sync';
import type { FleetRow } from '../../server/contract/fleet';
import { eq, fillFleetRows, freezers, freezerStates, nextTrucks, producerDb, writeFleetRows, type ProducerDb } from '../../server/db';
import { seeded } from '../../server/demo/random';
import { alder, alderPeople } from '../cast';
import { day, hour, idOf, morning } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';
import { stateOf } from '../states';

const id = (thing: string) => idOf(alder.namespace, thing);
const at = `/api/${alder.slug}`;
let bed: TestApp;
let own: ProducerDb;
let dispatcher: Agent;
beforeAll(async () => {
  bed = await testApp();
  own = producerDb(bed.db, idOf(alder.slug, 'producer'));
});
afterAll(() => bed.close());
beforeEach(() => {
  dispatcher = browserOf(bed, alderPeople.dispatcher);
});

const listed = async (query = '', agent = dispatcher): Promise<FleetRow[]> => (await agent.get(`${at}/freezers${query}`).expect(200)).body.freezers;
const storesOf = (rows: FleetRow[]) => rows.map(({ storeId }) => ['lantern', 'juniper', 'campo', 'quarry'].find((name) => id(name) === storeId));

/** Sets what a freezer's readings last said, as the pipeline would. */
function say(store: string, { likely, warmSince = null, heard = morning - hour / 2 }: { likely: number; warmSince?: number | null; heard?: number }): void {
  const state = stateOf(id, { at: heard, likely, products: ['small bag', 'large bag'] });
  const { early, late } = state.runOut;
  own.update(freezerStates, id(`${store} freezer`), { at: heard, warmSince, runOutEarly: early, runOutLikely: likely, runOutLate: late, state });
  writeFleetRows(own, { freezerId: id(`${store} freezer`) });
}

test('the soonest likely run-out comes first, whoever has no level last, and pages follow on', async () => {
  await bed.undone(async () => {
    say('lantern', { likely: morning + 3 * day });
    say('juniper', { likely: morning + day });
    say('campo', { likely: morning + 2 * day });
    own.delete(freezerStates, eq(freezerStates.id, id('quarry freezer')));
    writeFleetRows(own, { storeId: id('quarry') });
    expect(storesOf(await listed())).toEqual(['juniper', 'campo', 'lantern', 'quarry']);
    const seen: FleetRow[] = [];
    for (let after = ''; ; ) {
      const { body } = await dispatcher.get(`${at}/freezers?limit=1${after}`).expect(200);
      seen.push(...body.freezers);
      if (body.next === null) break;
      after = `&after=${body.next}`;
    }
    expect(storesOf(seen)).toEqual(['juniper', 'campo', 'lantern', 'quarry']);
  });
});

describe('what a list can be narrowed to', () => {
  test('at risk: before the truck to come, or soon where none comes', async () => {
    await bed.undone(async () => {
      // Lantern's truck comes in two hours, campo's in three days; juniper and quarry wait for none.
      say('lantern', { likely: morning + 3 * day });
      say('campo', { likely: morning + 3 * day + 20 * hour });
      say('juniper', { likely: morning + 47 * hour });
      say('quarry', { likely: morning + 49 * hour });
      expect(storesOf(await listed('?show=first'))).toEqual(['juniper', 'campo']);
      expect((await listed('?show=first')).map(({ riskAt }) => riskAt)).toEqual([morning + 23 * hour, morning + 2 * day + 20 * hour]);
      const { body } = await dispatcher.get(`${at}/freezer-digest`).expect(200);
      expect(body).toEqual({ all: 4, first: 2, warm: 0, silent: 0, unfitted: 0 });
    });
  });

  test('a truck past its window is no truck to come', async () => {
    await bed.undone(async () => {
      own.update(nextTrucks, id('lantern truck'), { from: morning - 3 * hour, to: morning - 2 * hour });
      say('lantern', { likely: morning + day });
      expect(storesOf(await listed('?show=first'))).toContain('lantern');
    });
  });

  test('warm and silent; a level older than a day is silent and nothing else', async () => {
    await bed.undone(async () => {
      say('lantern', { likely: morning + 9 * day, warmSince: morning - hour });
      say('juniper', { likely: morning + hour, warmSince: morning - 30 * hour, heard: morning - 25 * hour });
      expect(storesOf(await listed('?show=warm'))).toEqual(['lantern']);
      expect(storesOf(await listed('?show=silent'))).toEqual(['juniper']);
      expect(storesOf(await listed('?show=first'))).not.toContain('juniper');
    });
  });

  test('district, account and store', async () => {
    expect(new Set(storesOf(await listed(`?district=${id('north')}`)))).toEqual(new Set(['lantern', 'juniper']));
    expect(new Set(storesOf(await listed(`?account=${id('chain')}`)))).toEqual(new Set(['lantern', 'campo']));
    expect(storesOf(await listed(`?store=${id('quarry')}`))).toEqual(['quarry']);
  });

  test('words that begin so, in any order, without accents: name, street, account number, asset number, serial, telephone', async () => {
    for (const q of ['lantern', 'LANT', 'mai lant', 'lántern', '555-0123 lantern', 'urn:dev:ow:alderlantern', 'chain lantern']) {
      expect(storesOf(await listed(`?q=${encodeURIComponent(q)}`)), q).toEqual(['lantern']);
    }
    expect(storesOf(await listed('?q=a-3'))).toEqual(['quarry']);
    expect(await listed('?q=antern')).toEqual([]);
    expect(await listed('?q=lantern%20quarry')).toEqual([]);
    expect(await listed('?q=%22%20OR%20%2A')).toHaveLength(0);
    expect(await listed('?q=%20-%20')).toHaveLength(4);
  });
});

test('a renamed store is found by its new name and no longer by the old', async () => {
  await bed.undone(async () => {
    const admin = browserOf(bed, alderPeople.admin);
    await admin.patch(`${at}/stores/${id('lantern')}`).send({ version: 1, name: 'Öresund Kiosk' }).expect(200);
    expect((await listed('?q=oresund')).map(({ store }) => store)).toEqual(['Öresund Kiosk']);
    expect(storesOf(await listed('?q=lantern%20quillfeather'))).not.toContain('lantern');
  });
});

test('a search that finds many looks through the rows, one that finds few asks the index, and both find alike', async () => {
  await bed.undone(async () => {
    const random = seeded('search');
    const [{ body: settings }] = [await browserOf(bed, alderPeople.admin).get(`${at}/freezers/${id('quarry freezer')}/settings`).expect(200)];
    const syllables = ['ba', 'bar', 'kö', 'lo', '7', 'ñan'];
    const names = Array.from({ length: 1300 }, () => `común ${[1, 2].map(() => [1, 2].map(() => random.pick(syllables)).join('')).join(' ')}`);
    const { modelId, storeId, placement, mount } = settings;
    names.forEach((name, i) => own.insert(freezers, { id: id(`one of many ${i}`), storeId, modelId, assetNumber: `many-${i}`, name, placement, ...mount, createdAt: morning }));
    fillFleetRows(own);
    const plain = (text: string) => text.normalize('NFD').replace(/[\u0300-\u036f]/g, '');
    for (const words of ['comun', 'comun ba', 'bar', 'ko lo', 'ñan comun', 'comun 7ba', 'comun ba bar']) {
      const wanted = names.filter((name) => plain(words).split(' ').every((word) => plain(name).split(' ').some((one) => one.startsWith(word))));
      const { body } = await dispatcher.get(`${at}/freezer-digest?q=${encodeURIComponent(words)}`).expect(200);
      expect(body.all, words).toBe(wanted.length);
      if (words === 'comun') expect(wanted.length).toBeGreaterThan(1000);
    }
  });
});

test('a rep and a manager see their own, whatever they ask for', async () => {
  expect(new Set(storesOf(await listed('', browserOf(bed, alderPeople.rep))))).toEqual(new Set(['lantern', 'juniper']));
  expect(storesOf(await listed(`?district=${id('south')}`, browserOf(bed, alderPeople.rep)))).toEqual([]);
  expect(storesOf(await listed('', browserOf(bed, alderPeople.manager)))).toEqual(['lantern']);
  const { body } = await browserOf(bed, alderPeople.manager).get(`${at}/freezer-digest`).expect(200);
  expect(body.all).toBe(1);
});

test('a technician is told of their stores, and nothing of trucks', async () => {
  await bed.undone(async () => {
    const technician = browserOf(bed, alderPeople.technician);
    const body = async (path: string, agent: Agent) => (await agent.get(`${at}/${path}`).expect(200)).body;
    const fileOf = async (agent: Agent): Promise<string[][]> => parse((await agent.get(`${at}/freezers.csv?store=${id('lantern')}`).expect(200)).text, { bom: true });
    // Before its truck, and yet in three days.
    own.update(nextTrucks, id('lantern truck'), { from: morning + 4 * day, to: morning + 4 * day + hour });
    say('lantern', { likely: morning + 3 * day });
    expect((await listed(`?store=${id('lantern')}`))[0]).toMatchObject({ truck: { from: morning + 4 * day }, riskAt: expect.any(Number) });
    expect(storesOf(await listed('?show=first'))).toContain('lantern');

    const told = await listed('', technician);
    expect(storesOf(told)).toEqual(['lantern']);
    expect(told[0]).toMatchObject({ truck: null, riskAt: null, likely: morning + 3 * day });
    expect(await listed('?show=first', technician)).toEqual([]);
    expect((await body('freezer-digest', technician)).first).toBe(0);
    expect((await body('freezer-map', technician)).stores[0].mark).toBe('fine');
    const heads = (await fileOf(technician))[0];
    expect(heads?.filter((head) => head.includes('amión'))).toEqual([]);
    expect((await fileOf(dispatcher))[0]).toContain('Next truck from');

    // Within two days, and yet after its truck.
    own.update(nextTrucks, id('lantern truck'), { from: morning + hour, to: morning + 2 * hour });
    say('lantern', { likely: morning + 2 * day - 1 });
    expect(storesOf(await listed('?show=first'))).not.toContain('lantern');
    expect(storesOf(await listed('?show=first', technician))).toEqual(['lantern']);
    expect((await body('freezer-digest', technician)).first).toBe(1);
    expect((await body('freezer-map', technician)).stores[0].mark).toBe('first');
    expect((await fileOf(technician))[1]).toContain('Se acaba pronto');
  });
});

test('the map says the same by store, the worst first', async () => {
  await bed.undone(async () => {
    say('lantern', { likely: morning + 9 * day });
    say('juniper', { likely: morning + day });
    say('quarry', { likely: morning + 9 * day, warmSince: morning - hour });
    const { body } = await dispatcher.get(`${at}/freezer-map`).expect(200);
    expect(body.stores.map(({ id: store, mark }: { id: string; mark: string }) => [store, mark])).toEqual([
      [id('quarry'), 'warm'],
      [id('juniper'), 'first'],
      [id('campo'), 'first'],
      [id('lantern'), 'fine'],
    ]);
  });
});

test('the file holds what is shown, in the reader’s language, and no formula', async () => {
  await bed.undone(async () => {
    const admin = browserOf(bed, alderPeople.admin);
    await admin.patch(`${at}/stores/${id('juniper')}`).send({ version: 1, name: '=HYPERLINK("x")' }).expect(200);
    const { text, headers } = await dispatcher.get(`${at}/freezers.csv?district=${id('north')}&columns=state,asset`).expect(200);
    expect(headers['content-type']).toContain('text/csv');
    const rows: string[][] = parse(text, { bom: true });
    expect(rows[0]).toEqual(['Store', 'City', 'Freezer', 'Time zone', 'State', 'Asset number']);
    expect(rows).toHaveLength(3);
    expect(rows.slice(1).map(([store]) => store)).toContain(`'=HYPERLINK("x")`);
    const spanish = await browserOf(bed, alderPeople.technician).get(`${at}/freezers.csv`).expect(200);
    expect(spanish.text.split('\r\n')[0]).toContain('Tienda,Ciudad,Congelador');
  });
});
