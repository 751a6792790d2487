import { useTranslation } from 'react-i18next';
import type { FreezerSettings } from '../../../../server/contract/freezer-settings';
import type { NamedField } from '../../../form/changed-meanwhile';
import { useFormat } from '../../../lib/format';
import type { Kinds } from './kinds-query';

type Entered = Omit<FreezerSettings, 'id' | 'retired'>;

/** The fields by the names people see, for saying what somebody else changed. */
export function useFreezerFields({ models, products }: Kinds): NamedField<Entered>[] {
  const { t } = useTranslation('freezer-form');
  const { inches, percent, list } = useFormat();
  const nameIn = (kinds: { id: string; name: string }[], id: string) => kinds.find((kind) => kind.id === id)?.name ?? '';
  return [
    { name: 'storeId', label: t('store.label') },
    { name: 'name', label: t('name.label'), said: ({ name }) => name },
    { name: 'assetNumber', label: t('asset.label'), said: ({ assetNumber }) => assetNumber },
    { name: 'modelId', label: t('model.label'), said: ({ modelId }) => nameIn(models.models, modelId) },
    { name: 'placement', label: t('placement.label'), said: ({ placement }) => t(`placements.${placement}`) },
    { name: 'condition', label: t('condition.label'), said: ({ condition }) => condition || t('condition.none') },
    { name: 'mount', label: t('mount.title'), said: ({ mount }) => list([inches(mount.channelDropIn), inches(mount.rackIn), inches(mount.headroomIn)]) },
    {
      name: 'lanes',
      label: t('lanes.title'),
      said: ({ lanes }) => list(lanes.map(({ productId, widthShare }) => t('lanes.said', { product: nameIn(products.products, productId), share: percent(widthShare) }))),
    },
  ];
}
