import { afterAll, beforeAll, expect, test } from 'vitest';
import { alder, alderPeople } from '../cast';
import { morning } from '../factories';
import { enterAs, faultsOf, openPortal, settled, type Portal } from './portal';

let portal: Portal;
beforeAll(async () => {
  portal = await openPortal();
});
afterAll(() => portal.close());

const post = (key: string, serial: string) =>
  fetch(`${portal.url}/api/telemetry`, {
    method: 'POST',
    headers: { authorization: `Bearer ${key}`, 'content-type': 'application/senml+json' },
    body: JSON.stringify([{ bn: `${serial}:`, bt: morning / 1000, n: 'probe1', u: 'm', v: 0.8 }]),
  });

test('an admin makes a key, a new sensor speaks with it and is seen, and the ended key is refused', async () => {
  const admin = await portal.visit();
  await enterAs(admin, portal, alderPeople.admin);
  const { page } = admin;
  await page.goto(`/${alder.slug}/sensors/keys`);
  await page.getByRole('button', { name: 'Create a key' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('button', { name: 'Create key' }).click();
  await dialog.getByText('Fill this in.').first().waitFor();
  await dialog.getByLabel('Name').fill('North gateway');
  await dialog.getByRole('button', { name: 'Create key' }).click();
  await dialog.getByText('This key will not be shown again').waitFor();
  const key = await dialog.getByLabel('Key', { exact: true }).inputValue();
  await settled(page);
  expect(await faultsOf(page)).toEqual([]);
  await dialog.getByRole('button', { name: 'Done' }).click();

  const serial = 'urn:dev:os:32473-north-1';
  expect((await post(key, serial)).status).toBe(202);
  await page.goto(`/${alder.slug}/sensors`);
  await page.getByText(serial).waitFor();

  await page.goto(`/${alder.slug}/sensors/keys`);
  await page.getByRole('button', { name: 'End now: North gateway' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'End key' }).click();
  await page.getByText('North gateway has ended.').waitFor();
  expect((await post(key, serial)).status).toBe(401);
  expect(admin.complaints).toEqual([]);
  await admin.context.close();
});
