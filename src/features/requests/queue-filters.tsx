import { useState, type Ref } from 'react';
import { SlidersHorizontal } from 'lucide-react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { stateFilters } from '../../../server/contract/requests';
import { requestKinds } from '../../../server/contract/words';
import { q } from '../../api/query';
import { useAbility, useMembership } from '../../lib/me';
import { SearchBox } from '../../table/search-box';
import { useFilters } from '../../table/use-filters';
import { Button } from '../../ui/button';
import { FilterSelect } from '../../table/filter-select';

interface Props {
  searchRef: Ref<HTMLInputElement>;
}

/** What the list shows; all of it in the URL. */
export function QueueFilters({ searchRef }: Props) {
  const { t } = useTranslation('requests');
  const filters = useFilters();
  const [shown, show] = useState(false);
  const states = stateFilters.map((state) => ({ value: state === 'live' ? '' : state, label: t(stateKey(state)) }));
  const kinds = [{ value: '', label: t('filters.any-kind') }, ...requestKinds.map((kind) => ({ value: kind, label: t(`kinds.${kind}`) }))];
  return (
    <search className="grid gap-2 px-4 pb-4" aria-label={t('filters.label')}>
      <SearchBox
        inputRef={searchRef}
        label={t('filters.search')}
        hint={t('filters.search-hint')}
        value={filters.get('q')}
        onSearch={(words) => filters.set('q', words)}
      />
      <button
        type="button"
        aria-expanded={shown}
        onClick={() => show(!shown)}
        className="flex min-h-11 items-center gap-2 justify-self-start font-semibold text-fjord lg:hidden"
      >
        <SlidersHorizontal aria-hidden size={18} />
        {t('filters.label')}
      </button>
      <div className={`${shown ? 'grid' : 'hidden lg:grid'} grid-cols-2 gap-2`}>
        <FilterSelect label={t('filters.state')} name="state" options={states} filters={filters} />
        <FilterSelect label={t('filters.kind')} name="kind" options={kinds} filters={filters} />
        <AssigneeFilter />
        <StoreFilter />
      </div>
      {filters.any && (
        <Button variant="quiet" onClick={filters.clear}>
          {t('filters.clear')}
        </Button>
      )}
    </search>
  );
}

const stateKey = (state: (typeof stateFilters)[number]) => (state === 'live' || state === 'any' ? `filters.${state}` : `states.${state}`);

/** Only for those who assign. */
function AssigneeFilter() {
  const { t } = useTranslation('requests');
  const filters = useFilters();
  const { producer, side } = useMembership();
  const may = useAbility().can('update', 'Request') && side === 'producer';
  const { data } = useQuery({ ...q(api.requests.assignees, { params: { producer: producer.slug } }), enabled: may });
  if (!may) return null;
  const options = [
    { value: '', label: t('filters.anybody') },
    { value: 'me', label: t('filters.me') },
    { value: 'nobody', label: t('filters.nobody') },
    ...(data?.assignees ?? []).map(({ id, name }) => ({ value: id, label: name })),
  ];
  return <FilterSelect label={t('filters.assignee')} name="assignee" options={options} filters={filters} />;
}

/** The stores of the first page of the list of stores; a link may name any other. */
function StoreFilter() {
  const { t } = useTranslation('requests');
  const filters = useFilters();
  const { producer } = useMembership();
  const { data } = useQuery(q(api.stores.list, { params: { producer: producer.slug }, query: { limit: '200' } }));
  const stores = data?.stores ?? [];
  if (stores.length < 2) return null;
  const options = [{ value: '', label: t('filters.all-stores') }, ...stores.map(({ id, name }) => ({ value: id, label: name }))];
  return <FilterSelect label={t('filters.store')} name="store" options={options} filters={filters} />;
}
