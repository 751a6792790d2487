import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { RequestSummary } from '../../../server/contract/requests';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { StateTag } from '../requests/state-tag';
import { useStoreWords } from './use-store-words';

interface Props {
  request: RequestSummary;
  now: number;
}

/** One request in three short lines, leading to its page. */
export function RequestLink({ request, now }: Props) {
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
