import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { expect, test } from 'vitest';
import { createProducer, freePort, productionEnv, startServer } from '../support/server-process';

const long = process.env.TORTURE === 'long';
const PACKS = 1000;

/** Needs strace, so it belongs to `npm run torture` alone. */
test.runIf(long)(`${PACKS} acknowledgements, each behind its own sync of the disk`, async () => {
  expect(spawnSync('strace', ['-V']).status, 'install strace').toBe(0);
  const dataDir = mkdtempSync(path.join(tmpdir(), 'nilas-sync-'));
  const env = productionEnv(dataDir, await freePort());
  const key = createProducer(env, 'sync-ice');
  const trace = path.join(dataDir, 'trace.txt');
  const before = ['strace', '-f', '-s', '24', '-e', 'trace=fsync,fdatasync,write,writev,sendto,sendmsg', '-o', trace];
  const server = await startServer('main', env, { before, patienceMs: 60_000 });
  for (let n = 0; n < PACKS; n += 1) {
    const response = await fetch(`${server.url}/api/telemetry`, {
      method: 'POST',
      headers: { authorization: `Bearer ${key}`, 'content-type': 'application/senml+json' },
      body: JSON.stringify([{ bn: 'urn:dev:os:32473-sync:', bt: Date.now() / 1000 - 100_000 + n * 10, n: 'probe1', u: 'm', v: 0.5 }]),
    });
    expect(response.status).toBe(202);
  }
  await server.end('SIGTERM');

  let synced = 0;
  let answers = 0;
  let unsynced = 0;
  for (const line of readFileSync(trace, 'utf8').split('\n')) {
    if (/\b(fsync|fdatasync)\(/.test(line) && !/resumed/.test(line)) synced += 1;
    if (!line.includes('HTTP/1.1 202')) continue;
    answers += 1;
    if (synced === 0) unsynced += 1;
    synced = 0;
  }
  rmSync(dataDir, { recursive: true });
  console.log(`${answers} acknowledgements, ${unsynced} without a sync since the one before`);
  expect(answers).toBe(PACKS);
  expect(unsynced).toBe(0);
}, 600_000);
