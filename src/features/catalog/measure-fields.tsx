import { useTranslation } from 'react-i18next';
import { defrosts } from '../../../server/contract/words';
import { NumberField } from '../../form/number-field';
import { SelectField } from '../../form/select-field';

/** What levels are counted by. */
export function MeasureFields() {
  const { t } = useTranslation(['catalog', 'accounts']);
  return (
    <>
      <NumberField name="insideWidthIn" label={t('models.width')} hint={t('models.width-hint')} />
      <NumberField name="insideDepthIn" label={t('models.depth')} hint={t('models.depth-hint')} />
      <NumberField name="insideHeightIn" label={t('models.height')} hint={t('models.height-hint')} />
      <NumberField name="doors" label={t('models.doors')} whole />
      <NumberField name="ratedPounds" label={t('models.rated-pounds')} hint={t('models.rated-hint')} />
      <SelectField
        name="defrost"
        label={t('models.defrost')}
        options={defrosts.map((value) => ({ value, label: t(`models.defrosts.${value}`) }))}
        empty={t('accounts:choose')}
        none={{ value: undefined }}
      />
    </>
  );
}
