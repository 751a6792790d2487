import { useTranslation } from 'react-i18next';
import type { StoreSettings } from '../../../../server/contract/store-settings';
import { languages, storeKinds } from '../../../../server/contract/words';
import { SelectField } from '../../../form/select-field';
import { TextField } from '../../../form/text-field';
import { WeekdaysField } from '../../../form/weekdays-field';
import type { Places } from '../../people/places-query';
import { HoursFields } from './hours-fields';
import { PlaceFields } from './place-fields';
import { FormSection } from '../../../form/form-section';
import { withNow } from '../../../form/with-now';
import { ZoneField } from '../../../form/zone-field';

interface Props {
  places: Places;
  /** What is known of the store so far; a new one has nothing. */
  now?: StoreSettings;
}

/** Everything that is entered of a store. */
export function StoreFields({ places, now }: Props) {
  const { t } = useTranslation('store-form');
  return (
    <>
      <StoreSection places={places} now={now} />
      <FormSection title={t('sections.place')}>
        <PlaceFields />
        <ZoneField hint={t('zone-hint')} now={now?.timeZone} />
      </FormSection>
      <FormSection title={t('sections.contact')}>
        <ContactFields />
      </FormSection>
      <FormSection title={t('sections.deliveries')}>
        <HoursFields />
        <WeekdaysField name="deliveryDays" label={t('delivery-days')} hint={t('delivery-days-hint')} />
        <TextField name="driverNotes" label={t('driver-notes')} hint={t('driver-notes-hint')} lines={3} maxLength={1000} />
      </FormSection>
    </>
  );
}

function StoreSection({ places: { accounts, districts }, now }: Props) {
  const { t } = useTranslation('store-form');
  const accountOptions = accounts.map(({ id, number, name }) => ({ value: id, label: t('account-option', { name, number }) }));
  const districtOptions = districts.map(({ id, name }) => ({ value: id, label: name }));
  const kinds = storeKinds.map((value) => ({ value, label: t(`kinds.${value}`) }));
  const choose = { empty: t('choose'), none: { value: undefined } };
  return (
    <FormSection title={t('sections.store')}>
      <TextField name="name" label={t('name')} autoComplete="off" maxLength={120} />
      <div className="grid gap-4 sm:grid-cols-2">
        <SelectField name="accountId" label={t('account')} options={withNow(accountOptions, now?.accountId, t('retired-now'))} {...choose} />
        <SelectField name="districtId" label={t('district')} options={withNow(districtOptions, now?.districtId, t('retired-now'))} {...choose} />
        <SelectField name="kind" label={t('kind')} options={kinds} {...choose} />
      </div>
    </FormSection>
  );
}

function ContactFields() {
  const { t } = useTranslation(['store-form', 'common']);
  return (
    <>
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField name="phone" label={t('phone')} type="tel" autoComplete="off" maxLength={40} />
        <SelectField
          name="language"
          label={t('common:language.label')}
          options={languages.map((value) => ({ value, label: t(`common:language.${value}`) }))}
          empty={t('choose')}
          none={{ value: undefined }}
        />
      </div>
      <TextField name="urgentPhone" label={t('urgent-phone')} hint={t('urgent-phone-hint')} type="tel" autoComplete="off" maxLength={40} />
    </>
  );
}
