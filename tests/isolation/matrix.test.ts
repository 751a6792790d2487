import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { alderMembers } from '../cast';
import { testApp, type TestApp } from '../support/server';
import { cases, ingestWithKey, uncovered } from './cases';
import { outsiders, surveyMember, surveyOutsider, watchWrites } from './survey';

let server: TestApp;
beforeAll(async () => {
  server = await testApp('all');
  watchWrites(server);
});
afterAll(() => server.close());

test('every endpoint of the contract is called here', () => {
  expect(uncovered()).toEqual([]);
});

test('every name in a path is given, and every endpoint of a producer says who may', () => {
  for (const { endpoint, path = {}, allowed } of cases) {
    const names = [...endpoint.path.matchAll(/:(\w+)/g)].map(([, name]) => name).filter((name) => name !== 'producer');
    expect(Object.keys(path), endpoint.id).toEqual(names);
    if (endpoint.access.kind === 'may') expect(allowed?.length, endpoint.id).toBeGreaterThan(0);
  }
});

describe.each(alderMembers)('as %s of Alder', (name) => {
  test('each call is answered as the rules say, and the foreign is the absent', async () => {
    const found: string[] = [];
    for (const one of cases) found.push(...(await surveyMember(server, one, name)));
    expect(found).toEqual([]);
  });
});

describe.each(outsiders)('as %s', (who, email, signedIn) => {
  test('nothing of Alder is given or given away', async () => {
    const found: string[] = [];
    for (const one of cases) found.push(...(await surveyOutsider(server, one, who, email, signedIn)));
    expect(found).toEqual([]);
  });
});

test('a telemetry key speaks for its own producer only', async () => {
  expect(await surveyMember(server, ingestWithKey, 'admin')).toEqual([]);
});
