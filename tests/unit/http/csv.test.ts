import http from 'node:http';
import type { AddressInfo } from 'node:net';
import compression from 'compression';
import express from 'express';
import { afterEach, expect, test, vi } from 'vitest';
import { sendCsv } from '../../../server/http/csv';

let server: http.Server | undefined;
afterEach(() => {
  server?.closeAllConnections();
  server?.close();
});

/** Serves the batches as a file; answers its address. */
async function served(batches: Iterable<string[][]>, ended: () => void = () => {}): Promise<string> {
  const app = express().use(compression());
  app.get('/', (_req, res) => sendCsv(res, 'a.csv', batches).then(ended));
  const listening = app.listen(0, '127.0.0.1');
  server = listening;
  await new Promise((resolve) => listening.once('listening', resolve));
  // Listening on a port, so the address is one of the internet.
  return `http://127.0.0.1:${(listening.address() as AddressInfo).port}/`;
}

const batch = Array.from({ length: 500 }, (_, i) => ['x'.repeat(200), String(i)]);

test('texts are no formulas, and numbers below zero stay numbers', async () => {
  const url = await served([[['=1+1', '+2', '-3', '-4.2', '-a', '@b', '4']]]);
  expect(await (await fetch(url)).text()).toBe("'=1+1,'+2,-3,-4.2,'-a,'@b,4\r\n");
});

test('a slow reader gets all of it, and is waited for with one listener', async () => {
  const warned = vi.fn();
  process.on('warning', warned);
  const url = await served(Array.from({ length: 60 }, () => batch));
  const text = await new Promise<string>((resolve) => {
    http.get(url, (res) => {
      let got = '';
      res.setEncoding('utf8');
      res.on('data', (part: string) => {
        got += part;
        res.pause();
        setTimeout(() => res.resume(), 1);
      });
      res.on('end', () => resolve(got));
    });
  });
  process.off('warning', warned);
  expect(text.match(/\r\n/g)).toHaveLength(60 * batch.length);
  expect(warned).not.toHaveBeenCalled();
});

test('whoever goes away before the end is no fault, and no more is made for them', async () => {
  let made = 0;
  function* endless(): Generator<string[][]> {
    for (;;) {
      made += 1;
      yield batch;
    }
  }
  const ended = vi.fn();
  const url = await served(endless(), ended);
  await new Promise<void>((resolve) => {
    const asked = http.get(url, (res) => {
      res.once('data', () => {
        asked.destroy();
        resolve();
      });
    });
    asked.on('error', () => {});
  });
  await vi.waitFor(() => expect(ended).toHaveBeenCalled());
  const then = made;
  await new Promise((resolve) => setTimeout(resolve, 50));
  expect(made).toBe(then);
});
