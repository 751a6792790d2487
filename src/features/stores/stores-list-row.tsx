import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { StoreSummary } from '../../../server/contract/stores';
import { freshnessOf } from '../../../server/domain/freshness';
import { useAbility, useMembership } from '../../lib/me';
import { useFormat } from '../../lib/format';
import { AttentionTag } from './attention-tag';
import { truckWords } from './truck-words';
import { useStoreWords } from './use-store-words';

interface Props {
  store: StoreSummary;
  /** Where the row leads. */
  to: string;
  now: number;
}

/** One store: 52 px on a desk, a card on a phone. */
export function StoresListRow({ store, to, now }: Props) {
  const { t } = useTranslation('stores-list');
  const { producer, side } = useMembership();
  const format = useStoreWords(side === 'store' ? store.timeZone : producer.timeZone, now);
  const isTold = useAbility().can('read', 'NextTruck');
  const { nextTruck, openRequests, runOutLikely } = store;
  return (
    <tr role="row" className="relative grid grid-cols-2 gap-x-4 gap-y-2 rounded-card border border-rule bg-surface p-4 hover:bg-ice-3 lg:table-row lg:rounded-none lg:border-0 lg:p-0">
      <th scope="row" role="rowheader" className={`${cell} col-span-2 font-normal`}>
        <Link to={to} className="font-semibold text-ink after:absolute after:inset-0">
          {store.name}
        </Link>
        <span className="block text-small text-ink-3">
          {store.street}, {store.city}
        </span>
      </th>
      <td role="cell" className={cell}>
        <Level store={store} now={now} />
      </td>
      <td role="cell" className={cell}>
        <Narrow label={t('columns.run-out')} />
        <span className="block first-letter:uppercase">{runOutLikely === null ? t('no-run-out') : format.partOfDay(runOutLikely)}</span>
      </td>
      {isTold && (
        <td role="cell" className={cell}>
          <Narrow label={t('columns.truck')} />
          {nextTruck ? truckWords(nextTruck, format, now) : t('no-truck')}
        </td>
      )}
      <td role="cell" className={cell}>
        <Narrow label={t('columns.requests')} />
        {openRequests > 0 ? t('requests', { count: openRequests }) : t('no-requests')}
      </td>
      <td role="cell" className={`${cell} order-first col-span-2 lg:order-none`}>
        <AttentionTag attention={store.attention} truck={nextTruck !== null} />
      </td>
    </tr>
  );
}

const cell = 'block align-middle lg:table-cell lg:border-t lg:border-rule lg:px-3 lg:py-1.5';

/** The column's name, where there are no columns. */
const Narrow = ({ label }: { label: string }) => (
  <span aria-hidden className="block text-small text-ink-3 lg:hidden">
    {label}
  </span>
);

function Level({ store, now }: Omit<Props, 'to'>) {
  const { t } = useTranslation('stores-list');
  const format = useFormat();
  const { share, pounds, at } = store;
  if (share === null || pounds === null || at === null) return <span className="text-ink-3">{t('no-level')}</span>;
  return (
    <>
      <span className="block">
        {t('level', { share: format.percent(share), pounds: format.pounds(pounds) })}
        {freshnessOf(at, now) !== 'fresh' && <span className="text-small text-straw"> · {t('old-level', { age: format.duration(now - at) })}</span>}
      </span>
      <span aria-hidden className="mt-1 block h-1.5 max-w-36 overflow-hidden rounded-tag bg-sunk">
        <span className="block h-full bg-fjord-2" style={{ width: `${Math.round(share * 100)}%` }} />
      </span>
    </>
  );
}
