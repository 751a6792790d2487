import { useTranslation } from 'react-i18next';
import type { FreezerPage } from '../../../../server/contract/freezers';
import { page, type Place } from '../../../api/page';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { Allowed } from '../../stores/allowed';
import { FormFrame } from '../../../layouts/form-frame';
import { freezerQuery } from '../page/freezer-query';
import { LadderCaution } from './ladder-caution';
import { TieForm } from './tie-form';

export const tieSensorPage = page({
  words: ['freezer-page', 'validation'],
  queries: (place) => ({ found: freezerQuery(place) }),
  View: TieSensor,
});

interface Props {
  found: FreezerPage;
  place: Place;
}

/** A technician hangs a sensor in the freezer: which one, and where its probes are. */
function TieSensor({ found, place }: Props) {
  const { t } = useTranslation('freezer-page');
  const { slug } = useMembership().producer;
  const { freezer, store } = found;
  return (
    <FormFrame
      title={t('tie.title')}
      lead={t('tie.lead', { freezer: freezer.name, store: store.name })}
      back={paths.freezer(slug, freezer.id)}
      backTo={t('back', { freezer: freezer.name })}
    >
      <Allowed to="create" what="Install" where={{ storeId: store.id }}>
        <LadderCaution />
        <TieForm freezer={freezer} serial={place.search.get('serial') ?? ''} />
      </Allowed>
    </FormFrame>
  );
}
