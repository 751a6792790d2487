import { useId, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { MapCanvas } from '../../../map/map-canvas';
import { isNearest, type MapView } from '../../../map/use-map-view';
import type { DrawnMark } from './drawn-stores';
import { Legend } from './legend';
import { StoreMark } from './store-mark';
import { rowIdOf } from './stores-table';
import type { StoreSaid } from './use-store-said';

interface Props {
  map: MapView;
  marks: DrawnMark[];
  said: StoreSaid;
  lit: ReadonlySet<string>;
  onLight: (ids: string[]) => void;
}

export function StoresCanvas({ map, marks, said, lit, onLight }: Props) {
  const { t } = useTranslation('map');
  const canvas = useRef<HTMLDivElement>(null);
  const hint = useId();
  // The pressed mark is gone once the map is nearer; the keys go on from the map. Where it cannot come nearer, as with
  // two stores in one building, they go on from the row of the worst.
  const open = ({ stores, worst }: DrawnMark) => {
    if (isNearest(map)) return document.getElementById(rowIdOf(worst))?.focus();
    map.show(stores);
    canvas.current?.focus({ preventScroll: true });
  };
  return (
    <>
      <p id={hint} className="sr-only">
        {t('hint')}
      </p>
      <MapCanvas
        map={map}
        label={t('title')}
        role="group"
        describedBy={hint}
        canvasRef={canvas}
        onPress={map.centre}
        beside={<Legend />}
      >
        <ul>
          {marks.map((mark) => (
            <StoreMark key={mark.worst.id} mark={mark} said={said} lit={mark.stores.some(({ id }) => lit.has(id))} onLight={onLight} onOpen={open} />
          ))}
        </ul>
        <Caption marks={marks} said={said} lit={lit} />
      </MapCanvas>
    </>
  );
}

/** In words what the pointer is on; those who hear the page have it as the mark's name. */
function Caption({ marks, said, lit }: Pick<Props, 'marks' | 'said' | 'lit'>) {
  const mark = lit.size > 0 && marks.find(({ stores }) => stores.some(({ id }) => lit.has(id)));
  if (!mark) return null;
  const one = lit.size === 1 && mark.stores.find(({ id }) => lit.has(id));
  return (
    <p aria-hidden className="pointer-events-none absolute bottom-2 left-2 z-20 max-w-[calc(100%-1rem)] rounded-control border border-rule bg-surface px-3 py-1.5 text-small font-semibold text-ink">
      {one ? said.store(one) : said.together(mark)}
    </p>
  );
}
