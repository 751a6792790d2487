import { expect, test } from 'vitest';
import { evenPlaces } from '../../../src/features/freezers/sensor/probe-places';

test('three probes hang at a sixth, the half and five sixths of the width', () => {
  expect(evenPlaces(3, 60)).toEqual([10, 30, 50]);
});

test('one probe hangs in the middle', () => {
  expect(evenPlaces(1, 45)).toEqual([22.5]);
});

test.each([2, 3, 5, 8])('%i probes go from left to right inside the walls, to a tenth of an inch', (probes) => {
  const places = evenPlaces(probes, 51.3);
  expect(places).toHaveLength(probes);
  expect(places).toEqual([...new Set(places)].sort((a, b) => a - b));
  expect(Math.min(...places)).toBeGreaterThan(0);
  expect(Math.max(...places)).toBeLessThan(51.3);
  for (const place of places) expect(Number(place.toFixed(1))).toBe(place);
});
