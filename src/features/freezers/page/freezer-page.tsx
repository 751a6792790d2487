import { useSuspenseQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { FreezerPage as Found } from '../../../../server/contract/freezers';
import { page } from '../../../api/page';
import { PageTitle } from '../../../layouts/page-title';
import { useAbility, useMembership } from '../../../lib/me';
import { changeNouns } from '../../audit/value-words';
import { FreezerSeen } from '../../stores/freezer-seen';
import { usePagePadding } from '../../stores/store-frame';
import { storeQueryOf } from '../../stores/store-query';
import { useNow } from '../../stores/use-now';
import { AirSection } from './air-section';
import { FreezerChanges } from './freezer-changes';
import { FreezerDeliveries } from './freezer-deliveries';
import { FreezerFacts } from './freezer-facts';
import { FreezerHead } from './freezer-head';
import { FreezerMeaning } from './freezer-meaning';
import { freezerQuery } from './freezer-query';
import { FreezerRequests } from './freezer-requests';
import { SensorSection } from './sensor-section';

export const freezerPage = page({
  words: ['freezer-page', 'store', 'freezer', 'deliveries', ...changeNouns],
  queries: (place) => ({ found: freezerQuery(place) }),
  View: FreezerView,
});

interface Props {
  found: Found;
}

/** One freezer: what its readings mean, what comes next, what was done to it and by whom. */
function FreezerView({ found }: Props) {
  const { t } = useTranslation('freezer-page');
  const now = useNow();
  const { slug } = useMembership().producer;
  const mayRead = useAbility();
  const { freezer, store } = found;
  // The truck's load is shared among all freezers of the store, and a delivery into another one has come too.
  const { data: around } = useSuspenseQuery(storeQueryOf(slug, store.id));
  return (
    <div className={usePagePadding()}>
      <PageTitle title={freezer.name} />
      <FreezerHead found={found} />
      {/* Beside each other on a desk; on a phone the sensor comes before the lists. */}
      <div className="mt-5 grid gap-x-6 gap-y-8 lg:grid-cols-[minmax(0,1fr)_312px] lg:grid-rows-[auto_1fr]">
        <div className="grid min-w-0 content-start gap-4">
          <section aria-label={t('meaning')} className="rounded-card border border-rule bg-surface px-4 py-4 sm:px-5">
            <FreezerMeaning freezer={freezer} around={around} now={now} />
            <FreezerSeen freezer={freezer} found={around} now={now} />
          </section>
          <AirSection air={found.air} zone={store.timeZone} now={now} />
        </div>
        <div className="grid min-w-0 content-start gap-8 lg:col-start-2 lg:row-span-2 lg:row-start-1">
          <SensorSection found={found} now={now} />
          <FreezerFacts freezer={freezer} />
        </div>
        <div className="grid min-w-0 content-start gap-x-6 gap-y-8 sm:grid-cols-2">
          <FreezerRequests found={found} now={now} />
          <FreezerDeliveries found={found} />
          {mayRead.can('read', 'Audit') && (
            <div className="min-w-0 sm:col-span-2">
              <FreezerChanges freezerId={freezer.id} />
            </div>
          )}
        </div>
      </div>
    </div>
  );
}
