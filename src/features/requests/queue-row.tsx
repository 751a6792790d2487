import { useTranslation } from 'react-i18next';
import { Link, useSearchParams } from 'react-router-dom';
import type { RequestSummary } from '../../../server/contract/requests';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { StateTag } from './state-tag';
import { useZone } from './use-zone';

interface Props {
  request: RequestSummary;
  picked: boolean;
}

/** What is wrong, where, since when and with whom, in three short lines. */
export function QueueRow({ request, picked }: Props) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const [search] = useSearchParams();
  const format = useFormat(useZone(request));
  const filters = search.size > 0 ? `?${search}` : '';
  const where = request.freezer ? t('one.at', { store: request.store, freezer: request.freezer }) : request.store;
  return (
    <li className="border-b border-rule">
      <Link
        to={paths.request(producer.slug, request.id, filters)}
        state={{ keepFocus: true }}
        data-row
        aria-current={picked ? 'true' : undefined}
        className="block border-l-3 border-transparent px-4 py-3 hover:bg-surface aria-[current=true]:border-fjord aria-[current=true]:bg-surface"
      >
        <span className="flex items-start justify-between gap-3">
          <span className="font-bold">{t(`kinds.${request.kind}`)}</span>
          <StateTag state={request.state} day={request.scheduledDay} />
        </span>
        <span className="block truncate text-ink-2">{where}</span>
        <span className="block text-small text-ink-3">
          {[
            t('number', { number: request.number }),
            format.when(request.openedAt),
            request.assignee ? t('list.assigned', { name: request.assignee.name }) : t('list.unassigned'),
            ...(request.photos > 0 ? [t('list.photos', { count: request.photos })] : []),
          ].join(' · ')}
        </span>
      </Link>
    </li>
  );
}
