import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { page } from '../../api/page';
import { q } from '../../api/query';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { Pager } from '../../table/pager';
import { EmptyState } from '../../ui/states';
import { useNow } from '../stores/use-now';
import { CardTable } from '../../table/card-table';
import { Moment } from './moment';
import { SensorsFrame } from './sensors-frame';

export const quarantinedPage = page({
  words: ['sensors'],
  queries: ({ params, search }) => ({
    found: q(api.sensors.listQuarantined, {
      params: { producer: params.producer ?? '' },
      query: { after: search.get('after') ?? undefined, limit: '25' },
    }),
  }),
  View: Quarantined,
});

/** Readings that were not believed, and why. */
function Quarantined({ found }: { found: Result<typeof api.sensors.listQuarantined> }) {
  const { t } = useTranslation('sensors');
  const now = useNow();
  const rows = found.readings.map(({ id, serial, at, reason, records, receivedAt }) => ({
    id,
    cells: [
      serial || t('readings.no-serial'),
      <Moment key="received" at={receivedAt} now={now} />,
      <ClaimedTime key="claimed" at={at} />,
      t(`readings.reasons.${reason}`),
      <span key="records" className="wrap-anywhere">
        {records.length > 0 ? records.join(', ') : t('readings.no-records')}
      </span>,
    ],
  }));
  const columns = [t('serial'), t('readings.received'), t('readings.claimed'), t('readings.reason'), t('readings.records')];
  return (
    <SensorsFrame title={t('readings.title')} lead={t('readings.lead')}>
      {rows.length === 0 ? (
        <EmptyState title={t('readings.empty')}>{t('readings.empty-words')}</EmptyState>
      ) : (
        <CardTable label={t('readings.title')} columns={columns} rows={rows} />
      )}
      <Pager next={found.next} />
    </SensorsFrame>
  );
}

/** With its year, for it may be any; what no calendar holds is told as none. */
function ClaimedTime({ at }: { at: number | null }) {
  const { t } = useTranslation('sensors');
  const format = useFormat(useMembership().producer.timeZone);
  if (at === null || Math.abs(at) > LAST_INSTANT) return <span className="text-ink-3">{t('readings.no-time')}</span>;
  return `${format.longDate(at)}, ${format.time(at)}`;
}

/** The end of ECMAScript's time (ECMA-262, "Time Values and Time Range"). */
const LAST_INSTANT = 8.64e15;
