import { useTranslation } from 'react-i18next';
import { SpansField } from '../../../form/spans-field';
import { HourField } from './hour-field';

/** When the store is open, and when a driver may deliver. */
export function HoursFields() {
  const { t } = useTranslation('store-form');
  return (
    <>
      <fieldset>
        <legend className="font-semibold">{t('open.legend')}</legend>
        <div className="mt-1 grid grid-cols-2 gap-3 sm:max-w-md">
          <HourField name="openHours.0" label={t('open.from')} from={0} to={23.5} />
          <HourField name="openHours.1" label={t('open.to')} from={0.5} to={24} />
        </div>
      </fieldset>
      <SpansField
        name="receivingHours"
        labels={{
          legend: t('receiving.legend'),
          hint: t('receiving.hint'),
          none: t('receiving.none'),
          span: (n) => t('receiving.span', { n }),
          remove: (n) => t('receiving.remove', { n }),
          days: t('receiving.days'),
          from: t('receiving.from'),
          to: t('receiving.to'),
          add: t('receiving.add'),
        }}
      />
    </>
  );
}
