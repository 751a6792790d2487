import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import type { Result } from '../../../server/contract/endpoint';
import type { StorePage } from '../../../server/contract/stores';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { buttonClass } from '../../ui/button';
import { StoreFrame } from '../stores/store-frame';
import { storeQuery } from '../stores/store-query';
import { useStoreWords } from '../stores/use-store-words';
import { DeliveryLines } from './delivery-lines';

export const deliveriesPage = page({
  queries: (place) => ({ found: storeQuery(place), listed: listedQuery(place) }),
  View: Deliveries,
});

const listedQuery = ({ params, search }: Place) =>
  q(api.deliveries.list, {
    params: { producer: params.producer ?? '', storeId: params.storeId ?? '' },
    query: { after: search.get('after') ?? undefined, limit: '25' },
  });

interface Props {
  found: StorePage;
  listed: Result<typeof api.deliveries.list>;
  place: Place;
}

/** All past deliveries of a store, newest first, a page at a time by its address. */
function Deliveries({ found, listed, place }: Props) {
  const { t } = useTranslation('deliveries');
  return (
    <StoreFrame store={found.store} narrow>
      <PageTitle title={t('title')} />
      <h1 className="text-title font-bold">{t('title')}</h1>
      {listed.deliveries.length === 0 ? (
        <p className="mt-4 text-ink-2">{t('empty')}</p>
      ) : (
        <ul aria-label={t('list')} className="mt-4 divide-y divide-rule rounded-card border border-rule bg-surface">
          {listed.deliveries.map((delivery) => (
            <li key={delivery.id} className="px-4 py-3">
              <DeliveryLines delivery={delivery} zone={found.store.timeZone} />
              <Told delivery={delivery} zone={found.store.timeZone} />
            </li>
          ))}
        </ul>
      )}
      <Paging next={listed.next} later={place.search.has('after')} />
    </StoreFrame>
  );
}

/** The window the store had been told, to set beside when it came. */
function Told({ delivery, zone }: { delivery: Props['listed']['deliveries'][number]; zone: string }) {
  const { t } = useTranslation('deliveries');
  const say = useStoreWords(zone, delivery.at);
  if (delivery.toldFrom === null || delivery.toldTo === null) return null;
  return <p className="text-small text-ink-3">{t('told', { window: say.times({ from: delivery.toldFrom, to: delivery.toldTo }) })}</p>;
}

function Paging({ next, later }: { next: string | null; later: boolean }) {
  const { t } = useTranslation('deliveries');
  if (!next && !later) return null;
  return (
    <nav aria-label={t('pages')} className="mt-4 flex flex-wrap items-center gap-3">
      {later && (
        <Link className={buttonClass('quiet', { size: 'big' })} to="?">
          {t('first')}
        </Link>
      )}
      {next ? (
        <Link className={buttonClass('quiet', { size: 'big' })} to={`?after=${encodeURIComponent(next)}`}>
          {t('next')}
        </Link>
      ) : (
        <p className="text-ink-3">{t('end')}</p>
      )}
    </nav>
  );
}
