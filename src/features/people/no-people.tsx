import { useTranslation } from 'react-i18next';
import { NothingFound } from '../../table/nothing-found';
import { useFilters } from '../../table/use-filters';
import { EmptyState } from '../../ui/states';

export function NoPeople() {
  const { t } = useTranslation('people');
  const filters = useFilters();
  if (!filters.any) return <EmptyState title={t('empty.title')}>{t('empty.words')}</EmptyState>;
  return <NothingFound title={t('nothing.title')} words={t('nothing.words')} clear={t('nothing.clear')} filters={filters} />;
}
