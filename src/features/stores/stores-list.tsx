import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { attentions, type StoreSummary } from '../../../server/contract/stores';
import type { QueryInput } from '../../../server/contract/endpoint';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { FilterSelect } from '../../table/filter-select';
import { Pager } from '../../table/pager';
import { SearchBox } from '../../table/search-box';
import { useFilters } from '../../table/use-filters';
import { Button } from '../../ui/button';
import { EmptyState } from '../../ui/states';
import { StoresListRow } from './stores-list-row';
import { useNow } from './use-now';

const EVERY = 60_000;

export const storesList = page({
  words: ['stores-list', 'store'],
  queries: (place) => ({
    list: q(api.stores.list, { params: { producer: place.params.producer ?? '' }, query: queryOf(place) }, { everyMs: EVERY }),
  }),
  View: StoresList,
});

interface Props {
  list: { stores: StoreSummary[]; next: string | null };
}

/** The stores a person may see; for somebody with a handful, the chooser with what needs attention on top. */
function StoresList({ list }: Props) {
  const { t } = useTranslation('stores-list');
  const { side } = useMembership();
  const chooser = side === 'store';
  const title = chooser ? t('choose') : t('title');
  const stores = chooser && list.next === null ? worstFirst(list.stores) : list.stores;
  return (
    <div className={chooser ? '' : 'px-4 py-5 lg:px-7 lg:py-6'}>
      <PageTitle title={title} />
      <h1 className="text-title font-bold">{title}</h1>
      <StoreFilters />
      {stores.length === 0 ? <NoStores /> : <Rows stores={stores} />}
      <Pager next={list.next} />
    </div>
  );
}

function StoreFilters() {
  const { t } = useTranslation('stores-list');
  const filters = useFilters();
  const trucks = ['', 'today', 'late', 'none'].map((value) => ({ value, label: t(`truck.${value || 'any'}`) }));
  return (
    <search className="my-4 flex flex-wrap items-end gap-2">
      <SearchBox label={t('search')} hint={t('search-hint')} value={filters.get('q')} onSearch={(words) => filters.set('q', words)} />
      <div className="w-full sm:w-52">
        <FilterSelect label={t('truck.label')} name="truck" options={trucks} filters={filters} />
      </div>
    </search>
  );
}

/** Rows of a table on a desk, cards on a phone. */
function Rows({ stores }: { stores: StoreSummary[] }) {
  const { t } = useTranslation('stores-list');
  const now = useNow();
  return (
    <div className="lg:overflow-x-auto lg:rounded-card lg:border lg:border-rule lg:bg-surface">
      <table role="table" className="block w-full text-left lg:table">
        <thead role="rowgroup" className="sr-only lg:not-sr-only lg:table-header-group">
          <tr role="row" className="text-small text-ink-3">
            {(['store', 'level', 'run-out', 'truck', 'requests', 'attention'] as const).map((column) => (
              <th key={column} scope="col" role="columnheader" className="px-3 py-2.5 font-semibold">
                {t(`columns.${column}`)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" className="grid gap-3 lg:table-row-group">
          {stores.map((store) => (
            <StoresListRow key={store.id} store={store} now={now} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

function NoStores() {
  const { t } = useTranslation('stores-list');
  const { role } = useMembership();
  const filters = useFilters();
  if (!filters.any) return <EmptyState title={t('empty.title')}>{t('empty.words')}</EmptyState>;
  const clear = (
    <Button variant="quiet" onClick={filters.clear}>
      {t('nothing.clear')}
    </Button>
  );
  return (
    <EmptyState title={role === 'driver' && filters.get('truck') === 'today' ? t('empty.driver') : t('nothing.title')} action={clear}>
      {t('nothing.words')}
    </EmptyState>
  );
}

const worstFirst = (stores: StoreSummary[]): StoreSummary[] =>
  stores.toSorted((a, b) => attentions.indexOf(a.attention) - attentions.indexOf(b.attention));

const trucks = ['today', 'late', 'none'] as const;

function queryOf({ search }: Place): QueryInput<typeof api.stores.list> {
  const truck = trucks.find((known) => known === search.get('truck'));
  return { q: search.get('q')?.slice(0, 120) || undefined, truck, after: search.get('after') ?? undefined };
}
