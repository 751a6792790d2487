import { expect, test } from 'vitest';
import { riskAt } from '../../../server/domain/risk';

test.each([
  [0.1, 100],
  [0.3, 200],
  [0.5, 300],
])('at a limit of %d the time lies between early and likely', (limit, at) => {
  expect(riskAt({ early: 100, likely: 300 }, limit)).toBe(at);
});

test('where only one of them is within the horizon, it is that one; where none is, never', () => {
  expect(riskAt({ early: 100, likely: null }, 0.5)).toBe(100);
  expect(riskAt({ early: null, likely: null }, 0.1)).toBeNull();
});
