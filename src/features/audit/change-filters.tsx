import { useTranslation } from 'react-i18next';
import { subjects } from '../../../server/contract/ability';
import { FilterSelect } from '../../table/filter-select';
import { useFilters } from '../../table/use-filters';
import { Button } from '../../ui/button';
import { DayFilter } from './day-filter';

/** What the list shows; all of it in the URL. */
export function ChangeFilters() {
  const { t, i18n } = useTranslation('audit');
  const filters = useFilters();
  const named = subjects
    .map((subject) => ({ value: subject, label: t(`subjects.${subject}`) }))
    .toSorted((a, b) => a.label.localeCompare(b.label, i18n.language));
  return (
    <search aria-label={t('filters.label')} className="my-4 grid items-end gap-2 sm:grid-cols-3 lg:flex lg:flex-wrap">
      <div className="lg:w-56">
        <FilterSelect label={t('filters.subject')} name="subject" options={[{ value: '', label: t('filters.any') }, ...named]} filters={filters} />
      </div>
      <DayFilter label={t('filters.from')} name="from" filters={filters} />
      <DayFilter label={t('filters.to')} name="to" filters={filters} />
      {filters.any && (
        <Button variant="quiet" onClick={filters.clear}>
          {t('filters.clear')}
        </Button>
      )}
    </search>
  );
}
