import type { KeyboardEvent, ReactNode, Ref } from 'react';
import { Land } from './land';
import { MapButtons } from './map-buttons';
import { useDrag } from './use-drag';
import type { MapView } from './use-map-view';
import { placeAt, type Place, type Point } from './view';

interface Props {
  map: MapView;
  label: string;
  /** `application` where the arrow keys do something else than move what is shown. */
  role: 'group' | 'application';
  describedBy?: string;
  canvasRef?: Ref<HTMLDivElement>;
  /** Of an arrow key, one pixel long; moves what is shown unless given. */
  onArrow?: (towards: Point, event: KeyboardEvent) => void;
  /** A press on the map itself. */
  onPress: (at: Place) => void;
  /** Above the map, next to its buttons. */
  beside: ReactNode;
  children: ReactNode;
}

const step = 64;

/** A map that can be moved by keys, by dragging and by its buttons; marks lie over it. */
export function MapCanvas({ map, label, role, describedBy, canvasRef, onArrow, onPress, beside, children }: Props) {
  const drag = useDrag(map.pan, (at) => onPress(placeAt(map.view, map.size, at)));
  const press = (event: KeyboardEvent<HTMLDivElement>) => {
    if (event.target !== event.currentTarget || event.ctrlKey || event.metaKey || event.altKey) return;
    const towards = arrows[event.key];
    const factor = zooms[event.key];
    if (!towards && !factor) return;
    event.preventDefault();
    if (factor) map.zoom(factor);
    else if (towards && onArrow) onArrow(towards, event);
    else if (towards) map.pan({ x: towards.x * step, y: towards.y * step });
  };
  return (
    <>
      <div className="mb-2 flex flex-wrap items-center gap-x-4 gap-y-2">
        {beside}
        <MapButtons map={map} />
      </div>
      <div className={frame} style={{ height: map.size.height }}>
        <div
          ref={canvasRef}
          role={role}
          aria-label={label}
          aria-describedby={describedBy}
          tabIndex={0}
          onKeyDown={press}
          className="absolute inset-0 outline-none"
        >
          <div className="absolute inset-0" {...drag}>
            <Land view={map.view} size={map.size} />
          </div>
          {children}
        </div>
      </div>
    </>
  );
}

/** The ring of focus lies over the land. */
const frame =
  'relative w-full overflow-hidden rounded-card border border-rule bg-paper after:pointer-events-none after:absolute after:inset-0 after:z-30 after:rounded-card has-[>:focus-visible]:after:outline-2 has-[>:focus-visible]:after:-outline-offset-2 has-[>:focus-visible]:after:outline-fjord';

const arrows: Partial<Record<string, Point>> = {
  ArrowLeft: { x: -1, y: 0 },
  ArrowRight: { x: 1, y: 0 },
  ArrowUp: { x: 0, y: -1 },
  ArrowDown: { x: 0, y: 1 },
};
const zooms: Partial<Record<string, number>> = { '+': 2, '=': 2, '-': 0.5 };
