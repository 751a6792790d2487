import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { api, endpoints } from '../../../server/contract';
import { day, email, id, paging, slug, timeOfDay, words } from '../../../server/contract/common';
import { problems, problemTypeOf, problemTypePrefix } from '../../../server/contract/problem';
import { liveStates, reservedSlugs } from '../../../server/contract/words';
import * as z from 'zod/mini';

const takes = (schema: z.ZodMiniType, value: unknown): boolean => schema.safeParse(value).success;

describe('words', () => {
  test('ends are trimmed and control characters go, line breaks stay', () => {
    expect(words(50).parse('  one\ntwo\u0000\u0007 ')).toBe('one\ntwo');
  });
  test('length is counted after that', () => {
    expect(takes(words(3, 1), '  abc  ')).toBe(true);
    expect(takes(words(3, 1), 'abcd')).toBe(false);
    expect(takes(words(3, 1), ' \u0000 ')).toBe(false);
  });
});

describe('an address', () => {
  test('is one, in small letters', () => {
    expect(email.parse('  Marta@Lantern.example ')).toBe('marta@lantern.example');
  });
  test.each(['a@b.example,c@d.example', 'a@b.example\nbcc: c@d.example', 'Marta <a@b.example>', '@b.example', 'a@', '', 'a b@c.example'])('%j is none', (given) => {
    expect(takes(email, given)).toBe(false);
  });
});

describe('names and times', () => {
  test.each([
    [slug, 'kestrel-bend', true],
    [slug, 'K', false],
    [slug, '-ab', false],
    [timeOfDay, '23:59', true],
    [timeOfDay, '24:00', false],
    [day, '2026-02-28', true],
    [day, '2026-02-30', false],
    [id, '0190b2c4-0000-7000-8000-000000000001', true],
    [id, "1' or '1", false],
  ] as const)('%#: %j %s', (schema, value, good) => {
    expect(takes(schema, value)).toBe(good);
  });
  test('a page is asked for by a whole number from 1 to 200', () => {
    const page = z.strictObject(paging);
    for (const limit of ['1', '200', '050']) expect(takes(page, { limit }), limit).toBe(true);
    for (const limit of ['0', '201', '-1', '1.5', '', 'ten', ['1']]) expect(takes(page, { limit }), String(limit)).toBe(false);
  });
});

test('every body and query refuses what it does not know', () => {
  const asked = endpoints.flatMap(({ id: name, body, query, access }) => (access.kind === 'dev' || access.kind === 'telemetry-key' ? [] : [[name, body], [name, query]] as const));
  for (const [name, schema] of asked) {
    if (!schema) continue;
    const result = schema.safeParse({ smuggled: 1 });
    expect(result.error?.issues.some(({ code }) => code === 'unrecognized_keys'), name).toBe(true);
  }
});

test('whatever a body is, parsing answers and does not throw', () => {
  const bodies = endpoints.flatMap(({ body }) => (body ? [body] : []));
  fc.assert(
    fc.property(fc.jsonValue(), (value) => {
      for (const body of bodies) expect(typeof body.safeParse(value).success).toBe('boolean');
    }),
    { numRuns: 300 },
  );
});

test('a code may be written with spaces and hyphens', () => {
  expect(api.auth.signIn.body.parse({ code: '123 4-56' })).toEqual({ code: '123456' });
  expect(takes(api.auth.signIn.body, { code: '12345' })).toBe(false);
});

test('problem types are told apart by their name, unknown ones are server errors', () => {
  for (const type of Object.keys(problems)) expect(problemTypeOf({ type: problemTypePrefix + type })).toBe(type);
  expect(problemTypeOf({ type: 'about:blank' })).toBe('server-error');
  for (const status of Object.values(problems)) expect(status).toBeGreaterThanOrEqual(400);
});

test('every endpoint promises only problems there are, and an answer', () => {
  for (const { id: name, problems: promised, result, answer, method } of endpoints) {
    for (const type of promised) expect(Object.keys(problems), name).toContain(type);
    expect(Boolean(result) !== Boolean(answer && answer !== 'json'), name).toBe(true);
    expect(method === 'get' && answer === 'nothing', name).toBe(false);
  }
});

test('roots of the server cannot be taken by a producer', () => {
  const roots = endpoints.filter(({ path }) => !path.startsWith('/api/:producer')).map(({ path }) => path.replace(/^\/(api\/)?/, '').split('/')[0]);
  for (const root of roots) expect(reservedSlugs).toContain(root);
  expect(liveStates).not.toContain('solved');
});
