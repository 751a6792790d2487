import { expect, test } from 'vitest';
import type { MapMark, MapStore } from '../../../server/contract/fleet';
import { marksInView, placed, spacedMarks, storesOf } from '../../../src/features/freezers/map/drawn-stores';
import { fitView } from '../../../src/map/view';

const size = { width: 640, height: 480 };
const store = (id: string, mark: MapMark, latitude: number, longitude: number, likely: number | null = null): MapStore => ({
  id, name: `Store ${id}`, city: 'Marlow', latitude, longitude, freezers: 1, mark, likely,
});

const drawn = (stores: MapStore[], shown = stores) => {
  const view = fitView(shown, size);
  const inOrder = placed(stores);
  const marks = marksInView(spacedMarks(inOrder, view.scale), view, size);
  return { marks, rows: storesOf(marks, inOrder) };
};

test('worst first, then who runs out soonest, and those who do not last', () => {
  const { rows } = drawn([
    store('fine', 'fine', 36.1, -93, 5),
    store('late', 'first', 36.2, -93.2, 9),
    store('never', 'first', 36.3, -93.4),
    store('soon', 'first', 36.4, -93.6, 2),
    store('warm', 'warm', 36.5, -93.8),
    store('silent', 'silent', 36.6, -94),
  ]);
  expect(rows.map(({ id }) => id)).toEqual(['warm', 'soon', 'late', 'never', 'silent', 'fine']);
});

test('of stores together the worst gives the mark its shape', () => {
  const { marks } = drawn([store('a', 'fine', 36.4, -93.1), store('b', 'first', 36.4001, -93.1001), store('far', 'fine', 37.4, -94)]);
  expect(marks.map(({ worst, stores }) => [worst.id, stores.length])).toEqual([['b', 2], ['far', 1]]);
});

test('what is out of view has neither mark nor row', () => {
  const near = [store('a', 'fine', 36.4, -93.1)];
  const { marks, rows } = drawn([...near, store('far', 'warm', 40, -100)], near);
  expect(marks).toHaveLength(1);
  expect(rows.map(({ id }) => id)).toEqual(['a']);
});

test('fifteen thousand stores are few marks, and all of them are counted', () => {
  const many = Array.from({ length: 15_000 }, (_, i) => store(String(i), i % 40 ? 'fine' : 'warm', 37 + 9 * Math.sin(i * 12.9898), -95 + 25 * Math.sin(i * 78.233)));
  const { marks, rows } = drawn(many);
  expect(marks.length).toBeLessThanOrEqual(120);
  expect(marks.length).toBeGreaterThan(20);
  expect(rows).toHaveLength(15_000);
});
