import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import en from '../../locales/en/problems.json';
import es from '../../locales/es/problems.json';
import { alder, alderPeople, type Member } from '../cast';
import { idOf } from '../factories';
import { enterAs, faultsOf, openPortal, overflow, settled, type Portal } from './portal';

/** Every page in both languages, both themes and three widths: nothing for axe, nothing beyond the edge, no complaint. */
let portal: Portal;
beforeAll(async () => {
  portal = await openPortal();
});
afterAll(() => portal.close());

const id = (thing: string) => idOf(alder.namespace, thing);
const at = `/${alder.slug}`;
const store = `${at}/stores/${id('lantern')}`;
const freezer = `${at}/freezers/${id('lantern freezer')}`;
const { manager, managerOfThree, rep, storeRep, agent, dispatcher, driver, technician, admin } = alderPeople;

const pages: [name: string, person: Member | null, path: string][] = [
  ['sign-in', null, '/sign-in'],
  ['confirm', null, '/sign-in/confirm#token=x&next=%2F'],
  ['store page', manager, store],
  ['store page for dispatch', dispatcher, store],
  ['chooser of several stores', managerOfThree, `${at}/stores`],
  ['assigned stores', rep, `${at}/stores`],
  ['stores with today’s truck', driver, `${at}/stores?truck=today`],
  ['no store found', admin, `${at}/stores?q=zzzz`],
  ['report: what', manager, `${store}/report`],
  ['report: the rest', manager, `${store}/report?kind=leak&freezer=${id('lantern freezer')}`],
  ['ask for ice', manager, `${store}/ask-for-ice`],
  ['past deliveries', manager, `${store}/deliveries`],
  ['record a delivery', dispatcher, `${store}/deliveries/new`],
  ['set the next truck', dispatcher, `${store}/next-truck`],
  ['service queue', agent, `${at}/requests`],
  ['a request for staff', agent, `${at}/requests/${id('cold request')}`],
  ['a request for its store', manager, `${at}/requests/${id('cold request')}`],
  ['requests of a technician', technician, `${at}/requests?assignee=me`],
  ['nothing asked', admin, `${at}/requests?state=cancelled`],
  ['unclaimed sensors', admin, `${at}/sensors`],
  ['readings not believed', technician, `${at}/sensors/readings`],
  ['telemetry keys', admin, `${at}/sensors/keys`],
  ['freezers', dispatcher, `${at}/freezers`],
  ['freezers at risk, one beside', agent, `${at}/freezers?show=first&open=${id('lantern freezer')}`],
  ['no freezer found', technician, `${at}/freezers?q=zzzz`],
  ['freezers on the map', admin, `${at}/freezers?view=map`],
  ['a freezer', admin, freezer],
  ['a freezer for its rep', rep, freezer],
  ['a freezer for a technician', technician, freezer],
  ['new freezer', admin, `${store}/freezers/new`],
  ['change a freezer', admin, `${freezer}/change`],
  ['tie a sensor', technician, `${freezer}/sensor`],
  ['stores for an admin', admin, `${at}/stores?retired=only`],
  ['new store', admin, `${at}/stores/new`],
  ['change a store', admin, `${store}/change`],
  ['next trucks of many', dispatcher, `${at}/trucks`],
  ['late trucks', admin, `${at}/trucks?truck=late`],
  ['accounts', admin, `${at}/accounts`],
  ['accounts to read', agent, `${at}/accounts?q=zzzz`],
  ['new account', admin, `${at}/accounts/new`],
  ['an account', admin, `${at}/accounts/${id('chain')}`],
  ['change an account', admin, `${at}/accounts/${id('chain')}/change`],
  ['districts', admin, `${at}/accounts/districts`],
  ['products', admin, `${at}/accounts/products`],
  ['models', technician, `${at}/accounts/models`],
  ['comparison', rep, `${at}/comparison`],
  ['comparison for a chain', storeRep, `${at}/comparison?q=zzzz`],
  ['settings', admin, `${at}/settings`],
  ['people', admin, `${at}/people`],
  ['a person', admin, `${at}/people/${id('rep')}`],
  ['invite somebody', admin, `${at}/people/invite`],
  ['history of changes', admin, `${at}/changes`],
  ['profile', manager, '/profile'],
];

const looks = [
  { width: 320, dark: false },
  { width: 390, dark: true },
  { width: 1440, dark: false },
  { width: 1440, dark: true },
];

describe.each(['en', 'es'] as const)('in %s', (language) => {
  test.each(pages)('%s', async (_name, person, path) => {
    const visit = await portal.visit({ language });
    const { page, context, complaints } = visit;
    if (person) {
      await enterAs(visit, portal, person);
      await context.request.patch(`${portal.url}/api/me`, { data: { language }, headers: { origin: portal.url } });
    }
    await page.goto(path);
    await settled(page);
    expect(await page.locator('html').getAttribute('lang')).toBe(language);
    const title = await page.getByRole('heading', { level: 1 }).allInnerTexts();
    expect(title).toHaveLength(1);
    expect([en['not-found'].title, es['not-found'].title]).not.toContain(title[0]);
    for (const { width, dark } of looks) {
      await page.setViewportSize({ width, height: 900 });
      await page.emulateMedia({ colorScheme: dark ? 'dark' : 'light' });
      await settled(page);
      const where = `${width} px, ${dark ? 'dark' : 'light'}`;
      expect(await faultsOf(page), where).toEqual([]);
      expect(await overflow(page), where).toBe(0);
    }
    expect(complaints).toEqual([]);
    await context.close();
  });
});

test('an address that is nowhere, and one of somebody else, look alike', async () => {
  const visit = await portal.visit();
  await enterAs(visit, portal, alderPeople.otherManager);
  const texts: string[] = [];
  for (const path of [store, `${at}/stores/${idOf('nowhere', 'nothing')}`, '/birch-ice/stores', '/no-such-producer/stores']) {
    await visit.page.goto(path);
    await visit.page.getByRole('heading', { level: 1 }).waitFor();
    await settled(visit.page);
    expect(await faultsOf(visit.page)).toEqual([]);
    texts.push(await visit.page.getByRole('heading', { level: 1 }).innerText());
  }
  expect(new Set(texts).size).toBe(1);
  await visit.context.close();
});
