import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { row } from '../../../server/contract/ability';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { buttonClass } from '../../ui/button';

/** What can be asked for here, within thumb's reach on a phone; dispatch has its own two. */
export function StoreActions({ storeId }: { storeId: string }) {
  const { t } = useTranslation('store');
  const { producer, side } = useMembership();
  const ability = useAbility();
  const slug = producer.slug;
  const mayReport = ability.can('create', row('Request', { storeId, kind: 'other' }));
  const mayAsk = ability.can('create', row('Request', { storeId, kind: 'ice-sooner' }));
  const mayPlan = ability.can('update', row('NextTruck', { storeId }));
  const mayRecord = ability.can('create', row('Delivery', { storeId }));
  if (!mayReport && !mayAsk && !mayPlan && !mayRecord) return null;
  return (
    <div className="flex flex-wrap gap-3">
      {(mayPlan || mayRecord) && (
        <div role="group" aria-label={t('actions.staff')} className="flex flex-wrap gap-3">
          {mayPlan && (
            <Link className={buttonClass('quiet', { size: 'big' })} to={paths.nextTruck(slug, storeId)}>
              {t('actions.next-truck')}
            </Link>
          )}
          {mayRecord && (
            <Link className={buttonClass('quiet', { size: 'big' })} to={paths.recordDelivery(slug, storeId)}>
              {t('actions.record')}
            </Link>
          )}
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
