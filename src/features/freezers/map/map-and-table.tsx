import { useDeferredValue, useMemo, useState } from 'react';
import type { MapStore } from '../../../../server/contract/fleet';
import { useMapSize } from '../../../map/use-map-size';
import { useMapView } from '../../../map/use-map-view';
import { marksInView, placed, spacedMarks, storesOf } from './drawn-stores';
import { StoresCanvas } from './stores-canvas';
import { StoresInView } from './stores-in-view';
import { useStoreSaid } from './use-store-said';

interface Props {
  stores: MapStore[];
  /** Of the question that they answer: another one is shown whole again. */
  subject: string;
}

/** Until the width is known the table already says what a map of usual size would show. */
const usual = { width: 640, height: 480 };

export function MapAndTable({ stores, subject }: Props) {
  const [box, known] = useMapSize();
  const size = known ?? usual;
  const map = useMapView(stores, size, subject);
  const { view } = map;
  const inOrder = useMemo(() => placed(stores), [stores]);
  const spaced = useMemo(() => spacedMarks(inOrder, view.scale), [inOrder, view.scale]);
  const marks = useMemo(() => marksInView(spaced, view, size), [spaced, view, size]);
  const seen = useDeferredValue(useMemo(() => storesOf(marks, inOrder), [marks, inOrder]));
  const said = useStoreSaid();
  const [pointedAt, setPointedAt] = useState<string[]>([]);
  const lit = useMemo(() => new Set(pointedAt), [pointedAt]);
  return (
    <div className="grid items-start gap-5 xl:grid-cols-2">
      <div ref={box} className="min-h-80 min-w-0 xl:sticky xl:top-[calc(var(--banner)+1rem)]">
        {known && <StoresCanvas map={map} marks={marks} lit={lit} said={said} onLight={setPointedAt} />}
      </div>
      <StoresInView stores={seen} lit={lit} said={said} onLight={setPointedAt} />
    </div>
  );
}
