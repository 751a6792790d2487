import { useTranslation } from 'react-i18next';
import type { QueryInput, Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { Pager } from '../../table/pager';
import { placesQuery, type Places } from '../people/places-query';
import { NoStores } from '../stores/no-stores';
import { StoreFilters } from '../stores/store-filters';
import { storeFilterOf } from '../stores/store-filter-of';
import { ActionBar } from './action-bar';
import { ChooseAll } from './choose-all';
import { TellOutcome } from './tell-outcome';
import { shownRows } from './truck-drafts';
import { TrucksTable } from './trucks-table';
import { useChosen } from './use-chosen';
import { useTelling } from './use-telling';

const everyMs = 60_000;

export const trucksPage = page({
  words: ['trucks', 'stores-list', 'store', 'validation'],
  queries: (place) => ({
    found: q(api.trucks.list, { params: { producer: place.params.producer ?? '' }, query: queryOf(place) }, { everyMs }),
    places: placesQuery(place),
  }),
  View: Trucks,
});

interface Props {
  found: Result<typeof api.trucks.list>;
  places: Places;
}

/** The next truck of many stores at once: chosen, proposed, looked over, told. */
function Trucks({ found, places }: Props) {
  const { t } = useTranslation('trucks');
  const chosen = useChosen();
  const telling = useTelling(chosen.only);
  const rows = shownRows(telling.drafts, found.rows);
  return (
    <div className="px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={t('title')} />
      <h1 className="text-title font-bold">{t('title')}</h1>
      <p className="mt-1 max-w-prose text-ink-2">{t('lead')}</p>
      <StoreFilters places={places} />
      <TellOutcome telling={telling} />
      {rows.length === 0 ? (
        <NoStores />
      ) : (
        <>
          <ChooseAll chosen={chosen} shown={rows.map(({ store }) => store.id)} />
          <TrucksTable rows={rows} chosen={chosen} telling={telling} />
        </>
      )}
      <Pager next={found.next} />
      <ActionBar rows={rows.filter(({ store }) => chosen.has(store.id))} telling={telling} />
    </div>
  );
}

const queryOf = ({ search }: Place): QueryInput<typeof api.trucks.list> => ({ ...storeFilterOf(search), limit: '100' });
