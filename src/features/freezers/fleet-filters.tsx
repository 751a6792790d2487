import type { Ref } from 'react';
import { useQuery } from '@tanstack/react-query';
import { Check } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { fleetShows } from '../../../server/contract/fleet';
import { api } from '../../../server/contract/index';
import { q } from '../../api/query';
import { useAbility, useMembership } from '../../lib/me';
import { FilterSearch } from '../../table/filter-search';
import { FilterSelect } from '../../table/filter-select';
import { MoreFilters } from '../../table/more-filters';
import { useFilters, type Filters } from '../../table/use-filters';
import { Button } from '../../ui/button';
import { filterNames } from './fleet-query';

interface Props {
  searchRef: Ref<HTMLInputElement>;
}

/** What the list shows; all of it in the URL. */
export function FleetFilters({ searchRef }: Props) {
  const { t } = useTranslation('freezers');
  const filters = useFilters(filterNames);
  return (
    <search aria-label={t('filters.label')} className="my-4 flex flex-wrap items-end gap-2">
      <div className="flex w-full xl:w-auto xl:min-w-60 xl:flex-1">
        <FilterSearch label={t('filters.search')} hint={t('filters.search-hint')} filters={filters} inputRef={searchRef} />
      </div>
      <ShowButtons filters={filters} />
      <MoreFilters label={t('filters.more')} from="sm" className="flex w-full flex-wrap items-end gap-2 sm:w-auto">
        <PlaceSelects filters={filters} />
      </MoreFilters>
      {filters.any && (
        <Button variant="quiet" onClick={filters.clear}>
          {t('filters.clear')}
        </Button>
      )}
    </search>
  );
}

function ShowButtons({ filters }: { filters: Filters }) {
  const { t } = useTranslation('freezers');
  const isTold = useAbility().can('read', 'NextTruck');
  return (
    <div role="group" aria-label={t('show.label')} className="flex flex-wrap gap-2">
      {fleetShows.map((show) => {
        const pressed = filters.get('show') === show;
        return (
          <button
            key={show}
            type="button"
            aria-pressed={pressed}
            onClick={() => filters.set('show', pressed ? '' : show)}
            className="inline-flex min-h-12 items-center gap-1.5 rounded-control border border-edge bg-surface px-3 text-body whitespace-nowrap text-ink-2 hover:bg-sunk aria-pressed:border-fjord aria-pressed:bg-fjord-tint aria-pressed:font-semibold aria-pressed:text-fjord sm:min-h-11"
          >
            {pressed && <Check aria-hidden size={16} />}
            {t(show === 'first' && !isTold ? 'show.soon' : `show.${show}`)}
          </button>
        );
      })}
    </div>
  );
}

/** Only for those who may see which districts and accounts there are. */
function PlaceSelects({ filters }: { filters: Filters }) {
  const { t } = useTranslation('freezers');
  const { slug } = useMembership().producer;
  const may = useAbility().can('read', 'District');
  const { data } = useQuery({ ...q(api.people.places, { params: { producer: slug } }), enabled: may });
  const { districts = [], accounts = [] } = data ?? {};
  const selects = [
    { name: 'district', all: t('filters.all-districts'), places: districts },
    { name: 'account', all: t('filters.all-accounts'), places: accounts },
  ];
  return selects.map(({ name, all, places }) => {
    if (places.length === 0) return null;
    const options = [{ value: '', label: all }, ...places.map((place) => ({ value: place.id, label: place.name }))];
    return (
      <div key={name} className="w-full sm:w-44">
        <FilterSelect label={t(`filters.${name}`)} name={name} options={options} filters={filters} />
      </div>
    );
  });
}
