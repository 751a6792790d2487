import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { safeNext } from '../../../src/features/sign-in/safe-next';

describe('where a person goes on to after signing in', () => {
  test.each(['/kestrel-bend/stores', '/kestrel-bend/requests?state=any&q=SR-1002', '/profile'])('a path of this application stays: %s', (path) => {
    expect(safeNext(path)).toBe(path);
  });

  test.each([
    null,
    '',
    '/',
    'https://elsewhere.example/',
    '//elsewhere.example/x',
    '/\\elsewhere.example',
    '/x\\..\\y',
    '\\\\elsewhere.example',
    'javascript:alert(1)',
    '/\t/elsewhere.example',
    '/ok\n//elsewhere.example',
    '/..//elsewhere.example',
    '/api/me',
    '/dev/people',
    '/sign-in?next=/x',
    'stores',
  ])('anything else falls back to the front page: %j', (path) => {
    expect(safeNext(path)).toBeNull();
  });

  test('whatever it says, the browser would stay on this site', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string({ unit: 'binary' }), fc.webUrl(), fc.string().map((rest) => `/${rest}`)), (wanted) => {
        const next = safeNext(wanted);
        if (next !== null) expect(new URL(next, 'https://here.example').origin).toBe('https://here.example');
      }),
      { numRuns: 2_000 },
    );
  });
});
