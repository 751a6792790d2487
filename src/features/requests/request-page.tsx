import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, useSearchParams } from 'react-router-dom';
import { ArrowLeft } from 'lucide-react';
import { row } from '../../../server/contract/ability';
import { api } from '../../../server/contract/index';
import type { Request } from '../../../server/contract/requests';
import { hasEnded } from '../../../server/domain/request-steps';
import { page } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { AddPhotos } from './add-photos';
import { Cancel } from './cancel';
import { Change } from './change';
import { Facts } from './facts';
import { Photos } from './photos';
import { NoteForm, ReplyForm } from './reply';
import { RequestHead } from './request-head';
import { Story } from './story';

const EVERY = 20_000;

export const requestPage = page({
  words: ['requests'],
  queries: ({ params }) => ({
    request: q(
      api.requests.read,
      { params: { producer: params.producer ?? '', requestId: params.requestId ?? '' } },
      { everyMs: EVERY },
    ),
  }),
  View: ({ request }) => <RequestView key={request.id} request={request} />,
});

/** One request for both sides: each sees what its rules let it do. */
function RequestView({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { side } = useMembership();
  const may = useMay(request);
  const fresh = useFresh(request);
  const title = `${t('number', { number: request.number })} ${t(`kinds.${request.kind}`)}`;
  return (
    <article className={`bg-surface xl:grid xl:grid-cols-[minmax(0,1fr)_300px] ${side === 'store' ? 'overflow-hidden rounded-card border border-rule' : 'lg:min-h-dvh'}`}>
      <PageTitle title={title} />
      <div className="min-w-0 px-4 py-5 sm:px-7 lg:py-6">
        <Back request={request} />
        <RequestHead request={request} />
        <Photos request={request} />
        <Story request={request} fresh={fresh} />
        {may.reply && <ReplyForm request={request} />}
        {may.note && <NoteForm request={request} />}
        {may.addPhotos && <AddPhotos request={request} />}
        {may.cancel && <Cancel request={request} />}
      </div>
      <aside className="border-t border-rule bg-paper px-4 py-5 sm:px-6 xl:border-t-0 xl:border-l">
        {may.change && <Change request={request} />}
        <Facts request={request} assignee={!may.change} />
      </aside>
    </article>
  );
}

function Back({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer, side } = useMembership();
  const [search] = useSearchParams();
  const store = side === 'store';
  const to = store ? paths.store(producer.slug, request.storeId) : paths.requests(producer.slug, search.size > 0 ? `?${search}` : '');
  return (
    <Link to={to} className={`mb-3 inline-flex min-h-11 items-center gap-2 font-semibold text-fjord ${store ? '' : 'lg:hidden'}`}>
      <ArrowLeft aria-hidden size={18} />
      {store ? t('one.back-store') : t('one.back')}
    </Link>
  );
}

/** What the rules let this person do with this very request. */
function useMay(request: Request) {
  const ability = useAbility();
  const { side } = useMembership();
  const { id, storeId, kind, state } = request;
  const asked = { id, storeId, kind, assigneeId: request.assignee?.id ?? null };
  const can = (action: 'create' | 'update' | 'reply' | 'cancel') => ability.can(action, row('Request', asked));
  const over = hasEnded(state);
  return {
    reply: !over && can('reply'),
    note: ability.can('create', row('Note', asked)),
    change: state !== 'cancelled' && state !== 'closed' && can('update'),
    addPhotos: !over && can('create'),
    // The producer's people close a request; taking it back is the store's own word.
    cancel: side === 'store' && state !== 'solved' && !over && can('cancel'),
  };
}

/** The entries others added while this page was open. */
function useFresh(request: Request): ReadonlySet<string> {
  const { membershipId } = useMembership();
  const [known] = useState(() => new Set(request.entries.map(({ id }) => id)));
  return new Set(request.entries.filter(({ id, author }) => !known.has(id) && author?.id !== membershipId).map(({ id }) => id));
}
