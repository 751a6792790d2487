import { useTranslation } from 'react-i18next';
import { useFilters } from '../../table/use-filters';
import { Button } from '../../ui/button';
import { EmptyState } from '../../ui/states';

export function NoPeople() {
  const { t } = useTranslation('people');
  const filters = useFilters();
  if (!filters.any) return <EmptyState title={t('empty.title')}>{t('empty.words')}</EmptyState>;
  const clear = (
    <Button variant="quiet" onClick={filters.clear}>
      {t('nothing.clear')}
    </Button>
  );
  return (
    <EmptyState title={t('nothing.title')} action={clear}>
      {t('nothing.words')}
    </EmptyState>
  );
}
