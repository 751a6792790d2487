import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { StorePage } from '../../../server/contract/stores';
import { truckToCome } from '../../../server/domain/answers';
import { page, type Place } from '../../api/page';
import { PageTitle } from '../../layouts/page-title';
import { Allowed } from './allowed';
import { FiledReport } from './filed-report';
import { RequestForm } from './request-form';
import { StoreFrame } from './store-frame';
import { useKnown } from './store-known';
import { storeQuery } from './store-query';
import { useNow } from './use-now';
import { useStoreWords } from './use-store-words';

export const askForIcePage = page({ queries: (place) => ({ found: storeQuery(place) }), View: AskForIce });

interface Props {
  found: StorePage;
  place: Place;
}

/** One screen: what is planned, optional words, send. */
function AskForIce({ found, place }: Props) {
  const { t } = useTranslation('report');
  const navigate = useNavigate();
  const filed = place.search.get('filed');
  return (
    <StoreFrame store={found.store} narrow>
      <Allowed to="create" what="Request" where={{ storeId: found.store.id, kind: 'ice-sooner' }}>
        <PageTitle title={t('sooner.title')} />
        <h1 className="text-title font-bold">{t('sooner.title')}</h1>
        {filed ? (
          <FiledReport requestId={filed} store={found.store} kind="sooner" />
        ) : (
          <>
            <Planned found={found} />
            <RequestForm
              start={{ storeId: found.store.id, kind: 'ice-sooner', freezerId: null }}
              label={t('sooner.words')}
              hint={t('sooner.words-hint')}
              send={t('sooner.send')}
              onFiled={(requestId) => void navigate(`?filed=${requestId}`, { replace: true })}
            />
          </>
        )}
      </Allowed>
    </StoreFrame>
  );
}

function Planned({ found }: { found: StorePage }) {
  const { t } = useTranslation('report');
  const say = useStoreWords(found.store.timeZone, useNow());
  const truck = truckToCome(useKnown(found));
  if (truck === undefined) return null;
  return <p className="mt-1 text-ink-2">{truck ? t('sooner.words-told', { when: say.dayAndWindow(truck) }) : t('sooner.none-told')}</p>;
}
