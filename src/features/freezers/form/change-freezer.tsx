import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { FreezerSettings } from '../../../../server/contract/freezer-settings';
import { api } from '../../../../server/contract/index';
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
import { FormFrame } from '../../../layouts/form-frame';
import { showsFreezers } from '../shows-freezers';
import { FreezerFields } from './freezer-fields';
import { kindsQueries, type Kinds } from './kinds-query';
import { StoreField } from './store-field';
import { useFreezerFields } from './use-freezer-fields';

export const changeFreezerPage = page({
  words: ['freezer-form', 'validation'],
  queries: (place) => ({
    settings: q(api.freezers.readSettings, { params: { producer: place.params.producer ?? '', freezerId: place.params.freezerId ?? '' } }),
    ...kindsQueries(place),
  }),
  View: ChangeFreezer,
});

interface Props extends Kinds {
  settings: FreezerSettings;
}

/** What is entered of a freezer, to be corrected; and the end of its use. */
function ChangeFreezer({ settings, ...kinds }: Props) {
  const { t } = useTranslation('freezer-form');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const change = useAct(api.freezers.change, showsFreezers);
  const { id, name, storeId, retired } = settings;
  return (
    <FormFrame title={t('change.title')} lead={name} back={retired ? paths.store(slug, storeId) : paths.freezer(slug, id)} backTo={retired ? t('to-store') : t('back', { name })}>
      <ChangeForm settings={settings} {...kinds} />
      <RetireSection
        noun="freezer-form"
        thing={settings}
        send={(freezerId, body) => change.mutateAsync({ params: { producer: slug, freezerId }, body })}
        source={api.freezers.readSettings}
        onDone={(_, gone) => void navigate(gone ? paths.store(slug, storeId) : paths.freezer(slug, id))}
      />
    </FormFrame>
  );
}

function ChangeForm({ settings, ...kinds }: Props) {
  const { t } = useTranslation('freezer-form');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const fields = useFreezerFields(kinds);
  const onNewest = async () => enteredOf(await call(api.freezers.readSettings, { params }));
  const params = { producer: slug, freezerId: settings.id };
  const form = useContractForm(api.freezers.change, {
    start: enteredOf(settings),
    input: (body) => ({ params, body }),
    stale: showsFreezers,
    onDone: ({ id, storeId, retired }) => void navigate(retired ? paths.store(slug, storeId) : paths.freezer(slug, id)),
  });
  return (
    <Form form={form} meanwhile={{ fields, onNewest }} className="gap-6">
      <StoreField />
      <FreezerFields {...kinds} had={settings} />
      <SubmitButton>{t('change.save')}</SubmitButton>
    </Form>
  );
}

/** What the form holds of the settings. */
function enteredOf({ id: _, retired: __, ...entered }: FreezerSettings) {
  return entered;
}
