import { expect, test } from 'vitest';
import { clusters } from '../../../src/map/clusters';

const at = (x: number, y: number, id = `${x},${y}`) => ({ x, y, id });
const idsOf = (found: ReturnType<typeof clusters<ReturnType<typeof at>>>) => found.map(({ members }) => members.map(({ id }) => id));

test('what lies apart keeps its own mark', () => {
  expect(idsOf(clusters([at(0, 0), at(40, 0), at(0, 40)], 30))).toEqual([['0,0'], ['40,0'], ['0,40']]);
});

test('what lies together becomes one mark, and the first given is its first', () => {
  const [one, ...more] = clusters([at(10, 10, 'worst'), at(12, 14), at(31, 10)], 30);
  expect(more).toEqual([]);
  expect(one?.first.id).toBe('worst');
  expect(one?.members).toHaveLength(3);
});

test('the edge of a cell, and the middle of the plane, part nothing', () => {
  expect(clusters([at(29.9, 5), at(30.1, 5)], 30)).toHaveLength(1);
  expect(clusters([at(-1, -1), at(1, 1)], 30)).toHaveLength(1);
});

test('a point goes to the nearer of two marks', () => {
  expect(idsOf(clusters([at(0, 0), at(40, 0), at(25, 0)], 30))).toEqual([['0,0'], ['40,0', '25,0']]);
});

test('fifteen thousand points: none lost, no two marks closer than asked', () => {
  // A fixed scatter, thick in the middle.
  const many = Array.from({ length: 15_000 }, (_, i) => at(Math.sin(i * 12.9898) ** 3 * 900, Math.sin(i * 78.233) ** 3 * 700, String(i)));
  const found = clusters(many, 28);
  expect(found.reduce((sum, { members }) => sum + members.length, 0)).toBe(15_000);
  const firsts = found.map(({ first }) => first);
  let closest = Infinity;
  for (const [i, one] of firsts.entries()) for (const other of firsts.slice(i + 1)) closest = Math.min(closest, Math.hypot(one.x - other.x, one.y - other.y));
  expect(closest).toBeGreaterThanOrEqual(28);
});
