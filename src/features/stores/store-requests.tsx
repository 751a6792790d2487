import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { RequestSummary } from '../../../server/contract/requests';
import type { StorePage } from '../../../server/contract/stores';
import { liveStates, type RequestState } from '../../../server/contract/words';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { StateTag } from '../requests/state-tag';
import { useStoreWords } from './use-store-words';

interface Props {
  found: StorePage;
  now: number;
}

const isLive = (state: RequestState): boolean => liveStates.some((live) => live === state);

/** Who is fixing it: what is open, and what ended lately. */
export function StoreRequests({ found, now }: Props) {
  const { t } = useTranslation('store');
  const live = found.requests.filter(({ state }) => isLive(state));
  const ended = found.requests.filter(({ state }) => !isLive(state));
  return (
    <section aria-labelledby="open-requests">
      <h2 id="open-requests" className="border-b border-rule pb-2.5 font-bold">
        {t('requests.open')}
      </h2>
      {live.length === 0 && <p className="py-3 text-ink-2">{t('requests.none')}</p>}
      <Requests requests={live} now={now} />
      {ended.length > 0 && (
        <>
          <h3 className="border-b border-rule pt-5 pb-2.5 font-bold">{t('requests.ended')}</h3>
          <Requests requests={ended} now={now} />
        </>
      )}
    </section>
  );
}

const Requests = ({ requests, now }: { requests: RequestSummary[]; now: number }) => (
  <ul className="divide-y divide-rule">
    {requests.map((request) => (
      <li key={request.id}>
        <OneRequest request={request} now={now} />
      </li>
    ))}
  </ul>
);

function OneRequest({ request, now }: { request: RequestSummary; now: number }) {
  const { t } = useTranslation(['store', 'requests']);
  const say = useStoreWords(request.timeZone, now);
  const { producer } = useMembership();
  return (
    <Link to={paths.request(producer.slug, request.id)} className="group block py-3">
      <span className="flex flex-wrap items-center gap-x-2 gap-y-1">
        <span className="font-semibold group-hover:underline">{t(`requests:kinds.${request.kind}`)}</span>
        <StateTag state={request.state} day={request.scheduledDay} />
      </span>
      <span className="mt-1 block text-small text-ink-2">
        {[t('requests:number', { number: request.number }), request.freezer, request.photos > 0 && t('requests.photos', { count: request.photos })].filter(Boolean).join(' · ')}
      </span>
      <span className="block text-small text-ink-3">{t('requests.changed', { ago: say.ago(request.changedAt) })}</span>
    </Link>
  );
}
