import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Page } from 'playwright-core';
import { senmlType } from '../../server/contract/telemetry';
import { alder, alderPeople } from '../cast';
import { idOf, telemetryKeyOf } from '../factories';
import { enterAs, faultsOf, openPortal, overflow, settled, type Portal } from './portal';

/** An admin's first day with a new customer, from the account to the manager who sees their store and nothing else. */
let portal: Portal;
beforeAll(async () => {
  portal = await openPortal();
});
afterAll(() => portal.close());

const at = `/${alder.slug}`;
const serial = 'urn:dev:ow:fresh-77';
const press = (page: Page, name: string) => page.getByRole('button', { name, exact: true }).click();
const follow = (page: Page, name: string) => page.getByRole('link', { name, exact: true }).first().click();
const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { level: 1, name }).waitFor();

/** One reading through the real door; half-full, cold. */
async function speak(minutesAgo: number): Promise<number> {
  const records = [0.7, 0.71, 0.69].map((v, i) => ({ n: `probe${i + 1}`, u: 'm', v }));
  const [first, ...others] = [...records, { n: 'air', u: 'Cel', v: -8 }];
  const body = JSON.stringify([{ bn: `${serial}:`, bt: portal.running.services.now() / 1000 - minutesAgo * 60, ...first }, ...others]);
  const headers = { authorization: `Bearer ${telemetryKeyOf(alder)}`, 'content-type': senmlType };
  return (await fetch(`${portal.url}/api/telemetry`, { method: 'POST', headers, body })).status;
}

test('account, district, store, freezer with two lanes, sensor, manager; the manager sees that store and nothing else', async () => {
  expect(await speak(40)).toBe(202);
  const admin = await portal.visit();
  await enterAs(admin, portal, alderPeople.admin);
  const { page } = admin;

  await page.goto(`${at}/accounts/new`);
  await page.getByLabel('Account number').fill('chain');
  await page.getByLabel('Name', { exact: true }).fill('Tamarack Stores');
  await page.getByLabel('Language').last().selectOption('en');
  await press(page, 'Add account');
  await page.getByText('This is already in use').first().waitFor();
  expect(await page.getByLabel('Name', { exact: true }).inputValue()).toBe('Tamarack Stores');
  await page.getByLabel('Account number').fill('7701');
  await press(page, 'Add account');
  await heading(page, /Tamarack Stores/);

  await page.goto(`${at}/accounts/districts`);
  await press(page, 'Add a district');
  await page.getByLabel('Name of the district').fill('Hill road');
  await press(page, 'Add');
  await page.getByText('Hill road').first().waitFor();

  await page.goto(`${at}/accounts?q=tamarack`);
  await follow(page, 'Tamarack Stores');
  await follow(page, 'Add a store');
  await heading(page, 'New store');
  await page.getByLabel('Name', { exact: true }).fill('Tamarack 1');
  await page.getByLabel('District').selectOption({ label: 'Hill road' });
  await page.getByLabel('Kind of store').selectOption('bait');
  await page.getByLabel('Street and number').fill('12 Ferry Road');
  await page.getByLabel('City').fill('Tern Point');
  await page.getByLabel('State', { exact: true }).fill('AR');
  await page.getByLabel('ZIP code').fill('72600');
  await page.getByLabel('Latitude').fill('36.1');
  await press(page, 'Add store');
  await page.getByText('Enter degrees').first().waitFor();
  expect(await page.getByLabel('Street and number').inputValue()).toBe('12 Ferry Road');
  await page.getByLabel('Longitude').fill('-93.2');
  await press(page, 'Add store');
  await heading(page, 'Tamarack 1');

  await follow(page, 'Add a freezer');
  await heading(page, 'New freezer');
  await page.getByLabel('Name', { exact: true }).fill('Dock freezer');
  await page.getByLabel('Asset number').fill('A-7701');
  await page.getByLabel('Model').selectOption({ index: 1 });
  await page.getByLabel('Placement').selectOption('outdoor');
  await page.getByLabel('Product').first().selectOption({ index: 1 });
  if ((await page.getByLabel('Product').count()) < 2) await press(page, 'Add a lane');
  await page.getByLabel('Product').nth(1).selectOption({ index: 2 });
  await page.getByLabel('Share in %').nth(0).fill('80');
  await page.getByLabel('Share in %').nth(1).fill('50');
  await page.getByLabel('Ceiling to sensor').fill('2');
  await page.getByLabel('Floor to rack').fill('4');
  await page.getByLabel('Kept free on top').fill('4');
  await press(page, 'Add freezer');
  await page.getByText('must add up to 100%').first().waitFor();
  await press(page, 'Even out');
  await press(page, 'Add freezer');
  await page.waitForURL(/\/freezers\/[0-9a-f-]{36}$/);
  await settled(page);

  await page.goto(`${page.url()}/sensor`);
  await page.getByRole('searchbox').fill('fresh-77');
  await page.getByRole('button', { name: new RegExp(serial) }).click();
  await page.getByRole('button', { name: /^Tie/ }).click();
  await page.waitForURL(/\/freezers\/[0-9a-f-]{36}$/);
  expect(await speak(-1)).toBe(202);
  await page.reload();
  await page.getByText(/lb/).first().waitFor();
  await settled(page);
  expect(await faultsOf(page)).toEqual([]);

  await page.goto(`${at}/people/invite`);
  await page.getByLabel('Email', { exact: true }).fill('wren@tamarack.example');
  await page.getByLabel('Name', { exact: true }).fill('Wren Olsen');
  await page.locator('select[name=language]').selectOption('en');
  await page.getByLabel('Role').selectOption('store-manager');
  await page.getByLabel(/Find a store/).fill('tamarack');
  await page.getByRole('checkbox', { name: /Tamarack 1/ }).check();
  await press(page, 'Send invitation');
  await heading(page, 'People');

  const wren = await portal.visit({ width: 390 });
  await enterAs(wren, portal, { email: 'wren@tamarack.example' });
  await wren.page.goto('/');
  await heading(wren.page, 'Tamarack 1');
  await settled(wren.page);
  expect(await overflow(wren.page)).toBe(0);
  expect(await faultsOf(wren.page)).toEqual([]);
  const asked = (path: string) => wren.context.request.get(`/api/${alder.slug}/${path}`);
  expect((await (await asked('stores')).json()).stores.map(({ name }: { name: string }) => name)).toEqual(['Tamarack 1']);
  expect((await (await asked('freezers')).json()).freezers.map(({ name }: { name: string }) => name)).toEqual(['Dock freezer']);
  expect((await asked(`stores/${idOf(alder.namespace, 'lantern')}`)).status()).toBe(404);
  expect([...admin.complaints, ...wren.complaints].filter((line) => !/40[0-9]|422/.test(line))).toEqual([]);
  await wren.context.close();
  await admin.context.close();
});

test('two admins edit one store: the later one is told, keeps what they typed, and can send it', async () => {
  const path = `${at}/stores/${idOf(alder.namespace, 'quarry')}/change`;
  const [first, second] = [await portal.visit(), await portal.visit()];
  for (const visit of [first, second]) {
    await enterAs(visit, portal, alderPeople.admin);
    await visit.page.goto(path);
    await heading(visit.page, 'Change store');
  }
  await first.page.getByLabel('Phone', { exact: true }).fill('555-0141');
  await press(first.page, 'Save store');
  await heading(first.page, /quarry/);

  await second.page.getByLabel('Notes for drivers').fill('Dog in the yard');
  await press(second.page, 'Save store');
  await second.page.getByText('Somebody else changed this in the meantime').first().waitFor();
  expect(await second.page.getByLabel('Notes for drivers').inputValue()).toBe('Dog in the yard');
  await press(second.page, 'Get the newest version');
  await second.page.getByText('555-0141').first().waitFor();
  await press(second.page, 'Save store');
  await heading(second.page, /quarry/);
  const { phone, driverNotes } = await (await second.context.request.get(`/api/${alder.slug}/stores/${idOf(alder.namespace, 'quarry')}/settings`)).json();
  expect([phone, driverNotes]).toEqual(['555-0141', 'Dog in the yard']);
  await Promise.all([first.context.close(), second.context.close()]);
});

test('nothing typed is lost by an ended session or a way back', async () => {
  const visit = await portal.visit();
  await enterAs(visit, portal, alderPeople.admin);
  const { page, context } = visit;
  await page.goto(`${at}/accounts`);
  await follow(page, 'New account');
  await heading(page, 'New account');
  await page.getByLabel('Account number').fill('8801');
  await page.getByLabel('Name', { exact: true }).fill('Weir Street Group');
  const cookies = await context.cookies();
  await context.clearCookies();
  await press(page, 'Add account');
  await page.getByText('You are signed out').first().waitFor();
  expect(await page.getByLabel('Name', { exact: true }).inputValue()).toBe('Weir Street Group');
  await context.addCookies(cookies);
  await page.goBack();
  await page.getByRole('dialog').getByText('Leave without sending?').waitFor();
  await press(page, 'Stay here');
  expect(await page.getByLabel('Name', { exact: true }).inputValue()).toBe('Weir Street Group');
  await press(page, 'Add account');
  await heading(page, /Weir Street Group/);
  await context.close();
});

test('an admin sees as a manager: their page, in their language, and nothing can be changed', async () => {
  const visit = await portal.visit();
  await enterAs(visit, portal, alderPeople.admin);
  const { page, context } = visit;
  await page.goto(`${at}/people/${idOf(alder.namespace, 'manager')}`);
  await page.getByRole('button', { name: /^See as/ }).click();
  await page.getByRole('dialog').getByRole('button', { name: /^See as/ }).click();
  await heading(page, /lantern/);
  expect(await page.locator('html').getAttribute('lang')).toBe('es');
  const banner = page.getByRole('region', { name: 'Ver como otra persona' });
  await banner.getByText(/Marta/).waitFor();
  await settled(page);
  expect(await faultsOf(page)).toEqual([]);
  const refused = await context.request.post(`/api/${alder.slug}/requests`, {
    data: { storeId: idOf(alder.namespace, 'lantern'), kind: 'light' },
    headers: { origin: portal.url },
  });
  expect(refused.status()).toBe(403);
  await banner.getByRole('button', { name: 'Terminar' }).click();
  await heading(page, /Marta/);
  expect(await page.locator('html').getAttribute('lang')).toBe('en');
  await context.close();
});
