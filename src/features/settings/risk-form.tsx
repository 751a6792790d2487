import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';
import { PartForm, type PartProps } from './part-form';
import { PercentField } from './percent-field';

/** From when on a freezer counts as at risk. */
export function RiskForm(props: PartProps) {
  const { t } = useTranslation('settings');
  const format = useFormat();
  return (
    <PartForm
      {...props}
      part={({ riskLimit }) => ({ riskLimit })}
      fields={[{ name: 'riskLimit', label: t('risk.limit'), said: ({ riskLimit }) => format.percent(riskLimit) }]}
    >
      <PercentField name="riskLimit" label={t('risk.limit')} hint={t('risk.hint')} />
    </PartForm>
  );
}
