import { useTranslation } from 'react-i18next';
import type { FreezerSettings } from '../../../../server/contract/freezer-settings';
import { placements } from '../../../../server/contract/words';
import { NumberField } from '../../../form/number-field';
import { SelectField } from '../../../form/select-field';
import { TextField } from '../../../form/text-field';
import { FormSection } from '../../../form/form-section';
import { choicesOf, type Kinds } from './kinds-query';
import { LaneFields } from './lane-fields';

interface Props extends Kinds {
  /** What the freezer has already, even where it can no longer be chosen anew. */
  had?: Pick<FreezerSettings, 'modelId' | 'lanes'>;
}

/** What is entered of a freezer, new or known. */
export function FreezerFields({ models, products, had }: Props) {
  const { t } = useTranslation('freezer-form');
  const places = placements.map((value) => ({ value, label: t(`placements.${value}`) }));
  return (
    <>
      <FormSection title={t('what')}>
        <TextField name="name" label={t('name.label')} hint={t('name.hint')} maxLength={120} />
        <div className="grid gap-4 sm:grid-cols-3">
          <TextField name="assetNumber" label={t('asset.label')} maxLength={40} autoComplete="off" />
          <SelectField name="modelId" label={t('model.label')} options={choicesOf(models.models, had ? [had.modelId] : [])} empty={t('choose')} none={{ value: undefined }} />
          <SelectField name="placement" label={t('placement.label')} options={places} empty={t('choose')} none={{ value: undefined }} />
        </div>
        <TextField name="condition" label={t('condition.label')} hint={t('condition.hint')} lines={2} maxLength={200} />
      </FormSection>
      <FormSection title={t('lanes.title')}>
        <LaneFields products={choicesOf(products.products, had ? had.lanes.map(({ productId }) => productId) : [])} />
      </FormSection>
      <FormSection title={t('mount.title')}>
        <p className="text-ink-2">{t('mount.lead')}</p>
        {(['channelDropIn', 'rackIn', 'headroomIn'] as const).map((measure) => (
          <NumberField key={measure} name={`mount.${measure}`} label={t(`mount.${measure}.label`)} hint={t(`mount.${measure}.hint`)} />
        ))}
      </FormSection>
    </>
  );
}
