import { useMemo, useState } from 'react';
import { fitView, panned, zoomed, type Place, type Point, type Size, type View } from './view';

export interface MapView {
  view: View;
  size: Size;
  /** Nobody has moved the map since it began to show these places. */
  whole: boolean;
  pan: (by: Point) => void;
  zoom: (factor: number) => void;
  centre: (at: Place) => void;
  /** As near as these places allow. */
  show: (places: Place[]) => void;
  showAll: () => void;
}

/** Shows all the places until somebody moves it, and all again when `subject` changes. */
export function useMapView(places: Place[], size: Size, subject = ''): MapView {
  const [moved, setMoved] = useState<{ subject: string; view: View } | null>(null);
  const fitted = useMemo(() => fitView(places, size), [places, size]);
  const view = moved?.subject === subject ? moved.view : fitted;
  // Several keys may come before one drawing, each from where the last one led.
  const move = (step: (view: View) => View) =>
    setMoved((now) => ({ subject, view: step(now?.subject === subject ? now.view : fitted) }));
  return {
    view,
    size,
    whole: view === fitted,
    pan: (by) => move((now) => panned(now, by)),
    zoom: (factor) => move((now) => zoomed(now, factor, size)),
    centre: ({ latitude, longitude }) => move((now) => ({ ...now, latitude, longitude })),
    show: (near) => move(() => fitView(near, size, 'zoomed')),
    showAll: () => setMoved(null),
  };
}

export const isNearest = ({ view, size }: MapView): boolean => zoomed(view, 1.01, size).scale === view.scale;
