import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { localStorage } from '../../server/adapters/storage/local';
import type { Storage } from '../../server/ports/storage';

let folder: string;
let storage: Storage;
beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'nilas-storage-'));
  storage = localStorage(path.join(folder, 'photos'));
});
afterEach(() => rm(folder, { recursive: true }));

const name = '0190b2c4-0000-7000-8000-000000000001.jpg';

test('gives back what was put, byte for byte', async () => {
  const bytes = Buffer.from(Array.from({ length: 70_000 }, (_, i) => i % 251));
  await storage.put(name, bytes);
  expect((await storage.get(name))?.equals(bytes)).toBe(true);
});

test('answers null for what is not there', async () => {
  expect(await storage.get(name)).toBeNull();
});

test('a name put again stands for the new file', async () => {
  await storage.put(name, Buffer.from('one'));
  await storage.put(name, Buffer.from('two'));
  expect(String(await storage.get(name))).toBe('two');
});

test('leaves no half files beside', async () => {
  await Promise.all(Array.from({ length: 8 }, (_, i) => storage.put(name.replace('1.jpg', `${i}.jpg`), Buffer.alloc(5000, i))));
  expect((await readdir(path.join(folder, 'photos'))).sort()).toEqual(Array.from({ length: 8 }, (_, i) => name.replace('1.jpg', `${i}.jpg`)));
});

describe('a name that leads elsewhere is refused', () => {
  test.each(['../outside.jpg', '/etc/passwd', 'a/b.jpg', '..', '', `${name}\u0000.jpg`, `${'x'.repeat(300)}.jpg`, 'short.j'])('%j', async (given) => {
    await expect(storage.put(given, Buffer.from('x'))).rejects.toThrow();
    await expect(storage.get(given)).rejects.toThrow();
    expect(await readdir(folder)).not.toContain('outside.jpg');
  });
});
