import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import type { StoreSummary } from '../../../server/contract/stores';
import type { QueryInput } from '../../../server/contract/endpoint';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { MovedNote } from '../../table/moved-note';
import { Pager } from '../../table/pager';
import { useFilters } from '../../table/use-filters';
import { useSteadyRows } from '../../table/use-steady-rows';
import { buttonClass } from '../../ui/button';
import { NoStores } from './no-stores';
import { storeFilterOf } from './store-filter-of';
import { StoreFilters } from './store-filters';
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
  place: Place;
}

/** The stores a person may see; for somebody with a handful, the chooser with what needs attention on top. */
function StoresList({ list, place }: Props) {
  const { t } = useTranslation('stores-list');
  const { producer, side } = useMembership();
  const ability = useAbility();
  const places = useQuery({ ...q(api.people.places, { params: { producer: producer.slug } }), enabled: ability.can('read', 'District') });
  const chooser = side === 'store';
  const title = chooser ? t('choose') : t('title');
  const steady = useSteadyRows(list.stores, JSON.stringify([producer.slug, queryOf(place)]));
  return (
    <div className={chooser ? '' : 'px-4 py-5 lg:px-7 lg:py-6'}>
      <PageTitle title={title} />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-title font-bold">{title}</h1>
        {ability.can('create', 'Store') && (
          <Link to={paths.newStore(producer.slug)} className={buttonClass()}>
            {t('new')}
          </Link>
        )}
      </div>
      <StoreFilters places={places.data} retired={ability.can('update', 'Store')} />
      {steady.rows.length === 0 ? <NoStores /> : <Rows stores={steady.rows} />}
      <MovedNote moved={steady.moved} showNewest={steady.showNewest} />
      <Pager next={list.next} />
    </div>
  );
}

/** Rows of a table on a desk, cards on a phone. */
function Rows({ stores }: { stores: StoreSummary[] }) {
  const { t } = useTranslation('stores-list');
  const { producer } = useMembership();
  // A retired store has no page of its own until it is restored.
  const pathOf = useFilters().get('retired') === 'only' ? paths.changeStore : paths.store;
  const isTold = useAbility().can('read', 'NextTruck');
  const now = useNow();
  return (
    <div className="lg:overflow-x-auto lg:rounded-card lg:border lg:border-rule lg:bg-surface">
      <table role="table" className="block w-full text-left lg:table">
        <thead role="rowgroup" className="sr-only lg:not-sr-only lg:table-header-group">
          <tr role="row" className="text-small text-ink-3">
            {columns.filter((column) => column !== 'truck' || isTold).map((column) => (
              <th key={column} scope="col" role="columnheader" className="px-3 py-2.5 font-semibold">
                {t(`columns.${column}`)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" className="grid gap-3 lg:table-row-group">
          {stores.map((store) => (
            <StoresListRow key={store.id} store={store} to={pathOf(producer.slug, store.id)} now={now} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

const columns = ['store', 'level', 'run-out', 'truck', 'requests', 'attention'] as const;

function queryOf({ search }: Place): QueryInput<typeof api.stores.list> {
  return { ...storeFilterOf(search), retired: search.get('retired') === 'only' ? 'only' : undefined };
}
