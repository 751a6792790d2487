import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { row } from '../../../server/contract/ability';
import type { StorePage } from '../../../server/contract/stores';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { linkClass } from '../../ui/link-class';
import { Section } from '../../ui/section';
import { DeliveryLines } from '../deliveries/delivery-lines';

/** What was left lately, and the way to all of it, for those who may know. */
export function StoreDeliveries({ found }: { found: StorePage }) {
  const { t } = useTranslation('store');
  const { producer } = useMembership();
  const { store, deliveries } = found;
  if (!useAbility().can('read', row('Delivery', { storeId: store.id }))) return null;
  return (
    <Section title={t('deliveries.title')}>
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
            className={linkClass('big')}
          >
            {t('deliveries.all')}
          </Link>
        </>
      )}
    </Section>
  );
}
