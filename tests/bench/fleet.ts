import { spawn, type ChildProcess } from 'node:child_process';
import { createHmac } from 'node:crypto';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import autocannon from 'autocannon';
import { migrateDatabase, openDatabase, sessions } from '../../server/db';
import { hash, sessionCookie } from '../../server/http/session';
import { freePort } from '../support/server-process';
import { addressOf, id, plantFleet, slug } from './plant-fleet';

/** `npm run bench:fleet`: a page of fifty of fifty thousand freezers against bare Express sending a text of the same size. */
const FREEZERS = Number(process.env.FREEZERS ?? 50_000);
const SECONDS = Number(process.env.SECONDS ?? 4);
const ROUNDS = 3;
const WANTED = 0.3;
const root = path.resolve(import.meta.dirname, '../..');
const secret = 'a-secret-for-the-bench-alone-0123456789-abcdef';
const dataDir = mkdtempSync(path.join(tmpdir(), 'nilas-bench-'));

const list = `/api/${slug}/freezers?limit=50`;
const district = `&district=${id('district 3')}`;

interface Question {
  name: string;
  who: 'dispatcher' | 'rep' | 'manager';
  path: string;
}

async function main(): Promise<void> {
  plant();
  const port = await freePort();
  const portal = serve(['dist/server/main.js'], { DATA_DIR: dataDir, PORT: String(port), SESSION_SECRET: secret, TRUST_PROXY: '1', BASE_URL: `http://127.0.0.1:${port}`, LOG_LEVEL: 'error' });
  const url = `http://127.0.0.1:${port}`;
  await up(`${url}/healthz`);
  const questions = await questionsOf(url);
  let sound = true;
  for (const question of questions) sound = (await measure(url, question)) && sound;
  portal.kill();
  rmSync(dataDir, { recursive: true, force: true });
  process.exit(sound ? 0 : 1);
}

function plant(): void {
  const began = Date.now();
  const db = openDatabase(path.join(dataDir, 'nilas.db'));
  migrateDatabase(db, path.join(root, 'drizzle'));
  plantFleet(db, FREEZERS, began);
  for (const who of ['dispatcher', 'rep', 'manager']) {
    const data = { cookie: { originalMaxAge: null, path: '/', httpOnly: true }, personId: id(who), staff: true, startedAt: began, handle: who, device: 'Bench' };
    db.insert(sessions).values({ id: hash(who), personId: id(who), handle: who, data: JSON.stringify(data), device: 'Bench', createdAt: began, seenAt: began, expiresAt: began + 43_200_000 }).run();
  }
  db.$client.close();
  console.log(`${FREEZERS} freezers of ${addressOf('dispatcher')} planted in ${((Date.now() - began) / 1000).toFixed(0)} s`);
}

/** The last page is found by paging to it, as a reader would. */
async function questionsOf(url: string): Promise<Question[]> {
  const last = await lastPage(url, `/api/${slug}/freezers?limit=200${district}`);
  return [
    { name: 'all, first page', who: 'dispatcher', path: list },
    { name: 'one district, first page', who: 'dispatcher', path: list + district },
    { name: 'one district, last page', who: 'dispatcher', path: `${list}${district}&after=${last}` },
    { name: 'at risk before the truck', who: 'dispatcher', path: `${list}&show=first` },
    { name: 'search that finds thousands, in a district', who: 'dispatcher', path: `${list}${district}&q=lantern` },
    { name: 'search that finds one', who: 'dispatcher', path: `${list}&q=bench-031234` },
    { name: 'rep with 300 stores', who: 'rep', path: list },
    { name: 'manager with 3 stores', who: 'manager', path: list },
  ];
}

async function lastPage(url: string, first: string): Promise<string> {
  const cursors: string[] = [];
  for (let next: string | null = ''; next !== null; ) {
    const answer: { next: string | null } = await (await fetch(url + first + (next ? `&after=${next}` : ''), { headers: headersOf('dispatcher') })).json();
    if (answer.next) cursors.push(answer.next);
    next = answer.next;
  }
  // A full page before the end, so that the last page is as large as the first.
  const before = cursors.at(-1);
  if (!before) throw new Error('one page is all there is');
  return before;
}

async function measure(url: string, { name, who, path: asked }: Question): Promise<boolean> {
  const headers = headersOf(who);
  const response = await fetch(url + asked, { headers });
  const body = await response.text();
  if (!response.ok) throw new Error(`${name}: ${response.status} ${body}`);
  const file = path.join(dataDir, 'constant.json');
  writeFileSync(file, body);
  const constant = serve(['tests/bench/constant-server.mjs', file], {});
  const constantUrl = `http://127.0.0.1:${await firstLine(constant)}/constant`;
  const ratios: number[] = [];
  let p99: [number, number] = [0, 0];
  for (let round = 0; round < ROUNDS; round += 1) {
    const bare = await fire(constantUrl, {});
    const ours = await fire(url + asked, headers);
    ratios.push(ours.requests.average / bare.requests.average);
    p99 = [ours.latency.p99, bare.latency.p99];
  }
  constant.kill();
  const ratio = ratios.sort((a, b) => a - b)[Math.floor(ROUNDS / 2)] ?? 0;
  console.log(`${name.padEnd(44)} ${ratio.toFixed(2)} × of bare Express (${(body.length / 1024).toFixed(1)} kB; p99 ${p99[0]} ms against ${p99[1]} ms), wanted ${WANTED}`);
  return ratio >= WANTED;
}

const fire = (url: string, headers: Record<string, string>) => {
  let asked = 0;
  return autocannon({
    url,
    connections: 8,
    duration: SECONDS,
    setupClient: (client) => {
      // Each from an address of its own, so that the limits by address stay as they are.
      client.setHeaders({ ...headers, 'x-forwarded-for': `10.0.${Math.floor(asked / 250)}.${asked++ % 250}` });
      client.on('response', (status) => {
        if (status !== 200) throw new Error(`answered ${status}`);
        asked += 1;
        client.setHeaders({ ...headers, 'x-forwarded-for': `10.${Math.floor(asked / 62_500)}.${Math.floor(asked / 250) % 250}.${asked % 250}` });
      });
    },
  });
};

function headersOf(who: string): Record<string, string> {
  const signature = createHmac('sha256', secret).update(who).digest('base64').replace(/=+$/, '');
  return { cookie: `${sessionCookie}=${encodeURIComponent(`s:${who}.${signature}`)}`, 'sec-fetch-site': 'same-origin' };
}

const serve = (args: string[], env: Record<string, string>): ChildProcess =>
  spawn(process.execPath, args, { cwd: root, env: { ...process.env, ...env }, stdio: ['ignore', 'pipe', 'inherit'] });

const firstLine = (child: ChildProcess): Promise<string> => new Promise((resolve) => child.stdout?.once('data', (data: Buffer) => resolve(String(data).trim())));

async function up(url: string): Promise<void> {
  for (let tries = 0; tries < 200; tries += 1) {
    if (await fetch(url).then(({ ok }) => ok, () => false)) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error('the portal does not come up');
}

await main();
