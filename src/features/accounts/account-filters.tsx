import { useTranslation } from 'react-i18next';
import { FilterSearch } from '../../table/filter-search';
import { FilterSelect } from '../../table/filter-select';
import { useFilters } from '../../table/use-filters';

/** What the list shows; all of it in the URL. */
export function AccountFilters() {
  const { t } = useTranslation('accounts');
  const filters = useFilters();
  const options = [
    { value: '', label: t('states.in-use') },
    { value: 'only', label: t('states.retired') },
  ];
  return (
    <search className="my-4 flex flex-wrap items-end gap-2">
      <FilterSearch label={t('search')} hint={t('search-hint')} filters={filters} />
      <div className="w-full sm:w-48">
        <FilterSelect label={t('state')} name="retired" options={options} filters={filters} />
      </div>
    </search>
  );
}
