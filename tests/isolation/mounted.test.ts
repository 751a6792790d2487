import { Router } from 'express';
import { expect, test } from 'vitest';
import { endpoints } from '../../server/contract';
import type { Access } from '../../server/contract/endpoint';
import { testApp } from '../support/server';
import { mountedRoutes } from './mounted';

/** Not of the contract: the built client, which holds no data. */
const CLIENT = ['get /{*path}'];
const named = (list: typeof endpoints) => list.map(({ method, path }) => `${method} ${path}`).sort();
/** Express answers HEAD wherever it answers GET. */
const served = (routes: string[]) => routes.filter((route) => !route.startsWith('head ') && !CLIENT.includes(route)).sort();

test('what is mounted is what the contract says, no more and no less', async () => {
  const server = await testApp('nobody');
  const mounted = mountedRoutes(server.app);
  expect(mounted.length).toBeGreaterThan(25);
  expect(served(mounted)).toEqual(named(endpoints));
  await server.close();
});

test('in production the doors of development are not there', async () => {
  const server = await testApp('nobody', (services) => ({ ...services, config: { ...services.config, mode: 'production' } }));
  expect(served(mountedRoutes(server.app))).toEqual(named(endpoints.filter(({ access }) => access.kind !== 'dev')));
  await server.close();
});

test('a route beside the contract is seen, however deep it is mounted', async () => {
  const server = await testApp('nobody');
  const inner = Router();
  inner.post('/door', (_req, res) => void res.end());
  server.app.use('/back', Router().use('/side', inner));
  expect(served(mountedRoutes(server.app))).toContain('post /back/side/door');
  await server.close();
});

test('every endpoint says who may call it, and those outside a producer stand under a reserved name', () => {
  const kinds: Access['kind'][] = ['public', 'person', 'may', 'telemetry-key', 'dev'];
  for (const { id, access, path } of endpoints) {
    expect(kinds, id).toContain(access.kind);
    if (access.kind === 'may') expect(path, id).toMatch(/^\/api\/:producer(\/|$)/);
    else expect(path, id).toMatch(/^\/(healthz$|dev\/|api\/(auth|me|telemetry|openapi\.json)(\/|$))/);
    if (access.kind === 'public') expect(access.reason.length, id).toBeGreaterThan(10);
  }
  expect(new Set(endpoints.map(({ id }) => id)).size).toBe(endpoints.length);
});
