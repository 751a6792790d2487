import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../../server/contract/index';
import type { StorePage } from '../../../../server/contract/stores';
import { page } from '../../../api/page';
import { Form } from '../../../form/form';
import { SubmitButton } from '../../../form/submit-button';
import { useContractForm } from '../../../form/use-contract-form';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { Allowed } from '../../stores/allowed';
import { FormFrame } from '../../../layouts/form-frame';
import { storeQuery } from '../../stores/store-query';
import { showsFreezers } from '../shows-freezers';
import { FreezerFields } from './freezer-fields';
import { kindsQueries, type Kinds } from './kinds-query';

export const newFreezerPage = page({
  words: ['freezer-form', 'validation'],
  queries: (place) => ({ found: storeQuery(place), ...kindsQueries(place) }),
  View: NewFreezer,
});

interface Props extends Kinds {
  found: StorePage;
}

/** Another freezer in a store. */
function NewFreezer({ found: { store }, ...kinds }: Props) {
  const { t } = useTranslation('freezer-form');
  const { slug } = useMembership().producer;
  return (
    <FormFrame title={t('new.title')} lead={t('new.lead', { store: store.name })} back={paths.store(slug, store.id)} backTo={t('back', { name: store.name })}>
      <Allowed to="create" what="Freezer" where={{ storeId: store.id }}>
        <NewForm storeId={store.id} {...kinds} />
      </Allowed>
    </FormFrame>
  );
}

/** Usual measures of a channel right under the ceiling and a low rack (common practice, no published source). */
const usualMount = { channelDropIn: 1.5, rackIn: 2, headroomIn: 3 };

function NewForm({ storeId, ...kinds }: Kinds & { storeId: string }) {
  const { t } = useTranslation('freezer-form');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const form = useContractForm(api.freezers.create, {
    start: { storeId, name: '', assetNumber: '', condition: '', mount: usualMount, lanes: [{ widthShare: 1 }] },
    input: (body) => ({ params: { producer: slug }, body }),
    stale: showsFreezers,
    onDone: ({ id }) => void navigate(paths.freezer(slug, id)),
  });
  return (
    <Form form={form} className="gap-6">
      <FreezerFields {...kinds} />
      <SubmitButton>{t('new.save')}</SubmitButton>
    </Form>
  );
}
