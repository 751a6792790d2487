import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { page } from '../../api/page';
import { q } from '../../api/query';
import { Pager } from '../../table/pager';
import { EmptyState } from '../../ui/states';
import { useNow } from '../stores/use-now';
import { CardTable } from '../../table/card-table';
import { Moment } from './moment';
import { SensorsFrame } from './sensors-frame';

export const unclaimedPage = page({
  words: ['sensors'],
  queries: ({ params, search }) => ({
    found: q(api.sensors.listUnclaimed, {
      params: { producer: params.producer ?? '' },
      query: { after: search.get('after') ?? undefined, limit: '25' },
    }),
  }),
  View: Unclaimed,
});

/** Sensors that speak and hang in no freezer. */
function Unclaimed({ found }: { found: Result<typeof api.sensors.listUnclaimed> }) {
  const { t } = useTranslation('sensors');
  const now = useNow();
  const rows = found.sensors.map(({ id, serial, firstHeardAt, lastReadingAt }) => ({
    id,
    cells: [serial, <Moment key="first" at={firstHeardAt} now={now} />, <Moment key="last" at={lastReadingAt} now={now} />],
  }));
  return (
    <SensorsFrame title={t('unclaimed.title')} lead={t('unclaimed.lead')}>
      {rows.length === 0 ? (
        <EmptyState title={t('unclaimed.empty')}>{t('unclaimed.empty-words')}</EmptyState>
      ) : (
        <CardTable label={t('unclaimed.title')} columns={[t('serial'), t('unclaimed.first'), t('unclaimed.last')]} rows={rows} />
      )}
      <Pager next={found.next} />
    </SensorsFrame>
  );
}
