import fc from 'fast-check';
import { afterAll, beforeAll, expect, test } from 'vitest';
import type { Endpoint } from '../../server/contract/endpoint';
import { alderPeople } from '../cast';
import { cookieOf, testApp, type TestApp } from '../support/server';
import { call } from '../isolation/call';
import { cases, ingestWithKey, type Case } from '../isolation/cases';

/** Short form of the fuzz: what nobody would send to every route that takes a body, and raw bytes to all. */

let server: TestApp;
let cookie: string;
beforeAll(async () => {
  server = await testApp('alder');
  cookie = cookieOf(server, alderPeople.admin.email);
});
afterAll(() => server.close());

const taking = [...cases, ingestWithKey].filter(({ body, endpoint }) => body && endpoint.access.kind !== 'dev');

/** A sound body with some of its values put out of shape, or something else altogether. */
const spoiled = (sound: unknown): fc.Arbitrary<unknown> => {
  const odd = fc.oneof(fc.jsonValue(), fc.constantFrom(null, '', -1, 1e308, Number.MIN_SAFE_INTEGER, '\u0000', '\ud800', '9999-12-31', '0000-00-00', [], {}, 'x'.repeat(5000)));
  if (typeof sound !== 'object' || sound === null || Array.isArray(sound)) return odd;
  const fields = Object.entries(sound).map(([key, value]): [string, fc.Arbitrary<unknown>] => [key, fc.oneof({ weight: 3, arbitrary: fc.constant(value) }, { weight: 1, arbitrary: odd })]);
  return fc.oneof({ weight: 4, arbitrary: fc.record(Object.fromEntries(fields), { noNullPrototype: true }) }, { weight: 1, arbitrary: odd });
};

const soundOf = ({ named, body }: Case): unknown => body?.(Object.fromEntries(Object.entries(named ?? {}).map(([name, { own }]) => [name, own])));
/** Two hundred cases over all routes; what a route promises is all it may answer. */
test.each(taking.map((one): [string, Case] => [one.endpoint.id, one]))('%s answers garbage in words', async (_id, one) => {
  await fc.assert(
    fc.asyncProperty(spoiled(soundOf(one)), async (body) => {
      const { status, body: said } = await server.undone(() => call(server, { ...one, body: () => body }, cookie));
      expect(status, said).toBeLessThan(500);
      if (status >= 400) expect(JSON.parse(said).type, said).toMatch(/^urn:nilas:problem:/);
    }),
    { numRuns: 40, seed: 7 },
  );
});

test('raw bytes in path, query and body are answered in words', async () => {
  const paths = cases.map(({ endpoint }): Endpoint => endpoint).filter(({ access }) => access.kind !== 'dev');
  await fc.assert(
    fc.asyncProperty(fc.constantFrom(...paths), fc.uint8Array({ maxLength: 60 }), fc.webQueryParameters(), async ({ method, path }, bytes, query) => {
      const filled = path.replace(':producer', 'alder-ice').replace(/:\w+/g, () => `x${Buffer.from(bytes).toString('hex')}`);
      const status = await server.undone(async () => {
        const answer = await fetch(`${server.url}${filled}?${query}`, {
          method,
          headers: { cookie, 'sec-fetch-site': 'same-origin', 'content-type': 'application/json' },
          body: method === 'get' ? undefined : bytes.slice(),
        });
        await answer.arrayBuffer();
        return answer.status;
      });
      expect(status).toBeLessThan(500);
    }),
    { numRuns: 300, seed: 7 },
  );
});
