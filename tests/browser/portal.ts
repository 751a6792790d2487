import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import sharp from 'sharp';
import { expect } from 'vitest';
import { readConfig } from '../../server/config';
import { start, type Running } from '../../server/start';
import { alder, alderPeople, birch, birchPeople } from '../cast';
import { morning, photoFiles, plantProducer } from '../factories';
import { chromiumFlags, findChromium } from '../support/chromium.mjs';
import { freePort } from '../support/server-process';

const root = path.resolve(import.meta.dirname, '../..');
const axe = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

export interface Portal {
  url: string;
  running: Running;
  browser: Browser;
  /** A browser of its own: cookies and language apart from everybody else's. */
  visit: (options?: VisitOptions) => Promise<Visit>;
  close: () => Promise<void>;
}

export interface VisitOptions {
  width?: 320 | 390 | 1440;
  language?: 'en' | 'es';
  dark?: boolean;
}

export interface Visit {
  context: BrowserContext;
  page: Page;
  /** What the console complained about; looked at when the visit ends. */
  complaints: string[];
}

/** The built portal on a real port with the cast in it, and a real browser. Time stands at the cast's morning and runs on. */
export async function openPortal(): Promise<Portal> {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'nilas-browser-'));
  const port = await freePort();
  const config = readConfig('test', { DATA_DIR: dataDir, PORT: String(port), BASE_URL: `http://127.0.0.1:${port}`, LOG_LEVEL: 'error' });
  const opened = Date.now();
  const running = await start(config, root, () => morning + (Date.now() - opened));
  plantProducer(running.services.db, birch, birchPeople, 101);
  plantProducer(running.services.db, alder, alderPeople, 1);
  const picture = await sharp({ create: { width: 8, height: 8, channels: 3, background: '#88aabb' } }).jpeg().toBuffer();
  for (const file of photoFiles(alder)) await running.services.storage.put(file, picture);
  const executablePath = findChromium();
  if (!executablePath) throw new Error('no Chromium: run the tests by `npm test`, which finds or installs it');
  const browser = await chromium.launch({ executablePath, args: chromiumFlags });
  return {
    url: config.baseUrl,
    running,
    browser,
    visit: (options) => visit(browser, config.baseUrl, options),
    close: async () => {
      await browser.close();
      await running.stop();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}

async function visit(browser: Browser, url: string, { width = 1440, language = 'en', dark = false }: VisitOptions = {}): Promise<Visit> {
  const context = await browser.newContext({
    baseURL: url,
    locale: language === 'es' ? 'es-US' : 'en-US',
    timezoneId: 'America/Chicago',
    viewport: { width, height: width < 500 ? 844 : 900 },
    colorScheme: dark ? 'dark' : 'light',
    reducedMotion: 'reduce',
  });
  const page = await context.newPage();
  await page.clock.install({ time: morning });
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  return { context, page, complaints };
}

/** Signs in with one press, for journeys that are not about signing in. */
export async function enterAs({ context }: Visit, portal: Portal, { email }: { email: string }): Promise<void> {
  const response = await context.request.post(`${portal.url}/dev/people`, { form: { email }, headers: { origin: portal.url } });
  expect(response.status()).toBeLessThan(400);
}

interface AxeResult {
  violations: { id: string; nodes: { target: unknown; failureSummary?: string }[] }[];
}

/** What axe finds on the page as it stands, by WCAG 2.2 A and AA; nothing, one hopes. */
export async function faultsOf(page: Page): Promise<string[]> {
  await page.evaluate(axe);
  const result = (await page.evaluate(
    `axe.run(document, { runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'] })`,
  )) as AxeResult;
  return result.violations.flatMap(({ id, nodes }) => nodes.map(({ target, failureSummary }) => `${id} ${JSON.stringify(target)} ${failureSummary ?? ''}`));
}

/** Nothing reaches beyond the window's side. */
export const overflow = (page: Page): Promise<number> => page.evaluate('document.documentElement.scrollWidth - document.documentElement.clientWidth');

/** A quiet moment: no request under way, fonts there, nothing loading. */
export async function settled(page: Page): Promise<void> {
  await page.waitForLoadState('networkidle');
  await page.evaluate('document.fonts.ready.then(() => null)');
  await page.waitForFunction('!document.querySelector("[aria-busy=true]")');
}
