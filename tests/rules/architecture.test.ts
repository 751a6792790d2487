import { builtinModules } from 'node:module';
import { describe, expect, test } from 'vitest';
import { filesBelow, importsOf, type Import } from './sources';

/** Who may know whom (ARCHITECTURE "Rooms"), read from the imports; there is no list of exceptions. */

const files = [...filesBelow('server'), ...filesBelow('src')];
const imports = files.flatMap(importsOf);
const within = (folder: string) => (file: string) => file.startsWith(folder);
const shown = (list: Import[]) => list.map(({ from, to }) => `${from} -> ${to}`);
const isNode = (to: string): boolean => to.startsWith('node:') || builtinModules.includes(to);
const isPackage = (name: string) => (to: string) => to === name || to.startsWith(`${name}/`);

test('the reader reads', () => {
  expect(files.length).toBeGreaterThan(150);
  expect(imports.length).toBeGreaterThan(700);
  expect(shown(imports)).toContain('server/start.ts -> server/adapters/mail/real.ts');
  expect(imports.filter(({ typeOnly }) => typeOnly).length).toBeGreaterThan(100);
  const lost = imports.filter(({ to }) => /^(server|src)\//.test(to) && !files.includes(to) && !/\.(css|svg|json|woff2)$/.test(to));
  expect(shown(lost)).toEqual([]);
});

test('the client knows of the server only contract and domain', () => {
  const wrong = imports.filter(({ from, to }) => within('src/')(from) && within('server/')(to) && !/^server\/(contract|domain)\//.test(to));
  expect(shown(wrong)).toEqual([]);
});

test('the server knows nothing of the client', () => {
  expect(shown(imports.filter(({ from, to }) => within('server/')(from) && within('src/')(to)))).toEqual([]);
});

describe('contract and domain', () => {
  const pure = imports.filter(({ from }) => /^server\/(contract|domain)\//.test(from));
  test('know neither Node nor the database nor Express', () => {
    const wrong = pure.filter(({ to }) => isNode(to) || ['drizzle-orm', 'better-sqlite3', 'express', 'react'].some((name) => isPackage(name)(to)));
    expect(shown(wrong)).toEqual([]);
    expect(pure.length).toBeGreaterThan(40);
  });
  test('know no other room', () => {
    const wrong = pure.filter(({ to }) => within('server/')(to) && !/^server\/(contract|domain)\//.test(to));
    expect(shown(wrong)).toEqual([]);
  });
  test('the contract stands on zod and CASL alone', () => {
    const packages = pure.filter(({ from, to }) => within('server/contract/')(from) && !within('server/')(to));
    expect([...new Set(packages.map(({ to }) => to))].sort()).toEqual(['@casl/ability', 'zod/mini']);
  });
});

test('only the database room knows the query builder and the driver', () => {
  const wrong = imports.filter(({ from, to }) => (isPackage('drizzle-orm')(to) || isPackage('better-sqlite3')(to)) && !within('server/db/')(from));
  expect(shown(wrong)).toEqual([]);
});

test('tables are taken from the room’s door', () => {
  const wrong = imports.filter(({ from, to }) => /^server\/db\/(schema|allowed|open|producer-db|system-db)/.test(to) && !within('server/db/')(from) && !within('server/contract/')(from));
  expect(shown(wrong)).toEqual([]);
});

test('only the start takes real adapters', () => {
  const takers = imports.filter(({ to }) => /^server\/adapters\/[^/]+\/real/.test(to));
  expect([...new Set(takers.map(({ from }) => from))]).toEqual(['server/start.ts']);
});

test('a handler reaches neither the connection nor another tenant', () => {
  const wrong = imports.filter(({ from, to }) => /^server\/features\/(?!dev\/|producers\/)/.test(from) && /statement-hook|db\/open/.test(to));
  expect(shown(wrong)).toEqual([]);
});

test('a feature reaches another only through its actions, mail or shared parts', () => {
  const noun = (file: string): string | undefined => /^(server|src)\/features\/([^/]+)\//.exec(file)?.[2];
  const wrong = imports.filter(({ from, to }) => {
    const [own, other] = [noun(from), noun(to)];
    return within('server/')(from) && own !== undefined && other !== undefined && own !== other && /\/routes$|\/routes\.ts$/.test(to) && !/dev\/routes/.test(to);
  });
  expect(shown(wrong)).toEqual([]);
});

test('there are no circles', () => {
  const next = new Map<string, string[]>();
  for (const { from, to, typeOnly } of imports) if (!typeOnly && files.includes(to)) next.set(from, [...(next.get(from) ?? []), to]);
  expect(circles(next)).toEqual([]);
  expect(circles(new Map([['a', ['b']], ['b', ['c']], ['c', ['a']]]))).toEqual(['a -> b -> c -> a']);
});

function circles(next: Map<string, string[]>): string[] {
  const found: string[] = [];
  const done = new Set<string>();
  const walk = (file: string, trail: string[]): void => {
    const at = trail.indexOf(file);
    if (at >= 0) return void found.push([...trail.slice(at), file].join(' -> '));
    if (done.has(file)) return;
    for (const to of next.get(file) ?? []) walk(to, [...trail, file]);
    done.add(file);
  };
  for (const file of next.keys()) walk(file, []);
  return found;
}
