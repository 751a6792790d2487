import { readFileSync } from 'node:fs';
import path from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Language } from '../../server/contract/words';
import { alder, alderPeople, type Member } from '../cast';
import { idOf } from '../factories';
import { enterAs, openPortal, settled, type Portal, type Visit } from './portal';

/** Every field's bad input is said in words at the field, in both languages; nothing typed is lost and nothing is sent by halves. */
let portal: Portal;
const visits = new Map<string, Visit>();
beforeAll(async () => {
  portal = await openPortal();
});
afterAll(() => portal.close());

const id = (thing: string) => idOf(alder.namespace, thing);
const at = `/${alder.slug}`;
const store = `${at}/stores/${id('lantern')}`;
const freezer = `${at}/freezers/${id('lantern freezer')}`;
const { admin, dispatcher, technician } = alderPeople;

/** One thing entered: a button by the key of its words, or a control by its name in the body (or a selector) and what goes in. */
type Step = [button: `${string}:${string}`] | [control: string, value: string];

interface Case {
  person: Member;
  at: string;
  enter: Step[];
  /** A control of the form to be sent, where the page has several. */
  form?: string;
  /** Said at the fields, from top to bottom: keys of validation.json, or of another file where it says which. */
  said: string[];
  /** What only the server can know, said once above the fields. */
  refused?: string;
}

const by = (person: Member, where: string, enter: Step[], said: string[], more: Pick<Case, 'form' | 'refused'> = {}): Case => ({ person, at: where, enter, said, ...more });
const times = (n: number, key: string): string[] => Array.from({ length: n }, () => key);
const ofSettings = (field: string, enter: Step[], said: string[]) => by(admin, `${at}/settings`, enter, said, { form: field });
const toStore = ['required', 'id', 'id', 'choice', ...times(4, 'required'), 'coordinate', 'coordinate'];
const lane = (i: number, product: string): Step[] => [[`lanes.${i}.productId`, id(product)], [`lanes.${i}.widthShare`, '70']];
const chooseStore: Step[] = [['main input[type=checkbox]', 'press'], ['trucks:set-window']];

const cases: Record<string, Case> = {
  'new account': by(admin, `${at}/accounts/new`, [['terms', 'Net 30'], ['accounts:contacts.add'], ['contacts.0.email', 'buyer at chain']], [...times(3, 'required'), 'email']),
  'change account': by(admin, `${at}/accounts/${id('chain')}/change`, [['number', ' '], ['name', '']], ['required', 'required']),
  'add district': by(admin, `${at}/accounts/districts`, [['accounts:districts.add'], ['name', '  ']], ['required'], { form: 'name' }),
  'add product': by(admin, `${at}/accounts/products`, [['catalog:products.add'], ['name', 'Bag'], ['bagPounds', '500'], ['gtin', '12345']], ['measure', 'gtin'], { form: 'gtin' }),
  'add model': by(admin, `${at}/accounts/models`,
    [['catalog:models.add'], ['insideWidthIn', '5'], ['insideDepthIn', '900'], ['insideHeightIn', 'tall'], ['doors', '9'], ['ratedPounds', '1']],
    ['required', ...times(3, 'measure'), 'doors', 'measure', 'choice'],
    { form: 'doors' },
  ),
  'new store, empty': by(admin, `${at}/stores/new`, [], toStore),
  'new store, bad place and hours': by(admin, `${at}/stores/new`,
    [['latitude', 'north'], ['longitude', '200'], ['openHours.1', '5'], ['receivingHours.0.to', '06:00'], ['store-form:receiving.add']],
    [...toStore, 'span-backwards', 'span-backwards', 'weekdays'],
  ),
  'change store': by(admin, `${store}/change`, [['name', ''], ['latitude', '95'], ['driverNotes', 'Ring twice']], ['required', 'coordinate'], { form: 'latitude' }),
  'new freezer, empty': by(admin, `${store}/freezers/new`, [['mount.rackIn', '']], ['required', 'required', 'id', 'choice', 'id', 'measure']),
  'new freezer, shares and measures': by(admin, `${store}/freezers/new`,
    [['freezer-form:lanes.add'], ...lane(0, 'small bag'), ...lane(1, 'large bag'), ['mount.channelDropIn', '50']],
    ['required', 'required', 'id', 'choice', 'shares', 'measure'],
  ),
  'change freezer': by(admin, `${freezer}/change`, [['name', ''], ['lanes.0.widthShare', '0'], ['mount.headroomIn', '-1']], ['required', 'shares', 'share', 'measure'], { form: 'assetNumber' }),
  'tie sensor': by(technician, `${freezer}/sensor?serial=lantern`, [['main li button', 'press'], ['probesIn.1', '5'], ['probesIn.2', '900']], ['probes-order', 'measure']),
  'tie sensor, beyond the wall': by(technician, `${freezer}/sensor?serial=lantern`, [['main li button', 'press'], ['probesIn.2', '150']], [], { refused: 'problems:setup-impossible.title' }),
  'settings: producer': ofSettings('urgentPhone', [['name', ''], ['urgentPhone', '']], ['required', 'required']),
  'settings: desk': ofSettings('serviceHours.0.to', [['settings:desk.add'], ['serviceHours.0.to', '00:30'], ['settings:desk.add']], ['span-backwards', 'weekdays']),
  'settings: holidays': ofSettings('holidays.0.name', [['settings:holidays.add'], ['holidays.0.name', 'Fair']], ['day']),
  'settings: risk': ofSettings('riskLimit', [['riskLimit', '80']], ['risk-limit']),
  'settings: mail': ofSettings('mailSender.replyTo', [['mailSender.replyTo', 'nobody']], ['email']),
  'invite, empty': by(admin, `${at}/people/invite`, [], ['email', 'required', 'choice', 'choice']),
  'invite, bad email': by(admin, `${at}/people/invite`, [['email', 'wren@'], ['name', 'Wren'], ['role', 'store-manager']], ['email', 'choice']),
  'trucks of many': by(dispatcher, `${at}/trucks`, [...chooseStore, ['dialog input[type=date]', ''], ['dialog input[type=time] >> nth=1', '06:00']], ['day', 'span-backwards'], {
    form: 'input[type=date]',
  }),
  'record a delivery': by(dispatcher, `${store}/deliveries/new`, [['input[type=datetime-local]', ''], ['lines.0.bags', '2.5'], ['lines.0.takenBack', '-1']], ['time', 'bags', 'bags']),
  'record a delivery of nothing': by(dispatcher, `${store}/deliveries/new`, [['lines.0.lot', 'L-1']], ['lines']),
  'next truck': by(dispatcher, `${store}/next-truck`, [['day', ''], ['from', ''], ['load.0.bags', 'many']], ['day', 'time', 'bags']),
  'next truck, backwards': by(dispatcher, `${store}/next-truck`, [['from', '10:00'], ['to', '06:00']], [], { refused: 'problems:window-backwards.title' }),
};

describe.each(['en', 'es'] as const)('in %s', (language) => {
  test.each(Object.entries(cases))('%s', async (_name, one) => {
    const { page } = await visitOf(one.person, language);
    const taken = watchChanges(page);
    await page.goto(one.at);
    await settled(page);
    for (const step of one.enter) await enter(page, language, step);
    const before = await typedIn(page);
    await page.locator(one.form ? `form:has(${selectorOf(one.form)})` : 'main form').locator('[type=submit]').click();
    if (one.refused) await page.getByRole('alert').getByText(wordsOf(language, one.refused)).waitFor();
    await expect.poll(() => saidAtFields(page), { timeout: 3000 }).toEqual(one.said.map((key) => wordsOf(language, key)));
    expect(await typedIn(page)).toEqual(before);
    expect(page.url()).toBe(new URL(one.at, portal.url).href);
    expect(taken()).toEqual([]);
  });

  test('a logo that is no picture', async () => {
    const { page } = await visitOf(admin, language);
    const taken = watchChanges(page);
    await page.goto(`${at}/settings`);
    await page.locator('input[type=file]').setInputFiles({ name: 'notes.txt', mimeType: 'text/plain', buffer: Buffer.from('no picture') });
    await expect.poll(() => saidAtFields(page)).toEqual([wordsOf(language, 'settings:logo.wrong-kind')]);
    expect(taken()).toEqual([]);
  });

  test('a draft of a truck that ends before it starts', async () => {
    const { page } = await visitOf(dispatcher, language);
    await page.goto(`${at}/trucks`);
    for (const step of chooseStore) await enter(page, language, step);
    await page.locator('dialog [type=submit]').click();
    const end = page.locator('main input[type=time]').nth(1);
    await end.fill('06:00');
    expect(await saidAtFields(page)).toEqual([wordsOf(language, 'problems:window-backwards.title')]);
    expect(await end.inputValue()).toBe('06:00');
  });

  test('a new account by the keyboard alone', async () => {
    const { page } = await visitOf(admin, language);
    await page.goto(`${at}/accounts/new`);
    await settled(page);
    await tabTo(page, 'main form [type=submit]');
    await page.keyboard.press('Enter');
    await expect.poll(() => saidAtFields(page)).toEqual([wordsOf(language, 'required'), wordsOf(language, 'required')]);
    // The first of the faults listed leads to its field.
    await page.keyboard.press('Tab');
    await page.keyboard.press('Enter');
    expect(await isFocused(page, '[name=number]')).toBe(true);
    await page.keyboard.type(`k-${language}`);
    await tabTo(page, '[name=name]');
    await page.keyboard.type(`Keys ${language}`);
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: `Keys ${language}` }).waitFor();
  });
});

/** One browser for each person and language; the portal follows the language of the profile. */
async function visitOf(person: Member, language: Language): Promise<Visit> {
  const key = `${person.email} ${language}`;
  const known = visits.get(key);
  if (known) return known;
  const visit = await portal.visit({ language });
  visits.set(key, visit);
  await enterAs(visit, portal, person);
  await visit.context.request.patch(`${portal.url}/api/me`, { data: { language }, headers: { origin: portal.url } });
  // Leaving a form half filled is what these tests do.
  visit.page.on('dialog', (dialog) => void dialog.accept());
  return visit;
}

/** Every change the server took from here on. */
function watchChanges(page: Page): () => string[] {
  const taken: string[] = [];
  page.on('response', (response) => {
    const method = response.request().method();
    if (method !== 'GET' && response.status() < 400) taken.push(`${method} ${response.url()}`);
  });
  return () => taken;
}

async function enter(page: Page, language: Language, [what, value]: Step): Promise<void> {
  if (value === undefined) return page.getByRole('button', { name: wordsOf(language, what), exact: true }).click();
  const control = page.locator(selectorOf(what)).first();
  if (value === 'press') return control.click();
  if ((await control.and(page.locator('select')).count()) > 0) await control.selectOption(value);
  else await control.fill(value);
}

const selectorOf = (control: string): string => (/[ [>]/.test(control) ? control : `[name="${control}"]`);

/** The words of `file:a.b`, of validation.json where no file is named. */
function wordsOf(language: Language, key: string): string {
  const [place = '', file = 'validation'] = key.split(':').toReversed();
  const all: unknown = JSON.parse(readFileSync(path.resolve(import.meta.dirname, `../../locales/${language}/${file}.json`), 'utf8'));
  return String(place.split('.').reduce((words, part) => Reflect.get(Object(words), part), all));
}

/** The words each control or group that is wrong is described by, without its hint. */
const saidAtFields = (page: Page): Promise<string[]> =>
  page.evaluate(`[...document.querySelectorAll('[aria-invalid=true], fieldset[aria-describedby*="error"]')].map((control) => {
    const ids = (control.getAttribute('aria-describedby') ?? '').split(' ').filter((id) => !id.endsWith('-hint'));
    return ids.map((id) => document.getElementById(id)?.innerText ?? '').join(' ');
  })`);

const typedIn = (page: Page): Promise<string[]> =>
  page.evaluate('[...document.querySelectorAll("main :is(input, select, textarea), dialog :is(input, select, textarea)")].map(({ name, type, value, checked }) => [name, type, value, checked].join(" "))');

async function tabTo(page: Page, selector: string): Promise<void> {
  for (let presses = 0; presses < 60; presses += 1) {
    if (await isFocused(page, selector)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`no Tab leads to ${selector}`);
}

const isFocused = (page: Page, selector: string): Promise<boolean> => page.evaluate(`Boolean(document.activeElement?.matches(${JSON.stringify(selector)}))`);
