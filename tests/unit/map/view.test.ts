import { expect, test } from 'vitest';
import { boundsOf, fitView, lower48, panned, placeAt, planeOf, screenOf, sheetOf, zoomed, type Place } from '../../../src/map/view';

const size = { width: 600, height: 400 };
const marlow = { latitude: 36.42, longitude: -93.1 };
const others: Place[] = [marlow, { latitude: 36.9, longitude: -92.4 }, { latitude: 37.3, longitude: -93.8 }];

const onScreen = (place: Place, view = fitView(others, size)) => screenOf(view, size)(planeOf(place));
/** Across the map at its middle, by the length of a degree there. */
function milesHigh(places: Place[]) {
  const [, south, , north] = boundsOf(fitView(places, size), size);
  return (north - south) * 69.1;
}

test('all places lie on the map, with room about them', () => {
  for (const place of others) {
    const { x, y } = onScreen(place);
    expect(Math.min(x, y, size.width - x, size.height - y)).toBeGreaterThan(31);
  }
});

test('they fill it as far as they can', () => {
  const ys = others.map((place) => onScreen(place).y);
  expect(Math.max(...ys) - Math.min(...ys)).toBeCloseTo(size.height - 64, 6);
});

test('one place, or the same one twice, is shown with about forty miles around it', () => {
  expect(milesHigh([marlow])).toBeCloseTo(40, 0);
  expect(milesHigh([marlow, marlow])).toBeCloseTo(40, 0);
  expect(onScreen(marlow, fitView([marlow], size))).toEqual({ x: 300, y: 200 });
});

test('without a place, the lower 48 states', () => {
  expect(fitView([], size)).toEqual(fitView(lower48, size));
});

test('a point of the map leads back to its place', () => {
  const view = fitView(others, size);
  for (const place of others) {
    const back = placeAt(view, size, onScreen(place, view));
    expect(back.latitude).toBeCloseTo(place.latitude, 9);
    expect(back.longitude).toBeCloseTo(place.longitude, 9);
  }
});

test('north is up and east is right', () => {
  const [west, south, east, north] = boundsOf(fitView(others, size), size);
  expect(west).toBeLessThan(-93.8);
  expect(east).toBeGreaterThan(-92.4);
  expect(south).toBeLessThan(36.42);
  expect(north).toBeGreaterThan(37.3);
});

test('panning moves what is shown by so many pixels', () => {
  const view = fitView(others, size);
  const before = onScreen(marlow, view);
  const after = onScreen(marlow, panned(view, { x: 60, y: -40 }));
  expect(after.x).toBeCloseTo(before.x - 60, 6);
  expect(after.y).toBeCloseTo(before.y + 40, 6);
});

test('zooming ends at both ends', () => {
  const view = fitView(others, size);
  expect(zoomed(view, 2, size).scale).toBeCloseTo(2 * view.scale, 6);
  const deepest = zoomed(view, 1e9, size);
  expect(zoomed(deepest, 2, size).scale).toBe(deepest.scale);
  const widest = zoomed(view, 1e-9, size);
  expect(zoomed(widest, 0.5, size).scale).toBe(widest.scale);
});

test('a sheet of twice the size covers the map, and stays while it moves a little', () => {
  const view = fitView(others, size);
  const sheet = sheetOf(view, size);
  const middle = screenOf(view, size)(planeOf(sheet));
  expect(Math.abs(middle.x - 300)).toBeLessThanOrEqual(150);
  expect(Math.abs(middle.y - 200)).toBeLessThanOrEqual(100);
  const centred = { ...view, ...sheet };
  expect(sheetOf(panned(centred, { x: 100, y: 60 }), size).longitude).toBeCloseTo(sheet.longitude, 9);
  expect(sheetOf(panned(centred, { x: 200, y: 0 }), size).longitude).toBeGreaterThan(sheet.longitude);
});
