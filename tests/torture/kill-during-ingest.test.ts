import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import SQLite from 'better-sqlite3';
import { expect, test } from 'vitest';
import { createProducer, freePort, productionEnv, startServer } from '../support/server-process';

/** 200 kills by `npm run torture`, fewer in `npm test`. */
const KILLS = process.env.TORTURE === 'long' ? 200 : 8;
const SENSORS = 5;
const start = Date.now() - 20 * 86_400_000;

interface Sent {
  serial: string;
  at: number;
  distance: number;
}

/** The n-th pack of the run: one reading of each sensor, each value unmistakable. */
const packOf = (n: number): Sent[] =>
  Array.from({ length: SENSORS }, (_, i) => ({
    serial: `urn:dev:os:32473-torture-${i}`,
    at: start + n * 60_000,
    distance: 0.2 + ((n * SENSORS + i) % 4000) / 10_000,
  }));

const senml = (pack: Sent[]) =>
  JSON.stringify(pack.map(({ serial, at, distance }) => ({ bn: `${serial}:`, n: 'probe1', bt: at / 1000, u: 'm', v: distance })));

test(`${KILLS} kills during ingest lose and double nothing that was acknowledged`, async () => {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'nilas-kill-'));
  const port = await freePort();
  const env = productionEnv(dataDir, port);
  const key = createProducer(env, 'torture-ice');
  const acknowledged: Sent[] = [];
  let next = 0;

  const post = async (url: string): Promise<boolean> => {
    const pack = packOf(next++);
    try {
      const response = await fetch(`${url}/api/telemetry`, {
        method: 'POST',
        headers: { authorization: `Bearer ${key}`, 'content-type': 'application/senml+json' },
        body: senml(pack),
      });
      if (response.status !== 202) return false;
      const { accepted } = (await response.json()) as { accepted: number };
      expect(accepted).toBe(SENSORS);
      acknowledged.push(...pack);
      return true;
    } catch (error) {
      if (error instanceof TypeError) return false;
      throw error;
    }
  };

  for (let kill = 0; kill < KILLS; kill += 1) {
    const server = await startServer('main', env);
    let alive = true;
    const senders = Array.from({ length: 4 }, async () => {
      while (alive && (await post(server.url)));
    });
    await new Promise((resolve) => setTimeout(resolve, 40 + ((kill * 37) % 160)));
    await server.end('SIGKILL');
    alive = false;
    await Promise.all(senders);
  }

  // The next start recovers; then every acknowledged reading stands there once, with its own value.
  const last = await startServer('main', env);
  await last.end('SIGTERM');
  const db = new SQLite(path.join(dataDir, 'nilas.db'), { readonly: true });
  expect(db.pragma('integrity_check', { simple: true })).toBe('ok');
  expect(db.pragma('foreign_key_check')).toEqual([]);
  const find = db.prepare('select probes from reading r join sensor s on s.no = r.sensor_no where s.serial = ? and r.at = ?');
  const lost = acknowledged.filter(({ serial, at, distance }) => {
    const rows = find.all(serial, at) as { probes: string }[];
    return rows.length !== 1 || rows[0]?.probes !== JSON.stringify([distance]);
  });
  const stored = db.prepare('select count(*) from reading').pluck().get();
  db.close();
  rmSync(dataDir, { recursive: true });
  console.log(`${acknowledged.length} readings acknowledged over ${KILLS} kills, ${String(stored)} stored, ${lost.length} lost or wrong`);
  expect(acknowledged.length).toBeGreaterThan(KILLS * SENSORS);
  expect(lost).toEqual([]);
}, 1_800_000);
