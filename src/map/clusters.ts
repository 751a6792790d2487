import type { Point } from './view';

/** The points of one mark: it stands where the first of them does. */
export interface Cluster<P extends Point> {
  first: P;
  members: P[];
}

/**
 * One mark for what lies closer together than so many pixels. The first points come first: given worst first, the
 * worst of a mark is its `first`. Marks never overlap, and stay the same however the map is moved, if the points are
 * given in a plane that does not move with it.
 */
export function clusters<P extends Point>(points: P[], cellPx: number): Cluster<P>[] {
  const cells = new Map<number, Cluster<P>[]>();
  const found: Cluster<P>[] = [];
  for (const point of points) {
    const column = Math.floor(point.x / cellPx);
    const row = Math.floor(point.y / cellPx);
    const near = nearest(cells, column, row, point, cellPx);
    if (near) {
      near.members.push(point);
      continue;
    }
    const cluster = { first: point, members: [point] };
    found.push(cluster);
    const key = keyOf(column, row);
    cells.set(key, [...(cells.get(key) ?? []), cluster]);
  }
  return found;
}

/** The clusters closer than a cell's width can only be in the nine cells about the point. */
function nearest<P extends Point>(cells: Map<number, Cluster<P>[]>, column: number, row: number, point: Point, cellPx: number) {
  let best: Cluster<P> | undefined;
  let least = cellPx;
  for (let x = column - 1; x <= column + 1; x++) {
    for (let y = row - 1; y <= row + 1; y++) {
      for (const cluster of cells.get(keyOf(x, y)) ?? []) {
        const distance = Math.hypot(cluster.first.x - point.x, cluster.first.y - point.y);
        if (distance >= least) continue;
        best = cluster;
        least = distance;
      }
    }
  }
  return best;
}

/** Far more columns and rows than the deepest zoom has. */
const keyOf = (column: number, row: number) => column * 2 ** 24 + row;
