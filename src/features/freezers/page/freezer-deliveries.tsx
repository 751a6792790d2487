import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { row } from '../../../../server/contract/ability';
import type { FreezerPage } from '../../../../server/contract/freezers';
import { useAbility, useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { linkClass } from '../../../ui/link-class';
import { Section } from '../../../ui/section';
import { DeliveryLines } from '../../deliveries/delivery-lines';

/** What was left in this freezer lately, or in its store without saying in which. */
export function FreezerDeliveries({ found: { freezer, store, deliveries } }: { found: FreezerPage }) {
  const { t } = useTranslation('freezer-page');
  const { slug } = useMembership().producer;
  const mayRead = useAbility().can('read', row('Delivery', { storeId: store.id }));
  const here = deliveries.map((delivery) => ({ ...delivery, lines: delivery.lines.filter(({ freezerId }) => freezerId === null || freezerId === freezer.id) }));
  if (!mayRead) return null;
  return (
    <Section title={t('deliveries.title')}>
      {here.length === 0 ? (
        <p className="py-3 text-ink-2">{t('deliveries.none')}</p>
      ) : (
        <ul className="divide-y divide-rule">
          {here.map((delivery) => (
            <li key={delivery.id} className="py-3">
              <DeliveryLines delivery={delivery} zone={store.timeZone} />
              {delivery.lines.some(({ freezerId }) => freezerId === null) && <p className="text-small text-ink-3">{t('deliveries.store-wide')}</p>}
            </li>
          ))}
        </ul>
      )}
      <Link to={paths.storeDeliveries(slug, store.id)} className={linkClass('big')}>
        {t('deliveries.all')}
      </Link>
    </Section>
  );
}
