import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../../server/contract/index';
import type { StoreSettings } from '../../../../server/contract/store-settings';
import { useAct } from '../../../api/act';
import { call } from '../../../api/call';
import { page } from '../../../api/page';
import { q } from '../../../api/query';
import { Form } from '../../../form/form';
import { RetireSection } from '../../../form/retire-section';
import { SubmitButton } from '../../../form/submit-button';
import { useContractForm } from '../../../form/use-contract-form';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { placesQuery, type Places } from '../../people/places-query';
import { showsStores } from './shows-stores';
import { StoreFields } from './store-fields';
import { FormFrame } from '../../../layouts/form-frame';
import { useStoreFields } from './use-store-fields';

export const changeStorePage = page({
  words: ['store-form', 'map', 'validation'],
  queries: (place) => ({
    settings: q(api.stores.readSettings, { params: { producer: place.params.producer ?? '', storeId: place.params.storeId ?? '' } }),
    places: placesQuery(place),
  }),
  View: ChangeStore,
});

interface Props {
  settings: StoreSettings;
  places: Places;
}

/** What is entered of a store, to be corrected; and the end of its use. */
function ChangeStore({ settings, places }: Props) {
  const { t } = useTranslation('store-form');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const change = useAct(api.stores.change, showsStores);
  // A retired store has no page to go back to.
  const way = settings.retired
    ? { back: paths.stores(slug), backTo: t('all') }
    : { back: paths.store(slug, settings.id), backTo: t('back', { store: settings.name }) };
  return (
    <FormFrame title={t('change.title')} lead={settings.name} {...way}>
      <ChangeForm settings={settings} places={places} />
      <RetireSection
        noun="store-form"
        thing={settings}
        send={(storeId, body) => change.mutateAsync({ params: { producer: slug, storeId }, body })}
        source={api.stores.readSettings}
        onDone={(_, retired) => void navigate(retired ? paths.stores(slug) : paths.store(slug, settings.id))}
      />
    </FormFrame>
  );
}

function ChangeForm({ settings, places }: Props) {
  const { t } = useTranslation('store-form');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const fields = useStoreFields(places);
  const onNewest = async () => enteredOf(await call(api.stores.readSettings, { params }));
  const params = { producer: slug, storeId: settings.id };
  const form = useContractForm(api.stores.change, {
    start: enteredOf(settings),
    input: (body) => ({ params, body }),
    stale: showsStores,
    onDone: ({ id, retired }) => void navigate(retired ? paths.stores(slug, '?retired=only') : paths.store(slug, id)),
  });
  return (
    <Form form={form} meanwhile={{ fields, onNewest }} className="gap-6">
      <StoreFields places={places} now={settings} />
      <SubmitButton>{t('change.save')}</SubmitButton>
    </Form>
  );
}

/** What the form holds of the settings. */
function enteredOf({ id: _, retired: __, ...entered }: StoreSettings) {
  return entered;
}
