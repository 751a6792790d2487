import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { endpoints } from '../../server/contract';
import { problems } from '../../server/contract/problem';
import { alderPeople, type AlderPerson } from '../cast';
import { idOf } from '../factories';
import { browser, browserOf, testApp, type Agent, type TestApp } from '../support/server';

let server: TestApp;
beforeEach(async () => {
  server = await testApp('alder');
});
afterEach(() => server.close());

const typeOf = (body: { type?: string }): string | undefined => body.type?.replace('urn:nilas:problem:', '');
const as = (name: AlderPerson): Agent => browserOf(server, alderPeople[name]);

describe('problems', () => {
  test('are RFC 9457 documents with a type of the catalogue, and words for whoever reads them raw', async () => {
    const asked = [await browser(server).get('/api/me'), await as('agent').get('/api/alder-ice/stores/x'), await as('manager').post('/api/alder-ice/requests').send({}), await browser(server).get('/api/nothing')];
    expect(asked.map(({ status }) => status)).toEqual([401, 404, 400, 404]);
    for (const { status, headers, body } of asked) {
      expect(headers['content-type']).toContain('application/problem+json');
      expect(body.status).toBe(status);
      expect(Object.keys(problems).map((type) => `urn:nilas:problem:${type}`)).toContain(body.type);
      expect(body.title.length).toBeGreaterThan(5);
    }
  });

  test('are worded in the language asked for', async () => {
    const titleIn = async (language: string): Promise<string> => (await browser(server).get('/api/me').set('accept-language', language)).body.title;
    expect(await titleIn('es-MX,es;q=0.9')).not.toBe(await titleIn('en'));
    expect(await titleIn('fr')).toBe(await titleIn('en'));
  });

  test('name the fields that are wrong by JSON pointer', async () => {
    const body = { at: 'now', lines: [{ productId: 'x', bags: -1, 'a/b~c': 1 }], more: true };
    const answer = await as('dispatcher').post(`/api/alder-ice/stores/${idOf('alder', 'lantern')}/deliveries`).send(body).expect(400);
    const faults = Object.fromEntries(answer.body.errors.map(({ pointer, fault }: { pointer: string; fault: string }) => [pointer, fault]));
    expect(faults).toEqual({
      '/at': 'number',
      '/lines/0/productId': 'id',
      '/lines/0/bags': 'bags',
      '/lines/0/a~1b~0c': 'unknown-field',
      '/more': 'unknown-field',
    });
  });

  test.each([
    ['/api/alder-ice/requests?state=lost', '/query/state'],
    ['/api/alder-ice/requests?limit=0', '/query/limit'],
    ['/api/alder-ice/requests?colour=red', '/query/colour'],
    ['/api/alder-ice/requests?after=nonsense', '/query/after'],
    ['/api/alder-ice/stores?after=W10', '/query/after'],
    ['/api/alder-ice/requests?store=a&store=b', '/query/store'],
    ['/api/alder-ice/requests?__proto__=1&store=x', '/query/store'],
  ])('%s names %s', async (path, pointer) => {
    const { body } = await as('agent').get(path).expect(400);
    expect(body.errors.map((error: { pointer: string }) => error.pointer)).toContain(pointer);
  });

  test.each([
    ['{', 400, 'malformed-json'],
    ['"text"', 400, 'malformed-json'],
    ['[]', 400, 'bad-input'],
    ['null', 400, 'malformed-json'],
    [`{"words":"${'x'.repeat(110_000)}"}`, 413, 'too-large'],
  ])('a body that starts with %.12j is answered %i %s', async (body, status, type) => {
    const answer = await as('manager').post('/api/alder-ice/requests').set('content-type', 'application/json').send(body);
    expect([answer.status, typeOf(answer.body)]).toEqual([status, type]);
  });

  test('of the server itself say nothing but a number to ask about, and are logged', async () => {
    const broken = await testApp('alder', (services) => ({ ...services, system: { ...services.system, membershipAt: () => { throw new Error('the secret cause'); } } }));
    const answer = await browserOf(broken, alderPeople.agent).get('/api/alder-ice/stores').expect(500);
    expect(answer.text).not.toContain('secret cause');
    expect(answer.body.requestId).toMatch(/^[\w-]{8,}$/);
    expect(broken.log.join('')).toContain(answer.body.requestId);
    expect(broken.log.join('')).not.toContain('nilas.session=');
    await broken.close();
  });

  test('of a path that cannot be read are answered too', async () => {
    for (const path of ['/api/%E0%A4%A', '/api/alder-ice/stores/%00', '/api//me']) expect((await as('agent').get(path)).status, path).toBeLessThan(500);
  });
});

describe('the description at /api/openapi.json', () => {
  interface Operation {
    operationId: string;
    'x-who-may-call': string[];
    parameters: { name: string; in: string; required: boolean; schema: object }[];
    responses: Record<string, { description: string }>;
    requestBody?: { content: Record<string, { schema: object }> };
    security: object[];
  }
  const described = async (): Promise<{ openapi: string; info: object; paths: Record<string, Record<string, Operation>>; components: { schemas: object; securitySchemes: object } }> =>
    (await browser(server).get('/api/openapi.json').expect(200)).body;

  test('has every endpoint once, with who may call it', async () => {
    const { openapi, paths } = await described();
    expect(openapi).toBe('3.1.0');
    const all = Object.entries(paths).flatMap(([path, verbs]) => Object.entries(verbs).map(([method, { operationId }]) => `${method} ${path} ${operationId}`));
    expect(all.sort()).toEqual(endpoints.map(({ id, method, path }) => `${method} ${path.replace(/:(\w+)/g, '{$1}')} ${id}`).sort());
    for (const verbs of Object.values(paths)) for (const operation of Object.values(verbs)) expect(operation['x-who-may-call'].length, operation.operationId).toBeGreaterThan(0);
  });

  test('is sound: parameters as in the path, a success, references that resolve', async () => {
    const document = await described();
    for (const [path, verbs] of Object.entries(document.paths)) {
      for (const [method, { operationId, parameters, responses, requestBody }] of Object.entries(verbs)) {
        const inPath = parameters.filter((one) => one.in === 'path');
        expect(inPath.map(({ name }) => name).sort(), operationId).toEqual([...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name).sort());
        expect(inPath.every(({ required }) => required), operationId).toBe(true);
        expect(Object.keys(responses).some((status) => /^2\d\d$/.test(status)), operationId).toBe(true);
        expect(method === 'get' && requestBody !== undefined, operationId).toBe(false);
      }
    }
    const references = [...JSON.stringify(document).matchAll(/"\$ref":"#\/([^"]+)"/g)].map(([, pointer = '']) => pointer);
    for (const pointer of references) expect(pointer.split('/').reduce<unknown>((at, key) => (at as Record<string, unknown> | undefined)?.[key], document), pointer).toBeDefined();
    expect(references.length).toBeGreaterThan(20);
  });

  test('says of whom the rules let in', async () => {
    const { paths } = await described();
    expect(paths['/api/{producer}/stores/{storeId}/next-truck']?.put?.['x-who-may-call']).toEqual(['dispatcher', 'producer-admin']);
    expect(paths['/api/{producer}/stores']?.get?.['x-who-may-call']).toHaveLength(7);
    expect(paths['/api/telemetry']?.post?.security).toEqual([{ telemetryKey: [] }]);
  });
});

describe('floods', () => {
  const impatient = () => testApp('alder', (services) => ({ ...services, patience: 1 }));

  test('one address may ask for six links of a mailbox in ten minutes, then waits', async () => {
    const strict = await impatient();
    const ask = (email: string) => browser(strict).post('/api/auth/link').send({ email });
    for (let i = 0; i < 6; i += 1) await ask(alderPeople.manager.email).expect(202);
    const refused = await ask(alderPeople.manager.email).expect(429);
    expect(refused.headers['retry-after']).toMatch(/^[1-9]\d*$/);
    expect(typeOf(refused.body)).toBe('too-many-requests');
    await ask(alderPeople.agent.email).expect(202);
    expect((await ask(` ${alderPeople.manager.email.toUpperCase()}`)).status).toBe(429);
    await strict.close();
  });

  test('guessing at links is slowed', async () => {
    const strict = await impatient();
    const statuses: number[] = [];
    for (let i = 0; i < 41; i += 1) statuses.push((await browser(strict).post('/api/auth/session').send({ token: `guess-${i}` })).status);
    expect(statuses.slice(0, 40).every((status) => status === 410)).toBe(true);
    expect(statuses[40]).toBe(429);
    await strict.close();
  });
});

test('answers forbid scripts, frames and guessing of types, and are not kept', async () => {
  const { headers } = await browser(server).get('/api/openapi.json');
  expect(headers['content-security-policy']).toContain("default-src 'none'");
  expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
  expect(headers['content-security-policy']).not.toContain('unsafe');
  expect(headers['x-content-type-options']).toBe('nosniff');
  expect(headers['cache-control']).toBe('no-store');
  expect(headers['x-powered-by']).toBeUndefined();
});

test('the health check says only that it is well', async () => {
  expect((await browser(server).get('/healthz').expect(200)).text).toBe('{"ok":true}');
});
