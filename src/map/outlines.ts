import { feature, mesh } from 'topojson-client';
import type { GeometryCollection, Topology } from 'topojson-specification';
import type { Feature, Geometry, MultiLineString, MultiPolygon, Polygon } from 'geojson';
import countiesUrl from 'us-atlas/counties-10m.json?url';
import type { Bounds } from './view';

/** The file's shape: counties and states share their arcs. */
export type Atlas = Topology<{ counties: GeometryCollection<{ name: string }>; states: GeometryCollection<{ name: string }> }>;
export type Area = Feature<Polygon | MultiPolygon, { name: string }>;

interface Outline {
  area: Area;
  bounds: Bounds;
}

export interface Outlines {
  counties: Outline[];
  states: Outline[];
  /** The lines between states, once each. */
  borders: MultiLineString;
}

let loaded: Promise<Outlines> | undefined;

/** Fetched once; a failure is forgotten, so that the next who asks tries again. */
export const loadOutlines = (): Promise<Outlines> =>
  (loaded ??= fetchAtlas()
    .then(outlinesOf)
    .catch((error: unknown) => {
      loaded = undefined;
      throw error;
    }));

async function fetchAtlas(): Promise<Atlas> {
  const answer = await fetch(countiesUrl);
  if (!answer.ok) throw new Error(`no outlines: ${answer.status}`);
  // Our own file, of a version that package.json fixes.
  return (await answer.json()) as Atlas;
}

export function outlinesOf(atlas: Atlas): Outlines {
  const { counties, states } = atlas.objects;
  return {
    counties: areasOf(atlas, counties),
    states: areasOf(atlas, states),
    borders: mesh(atlas, states, (one, other) => one !== other),
  };
}

const areasOf = (atlas: Atlas, objects: GeometryCollection<{ name: string }>): Outline[] =>
  feature(atlas, objects).features.filter(isArea).map((area) => ({ area, bounds: extentOf(area.geometry) }));

const isArea = (shape: Feature<Geometry, { name: string }>): shape is Area =>
  shape.geometry.type === 'Polygon' || shape.geometry.type === 'MultiPolygon';

/** Plain smallest and largest degrees, which is all that a choice by view needs. */
function extentOf(geometry: Polygon | MultiPolygon): Bounds {
  let [west, south, east, north] = [Infinity, Infinity, -Infinity, -Infinity];
  const rings = geometry.type === 'Polygon' ? geometry.coordinates : geometry.coordinates.flat();
  for (const ring of rings) {
    for (const [longitude = 0, latitude = 0] of ring) {
      west = Math.min(west, longitude);
      south = Math.min(south, latitude);
      east = Math.max(east, longitude);
      north = Math.max(north, latitude);
    }
  }
  return [west, south, east, north];
}

/** Only what may be seen. */
export const countiesNear = ({ counties }: Outlines, bounds: Bounds): Area[] => near(counties, bounds);
export const statesNear = ({ states }: Outlines, bounds: Bounds): Area[] => near(states, bounds);

const near = (outlines: Outline[], [west, south, east, north]: Bounds): Area[] =>
  outlines
    .filter(({ bounds }) => bounds[0] <= east && bounds[2] >= west && bounds[1] <= north && bounds[3] >= south)
    .map(({ area }) => area);
