import { Trans, useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { row } from '../../../../server/contract/ability';
import type { FreezerPage } from '../../../../server/contract/freezers';
import { useAbility, useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { buttonClass } from '../../../ui/button';

/** Which freezer this is and where it stands. */
export function FreezerHead({ found: { freezer, store } }: { found: FreezerPage }) {
  const { t } = useTranslation('freezer-page');
  const { slug } = useMembership().producer;
  const mayChange = useAbility().can('update', row('Freezer', { storeId: store.id }));
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
      <div className="min-w-0">
        <h1 className="text-display font-bold wrap-anywhere">{freezer.name}</h1>
        <p className="mt-0.5 text-ink-2">
          <Trans
            t={t}
            i18nKey="head.where"
            values={{ store: store.name, street: store.street, city: store.city, number: freezer.assetNumber }}
            components={{ a: <Link to={paths.store(slug, store.id)} className="font-semibold text-fjord underline underline-offset-4" /> }}
          />
        </p>
      </div>
      {mayChange && (
        <Link className={buttonClass('quiet', { size: 'big' })} to={paths.changeFreezer(slug, freezer.id)}>
          {t('head.change')}
        </Link>
      )}
    </div>
  );
}
