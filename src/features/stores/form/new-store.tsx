import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../../server/contract/index';
import type { Span } from '../../../../server/contract/words';
import { page, type Place } from '../../../api/page';
import { Form } from '../../../form/form';
import { SubmitButton } from '../../../form/submit-button';
import { useContractForm } from '../../../form/use-contract-form';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { placesQuery, type Places } from '../../people/places-query';
import { Allowed } from '../allowed';
import { StoreFields } from './store-fields';
import { FormFrame } from '../../../layouts/form-frame';

export const newStorePage = page({
  words: ['store-form', 'map', 'validation'],
  queries: (place) => ({ places: placesQuery(place) }),
  View: NewStore,
});

interface Props {
  places: Places;
  place: Place;
}

/** Adds a store to one of the accounts. */
function NewStore({ places, place }: Props) {
  const { t } = useTranslation('store-form');
  const { slug } = useMembership().producer;
  return (
    <Allowed to="create" what="Store" where={{}}>
      <FormFrame title={t('new.title')} lead={t('new.lead')} back={paths.stores(slug)} backTo={t('all')}>
        <NewStoreForm places={places} accountId={place.search.get('account')} />
      </FormFrame>
    </Allowed>
  );
}

function NewStoreForm({ places, accountId }: { places: Places; accountId: string | null }) {
  const { t } = useTranslation('store-form');
  const navigate = useNavigate();
  const { slug, timeZone, language } = useMembership().producer;
  const form = useContractForm(api.stores.create, {
    start: {
      ...unfilled,
      accountId: (places.accounts.find(({ id }) => id === accountId) ?? onlyOf(places.accounts))?.id,
      districtId: onlyOf(places.districts)?.id,
      timeZone,
      language,
    },
    input: (body) => ({ params: { producer: slug }, body }),
    stale: [api.stores.list, api.accounts.list, api.accounts.read, api.districts.list],
    onDone: ({ id }) => void navigate(paths.store(slug, id)),
  });
  return (
    <Form form={form} className="gap-6">
      <StoreFields places={places} />
      <SubmitButton>{t('new.save')}</SubmitButton>
    </Form>
  );
}

/** What holds for most stores. */
const unfilled = {
  name: '',
  kind: undefined,
  street: '',
  city: '',
  region: '',
  postalCode: '',
  latitude: undefined,
  longitude: undefined,
  phone: '',
  urgentPhone: '',
  openHours: [6, 22] as [number, number],
  receivingHours: [{ days: [1, 2, 3, 4, 5], from: '07:00', to: '15:00' }] satisfies Span[],
  deliveryDays: [],
  driverNotes: '',
};

const onlyOf = <T,>([only, ...others]: T[]): T | undefined => (others.length === 0 ? only : undefined);
