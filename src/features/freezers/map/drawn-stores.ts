import { mapMarks, type MapMark, type MapStore } from '../../../../server/contract/fleet';
import { clusters, type Cluster } from '../../../map/clusters';
import { planeOf, screenOf, type Point, type Size, type View } from '../../../map/view';
import type { TagShape, TagTone } from '../../../ui/tag';

/** A store with its place on the plane of the whole map. */
export interface PlacedStore {
  store: MapStore;
  plane: Point;
}
/** One mark: where it lies on the map, and the stores it stands for, the worst first. */
export interface DrawnMark extends Point {
  stores: MapStore[];
  worst: MapStore;
}

export const looks: Record<MapMark, { shape: TagShape; tone: TagTone; colour: string }> = {
  first: { shape: 'triangle', tone: 'ember', colour: 'text-ember' },
  warm: { shape: 'diamond', tone: 'rust', colour: 'text-rust' },
  silent: { shape: 'ring', tone: 'straw', colour: 'text-straw' },
  fine: { shape: 'dot', tone: 'fjord', colour: 'text-fjord-2' },
};

/** Stops for a reader who tabs, and nodes for the browser, stay about this many however many stores there are. */
const mostMarks = 120;
const spacings = [30, 44, 60, 84, 120];

/** The worst first, then who runs out soonest; once for an answer, whatever is shown of it. */
export const placed = (stores: MapStore[]): PlacedStore[] =>
  stores.toSorted(byUrgency).map((store) => ({ store, plane: planeOf(store) }));

const byUrgency = (one: MapStore, other: MapStore): number =>
  mapMarks.indexOf(one.mark) - mapMarks.indexOf(other.mark) ||
  (one.likely ?? Infinity) - (other.likely ?? Infinity) ||
  (one.name < other.name ? -1 : 1);

/** Marks for every spacing at one scale, made when they are first needed: they stay as they are while a map is moved. */
export function spacedMarks(stores: PlacedStore[], scale: number): (spacing: number) => Cluster<PlacedStore & Point>[] {
  const points = stores.map((one) => ({ ...one, x: one.plane.x * scale, y: one.plane.y * scale }));
  const made = new Map<number, Cluster<PlacedStore & Point>[]>();
  return (spacing) => {
    const known = made.get(spacing) ?? clusters(points, spacing);
    made.set(spacing, known);
    return known;
  };
}

/** What is in view, the marks set wider until there are few enough. */
export function marksInView(spaced: ReturnType<typeof spacedMarks>, view: View, size: Size): DrawnMark[] {
  const at = screenOf(view, size);
  let shown: DrawnMark[] = [];
  for (const spacing of spacings) {
    shown = spaced(spacing).flatMap(({ first, members }) => {
      const point = at(first.plane);
      return within(point, size) ? [{ ...point, worst: first.store, stores: members.map(({ store }) => store) }] : [];
    });
    if (shown.length <= mostMarks) break;
  }
  return shown;
}

/** A mark at the very edge could not be pressed. */
const edge = 6;
const within = ({ x, y }: Point, { width, height }: Size): boolean => x >= edge && x <= width - edge && y >= edge && y <= height - edge;

/** The stores of the marks, in the order they have been placed in. */
export function storesOf(marks: DrawnMark[], inOrder: PlacedStore[]): MapStore[] {
  const shown = new Set(marks.flatMap(({ stores }) => stores));
  return inOrder.flatMap(({ store }) => (shown.has(store) ? [store] : []));
}
