import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { alder, alderPeople, birchPeople, type Member } from '../cast';
import { idOf, morning, serialOf, telemetryKeyOf } from '../factories';
import { enterAs, faultsOf, openPortal, overflow, settled, type Portal, type Visit } from './portal';

/** From a sensor's reading to the store manager's phone, and from her words to the people who fix it. */
let portal: Portal;
beforeAll(async () => {
  portal = await openPortal();
});
afterAll(() => portal.close());

const storeId = idOf(alder.namespace, 'lantern');
const words = 'El congelador hace ruido y no enfría desde anoche.';
const answer = 'Gracias. Va un técnico mañana. Mientras tanto, deje la puerta cerrada.';

/*
 * By hand. Lantern's freezer is 70 in wide and 60 in high, rated 1,500 lb, channel drop 2 in, rack 4 in, headroom 4 in:
 * a full stack is 60 − 2 − 4 − 4 = 50 in, and the rack lies 60 − 2 − 4 = 54 in below the probes. Two lanes share the
 * width, so each holds 750 lb, 15 lb an inch.
 * Probe 1 (12 in from the left, 7 lb lane) reads 24 in: 30 in of bags, 450 lb, 64 whole bags of 7 lb.
 * Probe 2 hangs at the boundary and tells little of either.
 * Probe 3 (58 in, 20 lb lane) reads 44 in: 10 in of bags, 150 lb, 7 whole bags of 20 lb.
 * Together 600 lb of 1,500: 40 %.
 */
const inch = 0.0254;
const pack = [
  { bn: `${serialOf(alder, 'lantern')}:`, bt: morning / 1000 - 60, n: 'probe1', u: 'm', v: 24 * inch },
  { n: 'probe2', u: 'm', v: 24 * inch },
  { n: 'probe3', u: 'm', v: 44 * inch },
  { n: 'air', u: 'Cel', v: -8 },
];

async function postPack() {
  const response = await fetch(`${portal.url}/api/telemetry`, {
    method: 'POST',
    headers: { authorization: `Bearer ${telemetryKeyOf(alder)}`, 'content-type': 'application/senml+json' },
    body: JSON.stringify(pack),
  });
  expect(response.status).toBe(202);
  expect(await response.json()).toMatchObject({ accepted: 1, duplicate: 0, quarantined: 0 });
}

/** By the mail, as a person does it. */
async function signInByMail(visit: Visit, { email }: Member) {
  const { page } = visit;
  const old = await linksTo(email);
  await page.goto('/');
  await page.getByLabel('Correo electrónico').fill(email);
  await page.getByRole('button', { name: 'Mandarme el correo' }).click();
  await page.getByRole('heading', { name: 'Revise su correo' }).waitFor();
  await expect.poll(async () => (await linksTo(email)).length, { timeout: 10_000 }).toBe(old.length + 1);
  const [link = ''] = await linksTo(email);
  for (let i = 0; i < 5; i += 1) await fetch(link);
  await page.goto(link);
  await page.getByRole('button', { name: 'Entrar' }).click();
  await page.getByRole('heading', { level: 1, name: /lantern/ }).waitFor();
}

/** Newest first. */
async function linksTo(email: string): Promise<string[]> {
  const mails = (await (await fetch(`${portal.url}/dev/mail.json`)).json()) as { to: string; subject: string; links: string[] }[];
  return mails.filter((mail) => mail.to === email && /Nilas/.test(mail.subject)).map(({ links }) => links[0] ?? '');
}

/** The link in the mail that says it is scheduled, in her language. */
async function newsOf(number: string): Promise<string> {
  const find = async () => {
    const mails = (await (await fetch(`${portal.url}/dev/mail.json`)).json()) as { to: string; subject: string; links: string[] }[];
    return mails.find(({ to, subject }) => to === alderPeople.manager.email && subject.startsWith(`${number}: programada para el miércoles`));
  };
  await expect.poll(find, { timeout: 10_000 }).toBeDefined();
  return (await find())?.links[0] ?? '';
}

const photo = () =>
  sharp({ create: { width: 640, height: 480, channels: 3, background: '#88aabb' } })
    .withExif({ IFD0: { Copyright: 'nobody' } })
    .jpeg()
    .toBuffer();

async function sound({ page, complaints }: Visit) {
  await settled(page);
  expect(await faultsOf(page)).toEqual([]);
  expect(await overflow(page)).toBe(0);
  expect(complaints).toEqual([]);
}

describe.each([390, 1440] as const)('the main job at %i px', (width) => {
  test('reading → page → request with a photo → answer → seen', async () => {
    if (width === 390) await postPack();
    const manager = await portal.visit({ width, language: 'es' });
    const { page } = manager;

    await signInByMail(manager, alderPeople.manager);
    const main = page.getByRole('main');
    await main.getByText('600 lb').first().waitFor();
    await main.getByText('40%').first().waitFor();
    await expect.poll(() => main.getByText(/\b64\b/).count()).toBeGreaterThan(0);
    await expect.poll(() => main.getByText(/\b7 bolsas/).count()).toBeGreaterThan(0);
    await sound(manager);

    await page.getByRole('link', { name: /Reportar/ }).first().click();
    await page.getByRole('heading', { name: '¿Qué pasa?' }).waitFor();
    await page.getByRole('main').getByRole('link', { name: /^No enfría/ }).click();
    await page.getByText('En sus palabras').waitFor();
    await sound(manager);
    await page.getByLabel(/En sus palabras/).fill(words);
    await page.locator('input[type=file]').first().setInputFiles({ name: 'congelador.jpg', mimeType: 'image/jpeg', buffer: await photo() });
    await page.getByRole('button', { name: 'Enviar', exact: true }).click();
    await page.getByText('La foto va incluida.').waitFor();
    await sound(manager);
    const number = /SR-\d+/.exec(await page.getByRole('heading', { name: /SR-\d+/ }).innerText())?.[0] ?? 'none';

    const agent = await portal.visit({ width: 1440 });
    await enterAs(agent, portal, alderPeople.agent);
    await agent.page.goto(`/${alder.slug}/requests?q=${number}`);
    await agent.page.getByRole('link', { name: /Not cooling/ }).first().click();
    await agent.page.getByText(words).first().waitFor();
    await agent.page.getByRole('button', { name: /Photo 1 of 1/ }).click();
    const large = agent.page.getByRole('dialog').getByRole('img');
    await expect.poll(() => large.evaluate((img) => img instanceof HTMLImageElement && img.naturalWidth)).toBe(640);
    await agent.page.keyboard.press('Escape');
    await agent.page.getByLabel('Reply in Spanish').fill(answer);
    await agent.page.getByRole('button', { name: 'Send reply' }).click();
    await agent.page.getByText(answer).first().waitFor();
    await agent.page.getByLabel('State', { exact: true }).last().selectOption('scheduled');
    await agent.page.getByLabel('Day of the visit').fill('2026-12-02');
    await agent.page.getByRole('button', { name: 'Save', exact: true }).click();
    await agent.page.getByText(/Scheduled Wed Dec 2/).first().waitFor();
    await sound(agent);

    await page.goto(await newsOf(number));
    await page.getByText(answer).first().waitFor();
    await page.getByText(/Programada mié 2 dic/).first().waitFor();
    await sound(manager);
    await manager.context.close();
    await agent.context.close();

    await seenByNobodyElse(number);
  });
});

/** Another store's manager and another producer's agent: their pages do not name it, and its address is nowhere. */
async function seenByNobodyElse(number: string) {
  const ids = await requestIds();
  for (const { person, slug } of [
    { person: alderPeople.otherManager, slug: alder.slug },
    { person: birchPeople.strangerAgent, slug: 'birch-ice' },
  ]) {
    const stranger = await portal.visit();
    await enterAs(stranger, portal, person);
    await stranger.page.goto(`/${slug}/requests?state=any`);
    await settled(stranger.page);
    expect(await stranger.page.getByRole('main').innerText()).not.toContain(number);
    for (const id of ids) {
      const response = await stranger.context.request.get(`/api/${alder.slug}/requests/${id}`);
      expect(response.status()).toBe(404);
    }
    const response = await stranger.context.request.get(`/api/${alder.slug}/stores/${storeId}`);
    expect(response.status()).toBe(404);
    await stranger.context.close();
  }
}

async function requestIds(): Promise<string[]> {
  const agent = await portal.visit();
  await enterAs(agent, portal, alderPeople.agent);
  const response = await agent.context.request.get(`/api/${alder.slug}/requests?kind=not-cooling`);
  const { requests } = (await response.json()) as { requests: { id: string; store: string }[] };
  await agent.context.close();
  return requests.map(({ id }) => id);
}
