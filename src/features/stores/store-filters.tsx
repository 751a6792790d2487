import { useTranslation } from 'react-i18next';
import { useAbility } from '../../lib/me';
import { FilterSearch } from '../../table/filter-search';
import { FilterSelect } from '../../table/filter-select';
import { useFilters } from '../../table/use-filters';
import type { Places } from '../people/places-query';

interface Props {
  /** Known to those who may choose by district and account. */
  places?: Places;
  /** Whether the retired can be looked at. */
  retired?: boolean;
}

/** What a list of stores shows; all of it in the URL. */
export function StoreFilters({ places, retired = false }: Props) {
  const { t } = useTranslation('stores-list');
  const filters = useFilters();
  const isTold = useAbility().can('read', 'NextTruck');
  const trucks = ['', 'today', 'late', 'none'].map((value) => ({ value, label: t(`truck.${value || 'any'}`) }));
  const named = (all: string, list: { id: string; name: string }[] = []) => [{ value: '', label: all }, ...list.map(({ id, name }) => ({ value: id, label: name }))];
  const uses = [
    { value: '', label: t('retired.no') },
    { value: 'only', label: t('retired.only') },
  ];
  const selects = [
    ...(isTold ? [{ name: 'truck', label: t('truck.label'), options: trucks }] : []),
    { name: 'district', label: t('district.label'), options: named(t('district.any'), places?.districts) },
    { name: 'account', label: t('account.label'), options: named(t('account.any'), places?.accounts) },
    ...(retired ? [{ name: 'retired', label: t('retired.label'), options: uses }] : []),
  ];
  return (
    <search className="my-4 flex flex-wrap items-end gap-2">
      <div className="w-full min-w-0 sm:w-auto sm:grow sm:basis-60">
        <FilterSearch label={t('search')} hint={t('search-hint')} filters={filters} />
      </div>
      {selects
        .filter(({ options }) => options.length > 1)
        .map((select) => (
          <div key={select.name} className="min-w-0 grow basis-36 sm:w-44 sm:grow-0 sm:basis-auto">
            <FilterSelect {...select} filters={filters} />
          </div>
        ))}
    </search>
  );
}
