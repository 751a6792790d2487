import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { alder, alderMembers, alderPeople } from '../cast';
import { browserOf, testApp, type TestApp } from '../support/server';
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

test('somebody of both producers is at each what they are there', async () => {
  const found: string[] = [];
  for (const one of cases.filter(({ endpoint }) => endpoint.access.kind === 'may')) found.push(...(await surveyMember(server, one, 'agent', alderPeople.both.email)));
  expect(found).toEqual([]);
  const atBirch = await browserOf(server, alderPeople.both).get('/api/birch-ice/stores').expect(200);
  expect(atBirch.body.stores).toHaveLength(1);
  expect(atBirch.text).not.toContain(alder.mark);
  await browserOf(server, alderPeople.both).get('/api/birch-ice/assignees').expect(403);
});

test('a telemetry key speaks for its own producer only', async () => {
  expect(await surveyMember(server, ingestWithKey, 'admin')).toEqual([]);
});
