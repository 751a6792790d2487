import { useMemo } from 'react';
import { drawOutlines, type DrawnOutlines, type Label } from './drawn-outlines';
import { useOutlines } from './use-outlines';
import { planeOf, screenOf, sheetOf, type Point, type Size, type View } from './view';

/** The ground: outlines of counties, or of states where the view is wide. Drawn on a sheet that is moved about. */
export function Land({ view, size }: { view: View; size: Size }) {
  const sheet = sheetOf(view, size);
  const drawn = useDrawn(sheet.latitude, sheet.longitude, sheet.scale, size);
  if (!drawn) return null;
  const middle = screenOf(view, size)(planeOf(sheet));
  const corner = { x: middle.x - size.width, y: middle.y - size.height };
  return (
    <svg
      aria-hidden
      width={2 * size.width}
      height={2 * size.height}
      className="pointer-events-none absolute top-0 left-0 max-w-none select-none will-change-transform"
      style={{ transform: `translate(${corner.x}px, ${corner.y}px)` }}
    >
      <path d={drawn.land} className="fill-ice-3 stroke-ice" strokeLinejoin="round" />
      <path d={drawn.borders} fill="none" className="stroke-ice-2" strokeWidth="1.2" strokeLinejoin="round" />
      {drawn.labels
        .filter((label) => isWhole(label, corner, size))
        .map(({ name, x, y }) => (
          <text key={`${name} ${x}`} x={x} y={y} textAnchor="middle" className="fill-ink-3 text-[11px]">
            {name}
          </text>
        ))}
    </svg>
  );
}

/** By value: the same sheet is not drawn twice. */
function useDrawn(latitude: number, longitude: number, scale: number, size: Size): DrawnOutlines | undefined {
  const outlines = useOutlines();
  return useMemo(
    () => outlines && drawOutlines(outlines, { latitude, longitude, scale }, { width: 2 * size.width, height: 2 * size.height }),
    [outlines, latitude, longitude, scale, size],
  );
}

/** No name is cut by the edge of the map. */
const isWhole = ({ x, y, half }: Label, corner: Point, { width, height }: Size): boolean =>
  x + corner.x > half + 6 && x + corner.x < width - half - 6 && y + corner.y > 16 && y + corner.y < height - 10;
