import { Minus, Plus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Button, IconButton } from '../ui/button';
import type { MapView } from './use-map-view';

/** Nearer, farther, and back to everything; beside the map, where no mark lies under them. */
export function MapButtons({ map }: { map: MapView }) {
  const { t } = useTranslation('map');
  return (
    <div className="ml-auto flex gap-2">
      {!map.whole && (
        <Button variant="quiet" onClick={map.showAll}>
          {t('show-all')}
        </Button>
      )}
      <div className="flex divide-x divide-edge rounded-control border border-edge bg-surface">
        <IconButton label={t('zoom-in')} icon={<Plus aria-hidden size={20} />} onClick={() => map.zoom(2)} />
        <IconButton label={t('zoom-out')} icon={<Minus aria-hidden size={20} />} onClick={() => map.zoom(0.5)} />
      </div>
    </div>
  );
}
