import { useTranslation } from 'react-i18next';
import { useMembership } from '../../lib/me';
import { NothingFound } from '../../table/nothing-found';
import { useFilters } from '../../table/use-filters';
import { EmptyState } from '../../ui/states';

/** No stores at all, or none that match the filters. */
export function NoStores() {
  const { t } = useTranslation('stores-list');
  const { role } = useMembership();
  const filters = useFilters();
  if (!filters.any) return <EmptyState title={t('empty.title')}>{t('empty.words')}</EmptyState>;
  return <NothingFound title={role === 'driver' && filters.get('truck') === 'today' ? t('empty.driver') : t('nothing.title')} words={t('nothing.words')} clear={t('nothing.clear')} filters={filters} />;
}
