import { useTranslation } from 'react-i18next';
import { FilterSearch } from '../../table/filter-search';
import { useFilters } from '../../table/use-filters';
import { Select } from '../../ui/select';
import { columns } from './measures';
import { useSort } from './use-sort';

/** Search, and the order where there are no heads of columns to press. */
export function ComparisonFilters() {
  const { t } = useTranslation('comparison');
  const filters = useFilters(['q']);
  const { sort, setSort } = useSort();
  return (
    <search className="my-4 flex flex-wrap items-end gap-2">
      <FilterSearch label={t('search')} hint={t('search-hint')} filters={filters} />
      <label className="block w-full sm:w-60 lg:hidden">
        <span className="mb-1 block text-small font-semibold text-ink-3">{t('sort')}</span>
        <Select value={sort.column} onChange={({ target }) => setSort(target.value)}>
          {columns.map((column) => (
            <option key={column} value={column}>
              {t(`columns.${column}`)}
            </option>
          ))}
        </Select>
      </label>
    </search>
  );
}
