import { useTranslation } from 'react-i18next';
import type { NamedField } from '../../form/changed-meanwhile';
import { useFormat } from '../../lib/format';
import type { ModelEntered } from './model-entered';

type Field = Exclude<keyof ModelEntered, 'version'>;

/** The fields by the names people see, and how each stands in words. */
export function useModelFields(): Required<NamedField<ModelEntered>>[] {
  const { t } = useTranslation('catalog');
  const { tenths } = useFormat();
  const measure = (name: Exclude<Field, 'name' | 'defrost'>) => (model: ModelEntered) => tenths(model[name]);
  return [
    { name: 'name', label: t('name'), said: ({ name }) => name },
    { name: 'insideWidthIn', label: t('models.width'), said: measure('insideWidthIn') },
    { name: 'insideDepthIn', label: t('models.depth'), said: measure('insideDepthIn') },
    { name: 'insideHeightIn', label: t('models.height'), said: measure('insideHeightIn') },
    { name: 'doors', label: t('models.doors'), said: measure('doors') },
    { name: 'ratedPounds', label: t('models.rated-pounds'), said: measure('ratedPounds') },
    { name: 'defrost', label: t('models.defrost'), said: ({ defrost }) => t(`models.defrosts.${defrost}`) },
  ];
}
