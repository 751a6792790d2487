import { afterAll, beforeAll, expect, test } from 'vitest';
import { alder, alderPeople } from '../cast';
import { idOf } from '../factories';
import { enterAs, faultsOf, openPortal, settled, type Portal } from './portal';

let portal: Portal;
beforeAll(async () => {
  portal = await openPortal();
});
afterAll(() => portal.close());

const at = `/${alder.slug}`;

test('an admin invites a manager of one store, who sees it and nothing else, and is out when deactivated', async () => {
  const admin = await portal.visit();
  await enterAs(admin, portal, alderPeople.admin);
  const { page } = admin;
  await page.goto(`${at}/people/invite`);
  await page.getByLabel('Email', { exact: true }).fill('nell@juniper.example');
  await page.getByLabel('Name', { exact: true }).fill('Nell Bright');
  await page.locator('select[name=language]').selectOption('en');
  await page.getByLabel('Role').selectOption('store-manager');
  await page.getByRole('button', { name: 'Send invitation' }).click();
  await page.getByText('Nothing is assigned').waitFor();
  await page.getByLabel(/Find a store/).fill('juniper');
  await page.getByRole('checkbox', { name: /juniper/ }).check();
  await page.getByRole('button', { name: 'Send invitation' }).click();
  await page.getByRole('heading', { level: 1, name: 'People' }).waitFor();
  await page.getByText('Nell Bright').first().waitFor();
  await settled(page);
  expect(await faultsOf(page)).toEqual([]);

  const nell = await portal.visit({ width: 390 });
  await enterAs(nell, portal, { email: 'nell@juniper.example' });
  await nell.page.goto('/');
  await nell.page.getByRole('heading', { level: 1, name: /juniper/ }).waitFor();
  const foreign = await nell.context.request.get(`/api/${alder.slug}/stores/${idOf(alder.namespace, 'lantern')}`);
  expect(foreign.status()).toBe(404);

  await page.goto(`${at}/people?q=nell`);
  await page.getByRole('link', { name: 'Change Nell Bright' }).click();
  await page.getByRole('button', { name: /^Deactivate/ }).click();
  await page.getByRole('dialog').getByRole('button', { name: /^Deactivate/ }).click();
  await page.getByRole('button', { name: /^Activate/ }).waitFor();
  expect((await nell.context.request.get(`/api/${alder.slug}/stores`)).status()).toBe(404);
  await nell.context.close();
  await admin.context.close();
});

test('a rep given another district sees its stores at once', async () => {
  const rep = await portal.visit();
  await enterAs(rep, portal, alderPeople.rep);
  await rep.page.goto(`${at}/stores`);
  await rep.page.getByRole('link', { name: /lantern/ }).waitFor();
  expect(await rep.page.getByRole('link', { name: /quarry/ }).count()).toBe(0);

  const admin = await portal.visit();
  await enterAs(admin, portal, alderPeople.admin);
  await admin.page.goto(`${at}/people/${idOf(alder.namespace, 'rep')}`);
  await admin.page.getByLabel(/north/).uncheck();
  await admin.page.getByLabel(/south/).check();
  await admin.page.getByRole('button', { name: 'Save' }).click();
  await admin.page.getByRole('heading', { level: 1, name: 'People' }).waitFor();

  await rep.page.reload();
  await rep.page.getByRole('link', { name: /quarry/ }).waitFor();
  expect(await rep.page.getByRole('link', { name: /lantern/ }).count()).toBe(0);
  await rep.context.close();
  await admin.context.close();
});
