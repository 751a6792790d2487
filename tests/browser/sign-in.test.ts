import { afterAll, beforeAll, expect, test } from 'vitest';
import { linkMinutes } from '../../server/features/auth/magic-link';
import { alder, alderPeople } from '../cast';
import { idOf } from '../factories';
import { openPortal, settled, type Portal, type Visit } from './portal';

/** The ways in that are not the straight one. */
let portal: Portal;
beforeAll(async () => {
  portal = await openPortal();
});
afterAll(() => portal.close());

const request = `/${alder.slug}/requests/${idOf(alder.namespace, 'cold request')}`;
const { agent, otherManager } = alderPeople;

interface LocalMail {
  to: string;
  subject: string;
  links: string[];
}

/** Asks on the page and answers the mail that came for it. */
async function ask({ page }: Visit, email: string, from = '/'): Promise<{ link: string; code: string }> {
  const before = await mailsTo(email);
  await page.goto(from);
  await page.getByLabel('Email address').fill(email);
  await page.getByRole('button', { name: 'Email me a link' }).click();
  await page.getByRole('heading', { name: 'Check your email' }).waitFor();
  await expect.poll(async () => (await mailsTo(email)).length, { timeout: 10_000 }).toBe(before.length + 1);
  const [mail] = await mailsTo(email);
  return { link: mail?.links[0] ?? '', code: /\d{6}/.exec(mail?.subject ?? '')?.[0] ?? '' };
}

async function mailsTo(email: string): Promise<LocalMail[]> {
  const mails = (await (await fetch(`${portal.url}/dev/mail.json`)).json()) as LocalMail[];
  return mails.filter(({ to }) => to === email);
}

test('the link opens on the phone, which did not ask: the code of the same mail lets it in, and to where it was going', async () => {
  const desk = await portal.visit();
  const phone = await portal.visit({ width: 390 });
  const { link, code } = await ask(desk, agent.email, request);
  await phone.page.goto(link);
  await phone.page.getByRole('button', { name: 'Sign in' }).click();
  await phone.page.getByLabel(/six-digit code/i).fill(code);
  await phone.page.getByRole('button', { name: 'Sign in' }).click();
  await phone.page.getByRole('heading', { level: 1, name: 'Not cooling' }).waitFor();
  expect(new URL(phone.page.url()).pathname).toBe(request);
  await desk.context.close();
  await phone.context.close();
});

test('the code typed where it was asked for is enough', async () => {
  const desk = await portal.visit();
  const { code } = await ask(desk, otherManager.email);
  await desk.page.getByLabel(/six-digit code/i).fill(code);
  await desk.page.getByRole('button', { name: 'Sign in' }).click();
  await desk.page.getByRole('heading', { level: 1, name: /juniper/ }).waitFor();
  await settled(desk.page);
  expect(desk.complaints).toEqual([]);
  await desk.context.close();
});

test('a link that has ended offers a new one and keeps where the person was going', async () => {
  const desk = await portal.visit();
  const { link } = await ask(desk, agent.email, request);
  const { db, now } = portal.running.services;
  db.$client.prepare('update sign_in_link set expires_at = ? where used_at is null').run(now() - linkMinutes);
  await desk.page.goto(link);
  await desk.page.getByRole('button', { name: 'Sign in' }).click();
  await desk.page.getByRole('link', { name: /new link/i }).click();
  await desk.page.getByRole('heading', { name: 'Sign in', exact: true }).waitFor();
  const { code } = await ask(desk, agent.email, new URL(desk.page.url()).pathname + new URL(desk.page.url()).search);
  await desk.page.getByLabel(/six-digit code/i).fill(code);
  await desk.page.getByRole('button', { name: 'Sign in' }).click();
  await desk.page.getByRole('heading', { level: 1, name: 'Not cooling' }).waitFor();
  await desk.context.close();
});

test('a session ended from another device is over on the next page', async () => {
  const desk = await portal.visit();
  const other = await portal.visit();
  for (const visit of [desk, other]) {
    const { code } = await ask(visit, agent.email);
    await visit.page.getByLabel(/six-digit code/i).fill(code);
    await visit.page.getByRole('button', { name: 'Sign in' }).click();
    await visit.page.getByRole('heading', { level: 1, name: 'Service' }).waitFor();
  }
  await desk.page.goto('/profile');
  const ends = desk.page.getByRole('button', { name: /^End/ });
  await ends.first().waitFor();
  while ((await ends.count()) > 0) {
    const left = await ends.count();
    await ends.first().click();
    await expect.poll(() => ends.count()).toBe(left - 1);
  }
  await other.page.goto('/profile');
  await other.page.getByRole('heading', { name: 'Sign in', exact: true }).waitFor();
  await desk.page.reload();
  await desk.page.getByRole('heading', { level: 1, name: 'Profile' }).waitFor();
  await desk.context.close();
  await other.context.close();
});
