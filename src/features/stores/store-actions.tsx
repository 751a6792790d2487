import { useTranslation } from 'react-i18next';
import { row } from '../../../server/contract/ability';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { ButtonLink } from '../../ui/button';

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
            <ButtonLink variant="quiet" to={paths.nextTruck(slug, storeId)}>
              {t('actions.next-truck')}
            </ButtonLink>
          )}
          {mayRecord && (
            <ButtonLink variant="quiet" to={paths.recordDelivery(slug, storeId)}>
              {t('actions.record')}
            </ButtonLink>
          )}
        </div>
      )}
      {(mayReport || mayAsk) && (
        <div
          role="group"
          aria-label={t('actions.label')}
          className={`fixed inset-x-0 z-20 grid auto-cols-fr grid-flow-col gap-2 border-t border-rule bg-surface px-4 py-2.5 lg:static lg:flex lg:border-0 lg:bg-transparent lg:p-0 ${side === 'producer' ? 'bottom-14' : 'bottom-0 pb-[max(0.625rem,env(safe-area-inset-bottom))]'}`}
        >
          {mayReport && <ButtonLink to={paths.report(slug, storeId)}>{t('actions.report')}</ButtonLink>}
          {mayAsk && (
            <ButtonLink variant="quiet" to={paths.askForIce(slug, storeId)}>
              {t('actions.sooner')}
            </ButtonLink>
          )}
        </div>
      )}
    </div>
  );
}
