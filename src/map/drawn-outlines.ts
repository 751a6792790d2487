import { geoMercator, geoPath, type GeoPath, type GeoStream } from 'd3-geo';
import { countiesNear, statesNear, type Area, type Outlines } from './outlines';
import { boundsOf, type Point, type Size, type View } from './view';

export interface Label extends Point {
  name: string;
  /** Half of its width. */
  half: number;
}

/** Outlines as paths of an SVG. */
export interface DrawnOutlines {
  /** Filled, with its own edge. */
  land: string;
  borders: string;
  /** Names of the areas that have room for them. */
  labels: Label[];
}

/** Wider than this a view shows states; their counties would be a grey web. */
const widestOfCounties = 24;

export function drawOutlines(outlines: Outlines, view: View, size: Size): DrawnOutlines {
  const path = pathOf(view, size);
  const bounds = boundsOf(view, size);
  const fine = bounds[2] - bounds[0] <= widestOfCounties;
  const areas = fine ? countiesNear(outlines, bounds) : statesNear(outlines, bounds);
  return {
    land: path({ type: 'FeatureCollection', features: areas }) ?? '',
    borders: fine ? (path(outlines.borders) ?? '') : '',
    labels: areas.flatMap((area) => labelOf(area, path)),
  };
}

/** Lines are drawn straight, as the census has them, and cut just outside of the map. */
function pathOf(view: View, { width, height }: Size): GeoPath {
  const projection = geoMercator()
    .precision(0)
    .scale(view.scale)
    .center([view.longitude, view.latitude])
    .translate([width / 2, height / 2])
    .clipExtent([[-8, -8], [width + 8, height + 8]]);
  return geoPath({ stream: (sink) => projection.stream(thinned(sink)) }).digits(1);
}

const leastStep = 0.9;

/** Leaves out what is nearer to the last point than an eye could tell; a coast seen from afar is mostly that. */
function thinned(sink: GeoStream): GeoStream {
  let last: Point | null = null;
  return {
    point: (x, y) => {
      if (last && Math.abs(x - last.x) < leastStep && Math.abs(y - last.y) < leastStep) return;
      last = { x, y };
      sink.point(x, y);
    },
    lineStart: () => {
      last = null;
      sink.lineStart();
    },
    lineEnd: () => sink.lineEnd(),
    polygonStart: () => sink.polygonStart(),
    polygonEnd: () => sink.polygonEnd(),
  };
}

const letter = 6.4;

function labelOf(area: Area, path: GeoPath): Label[] {
  const [[left, top], [right, bottom]] = path.bounds(area);
  const { name } = area.properties;
  const half = (name.length * letter) / 2;
  if (right - left < 2 * half + 16 || bottom - top < 40) return [];
  const [x, y] = path.centroid(area);
  return [{ name, half, x, y }];
}
