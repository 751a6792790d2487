import type { Ref } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { stateFilters } from '../../../server/contract/requests';
import { requestKinds } from '../../../server/contract/words';
import { q } from '../../api/query';
import { useAbility, useMembership } from '../../lib/me';
import { FilterSearch } from '../../table/filter-search';
import { FilterSelect } from '../../table/filter-select';
import { MoreFilters } from '../../table/more-filters';
import { useFilters } from '../../table/use-filters';
import { Button } from '../../ui/button';

interface Props {
  searchRef: Ref<HTMLInputElement>;
}

/** What the list shows; all of it in the URL. */
export function QueueFilters({ searchRef }: Props) {
  const { t } = useTranslation('requests');
  const filters = useFilters();
  const states = stateFilters.map((state) => ({ value: state === 'live' ? '' : state, label: t(stateKey(state)) }));
  const kinds = [{ value: '', label: t('filters.any-kind') }, ...requestKinds.map((kind) => ({ value: kind, label: t(`kinds.${kind}`) }))];
  return (
    <search className="grid gap-2 px-4 pb-4" aria-label={t('filters.label')}>
      <FilterSearch label={t('filters.search')} hint={t('filters.search-hint')} filters={filters} inputRef={searchRef} />
      <MoreFilters label={t('filters.label')} from="lg" className="grid grid-cols-2 gap-2">
        <FilterSelect label={t('filters.state')} name="state" options={states} filters={filters} />
        <FilterSelect label={t('filters.kind')} name="kind" options={kinds} filters={filters} />
        <AssigneeFilter />
        <StoreFilter />
      </MoreFilters>
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
