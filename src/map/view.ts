/** A place on earth, in degrees. */
export interface Place {
  latitude: number;
  longitude: number;
}

export interface Point {
  x: number;
  y: number;
}

/** In pixels. */
export interface Size {
  width: number;
  height: number;
}

/** What a map shows: the place in its middle, and pixels per radian at the equator (Mercator's projection). */
export interface View extends Place {
  scale: number;
}

/** West, south, east, north, in degrees. */
export type Bounds = readonly [west: number, south: number, east: number, north: number];

/** The states between Canada, Mexico and the seas. */
export const lower48: Place[] = [
  { latitude: 24.5, longitude: -124.8 },
  { latitude: 49.4, longitude: -66.9 },
];

const earthMiles = 3958.8;
/** What the smaller side of the map shows of one place alone, and at the deepest zoom. */
const leastMiles = { shown: 40, zoomed: 1.5 };
const padding = 32;
const radians = Math.PI / 180;

/** Mercator's plane in radians, y southwards. */
export const planeOf = ({ latitude, longitude }: Place): Point => ({
  x: longitude * radians,
  y: -Math.log(Math.tan(Math.PI / 4 + (latitude * radians) / 2)),
});

const placeOf = ({ x, y }: Point): Place => ({
  latitude: (2 * Math.atan(Math.exp(-y)) - Math.PI / 2) / radians,
  longitude: x / radians,
});

/** Shows all the places with room about them, and of a single one its surroundings. */
export function fitView(places: Place[], size: Size, least: keyof typeof leastMiles = 'shown'): View {
  const { low, high } = cornersOf((places.length > 0 ? places : lower48).map(planeOf));
  const middle = placeOf({ x: (low.x + high.x) / 2, y: (low.y + high.y) / 2 });
  const room = { width: Math.max(1, size.width - 2 * padding), height: Math.max(1, size.height - 2 * padding) };
  const scale = Math.min(room.width / (high.x - low.x), room.height / (high.y - low.y), scaleOf(leastMiles[least], middle, size));
  return { ...middle, scale };
}

function cornersOf(points: Point[]): { low: Point; high: Point } {
  const low = { x: Infinity, y: Infinity };
  const high = { x: -Infinity, y: -Infinity };
  for (const { x, y } of points) {
    low.x = Math.min(low.x, x);
    low.y = Math.min(low.y, y);
    high.x = Math.max(high.x, x);
    high.y = Math.max(high.y, y);
  }
  return { low, high };
}

/** At which the smaller side of the map shows so many miles. */
const scaleOf = (miles: number, { latitude }: Place, { width, height }: Size): number =>
  (Math.min(width, height) * earthMiles * Math.cos(latitude * radians)) / miles;

/** Where a place lies on the map. */
export function screenOf(view: View, { width, height }: Size): (plane: Point) => Point {
  const middle = planeOf(view);
  return ({ x, y }) => ({ x: (x - middle.x) * view.scale + width / 2, y: (y - middle.y) * view.scale + height / 2 });
}

/** Which place lies under a point of the map. */
export function placeAt(view: View, { width, height }: Size, { x, y }: Point): Place {
  const middle = planeOf(view);
  return placeOf({ x: middle.x + (x - width / 2) / view.scale, y: middle.y + (y - height / 2) / view.scale });
}

export function boundsOf(view: View, size: Size): Bounds {
  const northWest = placeAt(view, size, { x: 0, y: 0 });
  const southEast = placeAt(view, size, { x: size.width, y: size.height });
  return [northWest.longitude, southEast.latitude, southEast.longitude, northWest.latitude];
}

/** Shows what lies so many pixels to the right and below; never leaves the places that have outlines. */
export function panned(view: View, { x, y }: Point): View {
  const { latitude, longitude } = placeAt(view, { width: 0, height: 0 }, { x, y });
  return { ...view, latitude: between(-20, latitude, 74), longitude: between(-179, longitude, -60) };
}

/** Where to draw a sheet twice the map's size, so that it need not be drawn anew until the map has moved half its size. */
export function sheetOf(view: View, { width, height }: Size): View {
  const { x, y } = planeOf(view);
  const snap = (at: number, step: number) => (Math.round((at * view.scale) / step) * step) / view.scale;
  return { ...placeOf({ x: snap(x, width / 2), y: snap(y, height / 2) }), scale: view.scale };
}

export function zoomed(view: View, factor: number, size: Size): View {
  const widest = fitView(lower48, size).scale / 3;
  return { ...view, scale: between(widest, view.scale * factor, scaleOf(leastMiles.zoomed, view, size)) };
}

const between = (low: number, value: number, high: number) => Math.min(high, Math.max(low, value));
