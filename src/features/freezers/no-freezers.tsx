import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { NothingFound } from '../../table/nothing-found';
import { useFilters } from '../../table/use-filters';
import { buttonClass } from '../../ui/button';
import { EmptyState } from '../../ui/states';
import { filterNames } from './fleet-query';

/** Nothing found, or nothing there yet. */
export function NoFreezers() {
  const { t } = useTranslation('freezers');
  const { slug } = useMembership().producer;
  const mayAdd = useAbility().can('create', 'Store');
  const filters = useFilters(filterNames);
  if (filters.any) return <NothingFound title={t('nothing.title')} words={t('nothing.words')} clear={t('nothing.clear')} filters={filters} />;
  const accounts = (
    <Link to={paths.accounts(slug)} className={buttonClass()}>
      {t('empty.accounts')}
    </Link>
  );
  return (
    <EmptyState title={t('empty.title')} action={mayAdd && accounts}>
      {t(mayAdd ? 'empty.add' : 'empty.words')}
    </EmptyState>
  );
}
