import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { urlOf } from '../../api/call';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { CsvLink } from '../../table/csv-link';
import { Pager } from '../../table/pager';
import { queryFrom } from '../../table/query-from';
import { ComparisonFilters } from './comparison-filters';
import { ComparisonTable } from './comparison-table';
import { Leading } from './leading';
import { NoStores } from './no-stores';

type Comparison = Result<typeof api.comparison.read>;

export const comparisonPage = page({
  words: ['comparison'],
  queries: (place) => ({
    found: q(api.comparison.read, {
      params: { producer: place.params.producer ?? '' },
      query: { ...queryFrom(api.comparison.read, ['q', 'after'], place.search), limit: '100' },
    }),
  }),
  View: Comparison,
});

interface Props {
  found: Comparison;
  place: Place;
}

/** The stores side by side over the last four weeks. */
function Comparison({ found: { since, stores, next }, place }: Props) {
  const { t } = useTranslation('comparison');
  const { producer, side } = useMembership();
  const format = useFormat(producer.timeZone);
  return (
    <div className={side === 'store' ? '' : 'px-4 py-5 lg:px-7 lg:py-6'}>
      <PageTitle title={t('title')} />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-title font-bold">{t('title')}</h1>
        <CsvLink href={urlOf(api.comparison.csv, { producer: producer.slug }, queryFrom(api.comparison.csv, ['q'], place.search))} />
      </div>
      <p className="mt-1 max-w-3xl text-ink-2">{t('lead', { day: format.date(since) })}</p>
      <ComparisonFilters />
      {stores.length > 1 && <Leading stores={stores} whole={next === null && !place.search.has('after')} />}
      {stores.length === 0 ? <NoStores /> : <ComparisonTable stores={stores} />}
      <Pager next={next} />
    </div>
  );
}
