import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { freezerStates, producerDb, stores, type ProducerDb } from '../../server/db';
import { alderPeople, type AlderPerson } from '../cast';
import { hour, idOf, morning } from '../factories';
import { browserOf, testApp, type TestApp } from '../support/server';

let server: TestApp;
let alderDb: ProducerDb;
beforeEach(async () => {
  server = await testApp('alder-and-birch');
  alderDb = producerDb(server.db, idOf('alder-ice', 'producer'));
});
afterEach(() => server.close());

const id = (thing: string): string => idOf('alder', thing);
interface Listed {
  name: string;
  attention: string;
}
const asked = async (who: AlderPerson, query = ''): Promise<{ stores: Listed[]; next: string | null }> =>
  (await browserOf(server, alderPeople[who]).get(`/api/alder-ice/stores?${query}`).expect(200)).body;
const names = async (who: AlderPerson, query = ''): Promise<(string | undefined)[]> => (await asked(who, query)).stores.map(({ name }) => name.split(' ')[0]);

/** Lantern is warm, juniper runs out before any truck, campo needs nothing. */
function troubles(): void {
  alderDb.update(freezerStates, id('lantern freezer'), { warmSince: morning - hour });
  alderDb.update(freezerStates, id('juniper freezer'), { runOutLikely: morning + hour });
  alderDb.update(freezerStates, id('campo freezer'), { runOutLikely: null });
}

describe('a list of stores', () => {
  test('begins for somebody with assigned stores with what needs looking at', async () => {
    troubles();
    expect((await asked('managerOfThree')).stores.map(({ name, attention }) => [name.split(' ')[0], attention])).toEqual([
      ['lantern', 'warm'],
      ['juniper', 'runs-out-first'],
      ['campo', 'none'],
    ]);
    expect(await names('rep')).toEqual(['lantern', 'juniper']);
  });

  test('goes by name for everybody else', async () => {
    troubles();
    expect(await names('agent')).toEqual(['campo', 'juniper', 'lantern', 'quarry']);
  });

  test('joins its pages in that order, by name where the need is the same', async () => {
    alderDb.update(freezerStates, id('lantern freezer'), { warmSince: morning - hour });
    for (const store of ['juniper', 'campo']) alderDb.update(freezerStates, id(`${store} freezer`), { runOutLikely: null });
    const shown: Listed[] = [];
    let after = '';
    for (let pages = 0; pages < 5; pages += 1) {
      const page = await asked('managerOfThree', `limit=1${after}`);
      shown.push(...page.stores);
      if (!page.next) break;
      after = `&after=${page.next}`;
    }
    expect(shown.map(({ name }) => name.split(' ')[0])).toEqual(['lantern', 'campo', 'juniper']);
  });

  test('refuses the cursor of another order', async () => {
    const { next } = await asked('agent', 'limit=1');
    await browserOf(server, alderPeople.manager).get(`/api/alder-ice/stores?after=${String(next)}`).expect(400);
  });

  test.each([
    [`district=${id('north')}`, ['juniper', 'lantern']],
    [`account=${id('corner')}`, ['juniper', 'quarry']],
    [`district=${id('north')}&account=${id('corner')}`, ['juniper']],
    [`district=${idOf('birch', 'north')}`, []],
    ['q=corner', ['juniper', 'quarry']],
  ])('%s', async (query, wanted) => {
    expect(await names('agent', query)).toEqual(wanted);
  });

  test('shows retired stores alone to those who may bring them back, and to nobody else', async () => {
    alderDb.update(stores, id('juniper'), { retiredAt: morning });
    expect(await names('admin')).toEqual(['campo', 'lantern', 'quarry']);
    expect(await names('admin', 'retired=only')).toEqual(['juniper']);
    for (const who of ['agent', 'dispatcher', 'rep', 'otherManager'] as const) expect(await names(who, 'retired=only')).toEqual([]);
  });
});

test('a store’s page has its own phone for urgent matters, or none', async () => {
  const phone = async () => (await browserOf(server, alderPeople.manager).get(`/api/alder-ice/stores/${id('lantern')}`).expect(200)).body.store.urgentPhone;
  expect(await phone()).toBe('');
  alderDb.update(stores, id('lantern'), { urgentPhone: '555-0199' });
  expect(await phone()).toBe('555-0199');
});
