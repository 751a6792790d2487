import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { StorePage } from '../../../server/contract/stores';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { DeliveryLines } from '../deliveries/delivery-lines';

/** What was left lately, and the way to all of it. */
export function StoreDeliveries({ found }: { found: StorePage }) {
  const { t } = useTranslation('store');
  const { producer } = useMembership();
  const { store, deliveries } = found;
  return (
    <section aria-labelledby="recent-deliveries">
      <h2 id="recent-deliveries" className="border-b border-rule pb-2.5 font-bold">
        {t('deliveries.title')}
      </h2>
      {deliveries.length === 0 ? (
        <p className="py-3 text-ink-2">{t('deliveries.none')}</p>
      ) : (
        <>
          <ul className="divide-y divide-rule">
            {deliveries.map((delivery) => (
              <li key={delivery.id} className="py-3">
                <DeliveryLines delivery={delivery} zone={store.timeZone} />
              </li>
            ))}
          </ul>
          <Link
            to={paths.storeDeliveries(producer.slug, store.id)}
            className="inline-flex min-h-12 items-center font-semibold text-fjord underline underline-offset-4"
          >
            {t('deliveries.all')}
          </Link>
        </>
      )}
    </section>
  );
}
