import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { answersFor } from '../../../server/domain/answers';
import type { StorePage } from '../../../server/contract/stores';
import { page, type Place } from '../../api/page';
import { PageTitle } from '../../layouts/page-title';
import { Answers } from './answers';
import { ConnectionNote } from './connection-note';
import { FreezerCard } from './freezer-card';
import { usePagePadding } from './store-frame';
import { StoreActions } from './store-actions';
import { StoreDeliveries } from './store-deliveries';
import { useKnown } from './store-known';
import { storeQuery } from './store-query';
import { StoreRequests } from './store-requests';
import { UrgentPhone } from './urgent-phone';
import { useNow } from './use-now';

export const storePage = page({ queries: (place) => ({ found: storeQuery(place) }), View: StoreView });

interface Props {
  found: StorePage;
  place: Place;
}

/** What a store manager looks at at seven in the morning: full, cold, coming, and who is fixing it. */
function StoreView({ found, place }: Props) {
  const now = useNow();
  const asked = useQuery(storeQuery(place));
  const { store } = found;
  const answers = answersFor(useKnown(found), now);
  return (
    <div className={`${usePagePadding()} pb-24 lg:pb-8`}>
      <PageTitle title={store.name} />
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <StoreName store={store} />
        <StoreActions storeId={store.id} />
      </div>
      <Answers answers={answers} zone={store.timeZone} now={now} several={found.freezers.length > 1} />
      <UrgentPhone store={store} answers={answers} />
      <div className="mt-6 grid gap-6 lg:grid-cols-[minmax(0,1fr)_312px]">
        <Freezers found={found} now={now} />
        <div className="grid content-start gap-8">
          <StoreRequests found={found} now={now} />
          <StoreDeliveries found={found} />
        </div>
      </div>
      <ConnectionNote asked={asked} now={now} />
    </div>
  );
}

const StoreName = ({ store }: { store: StorePage['store'] }) => (
  <div className="min-w-0">
    <h1 className="text-display font-bold">{store.name}</h1>
    <p className="mt-0.5 text-ink-3">
      {store.street}, {store.city}
    </p>
  </div>
);

function Freezers({ found, now }: { found: StorePage; now: number }) {
  const { t } = useTranslation('store');
  return (
    <section aria-label={t('freezer.label')} className="grid min-w-0 content-start gap-4">
      {found.freezers.map((freezer) => (
        <FreezerCard key={freezer.id} freezer={freezer} found={found} now={now} />
      ))}
    </section>
  );
}
