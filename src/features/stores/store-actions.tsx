import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { row } from '../../../server/contract/ability';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { buttonClass } from '../../ui/button';

/** What can be asked for here, within thumb's reach on a phone; the producer's people have acts of their own. */
export function StoreActions({ storeId }: { storeId: string }) {
  const { t } = useTranslation('store');
  const { producer, side } = useMembership();
  const ability = useAbility();
  const slug = producer.slug;
  const mayReport = ability.can('create', row('Request', { storeId, kind: 'other' }));
  const mayAsk = ability.can('create', row('Request', { storeId, kind: 'ice-sooner' }));
  const staff = [
    { may: ability.can('update', row('NextTruck', { storeId })), to: paths.nextTruck(slug, storeId), words: t('actions.next-truck') },
    { may: ability.can('create', row('Delivery', { storeId })), to: paths.recordDelivery(slug, storeId), words: t('actions.record') },
    { may: ability.can('update', row('Store', { id: storeId })), to: paths.changeStore(slug, storeId), words: t('actions.change') },
    { may: ability.can('create', row('Freezer', { storeId })), to: paths.newFreezer(slug, storeId), words: t('actions.new-freezer') },
  ].filter(({ may }) => may);
  if (!mayReport && !mayAsk && staff.length === 0) return null;
  return (
    <div className="flex flex-wrap gap-3">
      {staff.length > 0 && (
        <div role="group" aria-label={t('actions.staff')} className="flex flex-wrap gap-3">
          {staff.map(({ to, words }) => (
            <Link key={to} className={buttonClass('quiet', { size: 'big' })} to={to}>
              {words}
            </Link>
          ))}
        </div>
      )}
      {(mayReport || mayAsk) && (
        <div
          role="group"
          aria-label={t('actions.label')}
          className={`fixed inset-x-0 z-20 flex flex-wrap gap-2 border-t border-rule bg-surface px-4 py-2.5 *:grow *:basis-40 lg:static lg:border-0 lg:bg-transparent lg:p-0 lg:*:basis-auto ${side === 'producer' ? 'bottom-14' : 'bottom-0 pb-[max(0.625rem,env(safe-area-inset-bottom))]'}`}
        >
          {mayReport && <Link className={buttonClass('primary', { size: 'big' })} to={paths.report(slug, storeId)}>{t('actions.report')}</Link>}
          {mayAsk && (
            <Link className={buttonClass('quiet', { size: 'big' })} to={paths.askForIce(slug, storeId)}>
              {t('actions.sooner')}
            </Link>
          )}
        </div>
      )}
    </div>
  );
}
