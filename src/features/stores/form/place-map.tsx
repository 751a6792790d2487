import { useQuery } from '@tanstack/react-query';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { api } from '../../../../server/contract/index';
import { q } from '../../../api/query';
import { useMembership } from '../../../lib/me';
import { PlacePicker } from '../../../map/place-picker';

interface Values {
  latitude?: number;
  longitude?: number;
}

/** The same two numbers as a mark on the map, among the stores there are. */
export function PlaceMap() {
  const { t } = useTranslation('store-form');
  const { slug } = useMembership().producer;
  const { setValue, formState } = useFormContext<Values>();
  const [latitude = null, longitude = null] = useWatch<Values, ['latitude', 'longitude']>({ name: ['latitude', 'longitude'] });
  const { data, isPending } = useQuery(q(api.freezers.map, { params: { producer: slug } }));
  const pick = (...place: [number, number]) => {
    const options = { shouldDirty: true, shouldValidate: formState.isSubmitted };
    setValue('latitude', place[0], options);
    setValue('longitude', place[1], options);
  };
  // Where the map begins is decided once.
  if (isPending) return null;
  return <PlacePicker latitude={latitude} longitude={longitude} around={data?.stores} label={t('place-map')} onPick={pick} />;
}
