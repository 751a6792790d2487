import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { beforeAll, expect, test } from 'vitest';
import { drawOutlines } from '../../../src/map/drawn-outlines';
import { countiesNear, outlinesOf, type Atlas, type Outlines } from '../../../src/map/outlines';
import { boundsOf, fitView, lower48 } from '../../../src/map/view';

const size = { width: 600, height: 400 };
const springfield = { latitude: 37.21, longitude: -93.29 };
let outlines: Outlines;

beforeAll(() => {
  const file = createRequire(import.meta.url).resolve('us-atlas/counties-10m.json');
  outlines = outlinesOf(JSON.parse(readFileSync(file, 'utf8')) as Atlas);
});

test('only the counties that the view touches', () => {
  const near = countiesNear(outlines, boundsOf(fitView([springfield], size), size)).map(({ properties }) => properties.name);
  expect(near).toContain('Greene');
  expect(near).toContain('Christian');
  expect(near).not.toContain('Mohave');
  expect(near.length).toBeGreaterThan(5);
  expect(near.length).toBeLessThan(25);
});

test('they are drawn within the map, with names where there is room', () => {
  const drawn = drawOutlines(outlines, fitView([springfield], size), size);
  const numbers = [...drawn.land.matchAll(/-?\d+(?:\.\d+)?/g)].map(Number);
  expect(numbers.length).toBeGreaterThan(50);
  expect(Math.min(...numbers)).toBeGreaterThanOrEqual(-8);
  expect(Math.max(...numbers)).toBeLessThanOrEqual(608);
  const greene = drawn.labels.find(({ name }) => name === 'Greene');
  expect(greene?.x).toBeGreaterThan(200);
  expect(greene?.x).toBeLessThan(400);
});

test('a coast seen from afar is drawn in few points', () => {
  const wide = drawOutlines(outlines, fitView(lower48, size), size);
  expect(wide.land.length).toBeGreaterThan(5_000);
  expect(wide.land.length).toBeLessThan(80_000);
});

test('a view of the whole country shows states', () => {
  const wide = drawOutlines(outlines, fitView(lower48, size), size);
  const names = wide.labels.map(({ name }) => name);
  expect(names).toContain('Texas');
  expect(names).not.toContain('Greene');
});
