import { useTranslation } from 'react-i18next';
import { roles } from '../../../server/contract/words';
import { FilterSearch } from '../../table/filter-search';
import { FilterSelect } from '../../table/filter-select';
import { useFilters } from '../../table/use-filters';

/** What the list shows; all of it in the URL. */
export function PeopleFilters() {
  const { t } = useTranslation(['people', 'common']);
  const filters = useFilters();
  const options = [{ value: '', label: t('any-role') }, ...roles.map((role) => ({ value: role, label: t(`common:roles.${role}`) }))];
  return (
    <search className="my-4 flex flex-wrap items-end gap-2">
      <FilterSearch label={t('search')} hint={t('search-hint')} filters={filters} />
      <div className="w-full sm:w-60">
        <FilterSelect label={t('role')} name="role" options={options} filters={filters} />
      </div>
    </search>
  );
}
