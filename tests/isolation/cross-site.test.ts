import { expect, test } from 'vitest';
import { testApp } from '../support/server';
import { crossSiteFindings, sameSiteFindings } from './cross-site';
import { cases, ingestWithKey } from './cases';
import { call } from './call';

test('no other site can change anything, and our own pages can', async () => {
  const server = await testApp('alder');
  expect(await crossSiteFindings(server)).toEqual([]);
  expect(await sameSiteFindings(server)).toEqual([]);
  await server.close();
});

test('a bearer key needs neither header nor cookie', async () => {
  const server = await testApp('alder');
  const { headers, ...rest } = ingestWithKey;
  expect((await call(server, { ...rest, headers: { ...headers, 'sec-fetch-site': '' } }, null)).status).toBe(202);
  await server.close();
});

test('there are unsafe routes to ask', () => {
  expect(cases.filter(({ endpoint }) => endpoint.method !== 'get').length).toBeGreaterThan(12);
});
