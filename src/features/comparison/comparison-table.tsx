import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { ComparedStore } from '../../../server/contract/comparison';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { CardTable } from '../../table/card-table';
import { columns, measures, nextSort, sorted, worst } from './measures';
import { MeasureBar } from './measure-bar';
import { useSort } from './use-sort';

export function ComparisonTable({ stores }: { stores: ComparedStore[] }) {
  const { t, i18n } = useTranslation('comparison');
  const { sort, setSort } = useSort();
  const most = Object.fromEntries(measures.map((measure) => [measure, worst(stores, measure)]));
  const rows = sorted(stores, sort, i18n.language).map((store) => ({
    id: store.id,
    cells: [
      <Store key="name" store={store} />,
      ...measures.map((measure) => <MeasureBar key={measure} measure={measure} value={store[measure]} most={most[measure] ?? 0} />),
    ],
  }));
  const onSort = (i: number) => {
    const column = columns[i];
    if (column) setSort(nextSort(sort, column));
  };
  return (
    <CardTable
      label={t('title')}
      columns={columns.map((column) => t(`columns.${column}`))}
      rows={rows}
      sort={{ column: columns.indexOf(sort.column), order: sort.order, onSort }}
      pairs
    />
  );
}

/** Figures from less than half of the time are to be read with care. */
const ENOUGH = 0.5;

function Store({ store: { id, name, city, account, known } }: { store: ComparedStore }) {
  const { t } = useTranslation('comparison');
  const { slug } = useMembership().producer;
  const format = useFormat();
  return (
    <>
      <Link to={paths.store(slug, id)} className="inline-flex min-h-11 items-center text-fjord underline underline-offset-4 lg:min-h-0">
        {name}
      </Link>
      <span className="block text-small font-normal text-ink-3">{[city, account].filter(Boolean).join(' · ')}</span>
      {known < ENOUGH && <span className="block text-small font-normal text-straw">{t('known', { share: format.percent(known) })}</span>}
    </>
  );
}
