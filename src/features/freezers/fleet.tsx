import { useRef, useState } from 'react';
import { useQuery } from '@tanstack/react-query';
import { Download } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Navigate } from 'react-router-dom';
import type { FleetDigest } from '../../../server/contract/fleet';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { urlOf } from '../../api/call';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { ConnectionNote } from '../stores/connection-note';
import { useNow } from '../stores/use-now';
import { Beside } from './beside';
import { ColumnsMenu } from './columns-menu';
import { Digest } from './digest';
import { FleetFilters } from './fleet-filters';
import { FleetKeys } from './fleet-keys';
import { FleetList } from './fleet-list';
import { digestQuery, fleetQuery, listQuery } from './fleet-query';
import { FleetMap } from './map/fleet-map';
import { useColumns, type Columns } from './use-columns';
import { useOpen } from './use-open';
import { ViewSwitch } from './view-switch';

const EVERY_MS = 30_000;

export const fleetPage = page({
  words: ['freezers', 'map', 'freezer', 'store'],
  queries: (place) => ({ list: listAsked(place), digest: digestAsked(place) }),
  View: Fleet,
});

const listAsked = ({ params: { producer = '' }, search }: Place) =>
  q(api.freezers.list, { params: { producer }, query: listQuery(search) }, { everyMs: EVERY_MS });
const digestAsked = ({ params: { producer = '' }, search }: Place) =>
  q(api.freezers.digest, { params: { producer }, query: digestQuery(search) }, { everyMs: EVERY_MS });

interface Props {
  list: Result<typeof api.freezers.list>;
  digest: FleetDigest;
  place: Place;
}

/** Every freezer, the soonest likely run-out first; one of them beside the list. */
function Fleet({ list, digest, place }: Props) {
  const { t } = useTranslation('freezers');
  const { side, producer } = useMembership();
  const isTold = useAbility().can('read', 'NextTruck');
  const searchRef = useRef<HTMLInputElement>(null);
  const now = useNow();
  const asked = useQuery(listAsked(place));
  const open = useOpen();
  const columns = useColumns();
  // A link to a freezer beside the list, opened where there is no room for it. A window made smaller later stays here.
  const [elsewhere] = useState(open.asked !== null && open.shown === null);
  if (elsewhere && open.asked) return <Navigate to={paths.freezer(producer.slug, open.asked)} replace />;
  const map = place.search.get('view') === 'map';
  const row = list.freezers.find(({ id }) => id === open.shown);
  return (
    <div className={side === 'store' ? '' : 'px-4 py-5 lg:flex lg:h-[calc(100dvh-var(--banner))] lg:min-h-160 lg:flex-col lg:px-7 lg:py-6'}>
      <PageTitle title={t('title')} />
      <div className="flex flex-wrap items-center gap-x-3 gap-y-2">
        <h1 className="mr-auto text-title font-bold">{t('title')}</h1>
        <ViewSwitch />
        {!map && <ColumnsMenu columns={columns} />}
        <CsvLink columns={columns} search={place.search} />
      </div>
      <Digest digest={digest} trucks={isTold} />
      <FleetFilters searchRef={searchRef} />
      <div className={`lg:min-h-0 lg:flex-1 ${open.shown ? 'xl:grid xl:grid-cols-[minmax(0,1fr)_21rem] xl:gap-4' : ''}`}>
        {map ? (
          <div className="lg:h-full lg:overflow-y-auto">
            <FleetMap query={fleetQuery(place.search)} />
          </div>
        ) : (
          <FleetList list={list} columns={columns.shown} open={open} now={now} />
        )}
        {open.shown && <Beside key={open.shown} freezerId={open.shown} row={row} now={now} everyMs={EVERY_MS} close={open.close} />}
      </div>
      <ConnectionNote asked={asked} now={now} />
      <FleetKeys searchRef={searchRef} open={open} />
    </div>
  );
}

function CsvLink({ columns, search }: { columns: Columns; search: URLSearchParams }) {
  const { t } = useTranslation('freezers');
  const { slug } = useMembership().producer;
  const href = urlOf(api.freezers.csv, { producer: slug }, { ...fleetQuery(search), columns: columns.shown.join(',') });
  return (
    <a href={href} download className="inline-flex min-h-12 items-center gap-2 font-semibold whitespace-nowrap text-fjord underline underline-offset-4 sm:min-h-11 sm:px-2">
      <Download aria-hidden size={18} />
      {t('csv')}
    </a>
  );
}
