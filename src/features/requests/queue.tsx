import { useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { Outlet, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import type { RequestSummary } from '../../../server/contract/requests';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { MovedNote } from '../../table/moved-note';
import { Pager } from '../../table/pager';
import { queryFrom } from '../../table/query-from';
import { useOwnActs } from '../../table/use-own-acts';
import { useSteadyRows } from '../../table/use-steady-rows';
import { EmptyState } from '../../ui/states';
import { DeskHours } from './desk-hours';
import { QueueFilters } from './queue-filters';
import { QueueKeys } from './queue-keys';
import { QueueRow } from './queue-row';

const EVERY = 30_000;

export const queue = page({
  words: ['requests'],
  queries: (place) => ({
    list: q(api.requests.list, { params: { producer: place.params.producer ?? '' }, query: queryOf(place) }, { everyMs: EVERY }),
  }),
  View: Queue,
});

interface Props {
  list: { requests: RequestSummary[]; next: string | null };
  place: Place;
}

/** The requests at the left, the one picked beside them; on a phone one of the two. */
function Queue(shown: Props) {
  const { requestId } = useParams();
  const { side } = useMembership();
  // A store's people see one thing at a time: their few requests, or one of them whole.
  if (side === 'store') return requestId ? <Outlet /> : <ListPane {...shown} open={undefined} />;
  return (
    <div className="lg:grid lg:grid-cols-[minmax(300px,340px)_minmax(0,1fr)]">
      <ListPane {...shown} open={requestId} />
      <div className={requestId ? '' : 'hidden lg:block'}>{requestId ? <Outlet /> : <Pick />}</div>
    </div>
  );
}

function ListPane({ list, place, open }: Props & { open: string | undefined }) {
  const { t } = useTranslation('requests');
  const { side, producer } = useMembership();
  const acted = useOwnActs();
  const steady = useSteadyRows(list.requests, JSON.stringify([producer.slug, queryOf(place), acted]));
  const searchRef = useRef<HTMLInputElement>(null);
  const title = side === 'store' ? t('title-store') : t('title');
  const Heading = open ? 'h2' : 'h1';
  return (
    <section aria-label={t('list.label')} className={side === 'store' ? '-mx-4 max-w-3xl' : `${beside} ${open ? 'hidden lg:block' : ''}`}>
      {!open && <PageTitle title={title} />}
      <Heading className="px-4 pt-5 pb-3 text-title font-bold lg:pt-6">{title}</Heading>
      {side === 'store' && (
        <div className="px-4 pb-3 empty:hidden">
          <DeskHours />
        </div>
      )}
      <QueueFilters searchRef={searchRef} />
      <Rows requests={steady.rows} open={open} />
      <MovedNote moved={steady.moved} showNewest={steady.showNewest} className="px-4" />
      <div className="px-4">
        <Pager next={list.next} />
      </div>
      <Keys open={open} searchRef={searchRef} />
    </section>
  );
}

const beside = 'lg:sticky lg:top-(--banner) lg:h-[calc(100dvh-var(--banner))] lg:overflow-y-auto lg:border-r lg:border-rule';

function Rows({ requests, open }: { requests: RequestSummary[]; open: string | undefined }) {
  const { t } = useTranslation('requests');
  const { side } = useMembership();
  const [search] = useSearchParams();
  if (requests.length > 0) {
    return (
      <ul className="border-t border-rule">
        {requests.map((request) => (
          <QueueRow key={request.id} request={request} picked={request.id === open} />
        ))}
      </ul>
    );
  }
  const empty = side === 'store' ? t('list.empty-store') : t('list.empty');
  return (
    <div className="px-4">
      <EmptyState title={search.size > 0 ? t('list.nothing') : empty} />
    </div>
  );
}

function Keys({ open, searchRef }: { open: string | undefined; searchRef: React.RefObject<HTMLInputElement | null> }) {
  const { producer } = useMembership();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const close = () => void navigate(paths.requests(producer.slug, search.size > 0 ? `?${search}` : ''), { state: { keepFocus: true } });
  return <QueueKeys searchRef={searchRef} close={open ? close : undefined} />;
}

function Pick() {
  const { t } = useTranslation('requests');
  return (
    <div className="grid h-full place-content-center gap-1 p-10 text-center text-ink-3">
      <p>{t('list.pick')}</p>
      <p className="text-small">{t('list.keys')}</p>
    </div>
  );
}

const queryOf = ({ search }: Place) => queryFrom(api.requests.list, filterNames, search);

const filterNames = ['state', 'kind', 'assignee', 'store', 'q', 'after'] as const;
