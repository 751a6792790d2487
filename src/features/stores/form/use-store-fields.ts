import { useTranslation } from 'react-i18next';
import type { StoreSettings } from '../../../../server/contract/store-settings';
import type { NamedField } from '../../../form/changed-meanwhile';
import type { Places } from '../../people/places-query';

type Entered = Omit<StoreSettings, 'id' | 'retired'>;

/** The fields by the names people see, for saying what somebody else changed. */
export function useStoreFields({ accounts, districts }: Places): NamedField<Entered>[] {
  const { t } = useTranslation(['store-form', 'common']);
  const nameIn = (list: { id: string; name: string }[], wanted: string) => list.find(({ id }) => id === wanted)?.name ?? t('retired-now');
  return [
    { name: 'name', label: t('name'), said: ({ name }) => name },
    { name: 'accountId', label: t('account'), said: ({ accountId }) => nameIn(accounts, accountId) },
    { name: 'districtId', label: t('district'), said: ({ districtId }) => nameIn(districts, districtId) },
    { name: 'kind', label: t('kind'), said: ({ kind }) => t(`kinds.${kind}`) },
    { name: 'street', label: t('street'), said: ({ street }) => street },
    { name: 'city', label: t('city'), said: ({ city }) => city },
    { name: 'region', label: t('region'), said: ({ region }) => region },
    { name: 'postalCode', label: t('postal-code'), said: ({ postalCode }) => postalCode },
    { name: 'latitude', label: t('latitude'), said: ({ latitude }) => String(latitude) },
    { name: 'longitude', label: t('longitude'), said: ({ longitude }) => String(longitude) },
    { name: 'timeZone', label: t('common:zone.label'), said: ({ timeZone }) => timeZone },
    { name: 'phone', label: t('phone'), said: ({ phone }) => phone },
    { name: 'language', label: t('common:language.label'), said: ({ language }) => t(`common:language.${language}`) },
    { name: 'urgentPhone', label: t('urgent-phone'), said: ({ urgentPhone }) => urgentPhone },
    { name: 'openHours', label: t('open.legend') },
    { name: 'receivingHours', label: t('receiving.legend') },
    { name: 'deliveryDays', label: t('delivery-days') },
    { name: 'driverNotes', label: t('driver-notes') },
  ];
}
