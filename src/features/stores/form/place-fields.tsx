import { useTranslation } from 'react-i18next';
import { TextField } from '../../../form/text-field';
import { CoordinateField } from './coordinate-field';
import { PlaceMap } from './place-map';

/** Where the store is: for letters, and for the map. */
export function PlaceFields() {
  const { t } = useTranslation('store-form');
  return (
    <>
      <TextField name="street" label={t('street')} autoComplete="off" maxLength={160} />
      <div className="grid grid-cols-2 gap-4 sm:grid-cols-4">
        <div className="col-span-2">
          <TextField name="city" label={t('city')} autoComplete="off" maxLength={80} />
        </div>
        <TextField name="region" label={t('region')} autoComplete="off" maxLength={40} />
        <TextField name="postalCode" label={t('postal-code')} autoComplete="off" inputMode="numeric" maxLength={20} />
      </div>
      <div className="grid grid-cols-2 gap-4 sm:max-w-md">
        <CoordinateField name="latitude" label={t('latitude')} />
        <CoordinateField name="longitude" label={t('longitude')} />
      </div>
      <PlaceMap />
    </>
  );
}
