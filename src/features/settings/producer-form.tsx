import { useTranslation } from 'react-i18next';
import { TextField } from '../../form/text-field';
import { ZoneField } from '../../form/zone-field';
import { PartForm, type PartProps } from './part-form';

/** How the producer is called and reached, and by which clock it works. */
export function ProducerForm(props: PartProps) {
  const { t } = useTranslation(['settings', 'common']);
  return (
    <PartForm
      {...props}
      part={({ name, timeZone, urgentPhone }) => ({ name, timeZone, urgentPhone })}
      fields={[
        { name: 'name', label: t('producer.name'), said: ({ name }) => name },
        { name: 'timeZone', label: t('common:zone.label'), said: ({ timeZone }) => timeZone },
        { name: 'urgentPhone', label: t('producer.phone'), said: ({ urgentPhone }) => urgentPhone },
      ]}
    >
      <TextField name="name" label={t('producer.name')} autoComplete="organization" maxLength={120} />
      <ZoneField hint={t('producer.zone-hint')} now={props.settings.timeZone} />
      <TextField name="urgentPhone" type="tel" label={t('producer.phone')} hint={t('producer.phone-hint')} autoComplete="off" maxLength={40} />
    </PartForm>
  );
}
