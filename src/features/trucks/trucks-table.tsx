import { useTranslation } from 'react-i18next';
import type { TruckRow } from '../../../server/contract/trucks';
import { CardTable } from '../../table/card-table';
import { useNow } from '../stores/use-now';
import { NextTruckCell } from './next-truck-cell';
import { ProposalCell } from './proposal-cell';
import { RunOutCell } from './run-out-cell';
import { StoreCell } from './store-cell';
import type { Chosen } from './use-chosen';
import type { Telling } from './use-telling';

interface Props {
  rows: TruckRow[];
  chosen: Chosen;
  telling: Telling;
}

/** Each store with its truck, its run-out and what is proposed to it. */
export function TrucksTable({ rows, chosen, telling }: Props) {
  const { t } = useTranslation('trucks');
  const now = useNow();
  const columns = [t('columns.store'), t('columns.truck'), t('columns.run-out'), t('columns.proposal')];
  const ids = rows.map(({ store }) => store.id);
  const cells = rows.map((row) => ({
    id: row.store.id,
    cells: [
      <StoreCell key="store" store={row.store} chosen={chosen.has(row.store.id)} onChoose={(on, range) => chosen.press(ids, row.store.id, on, range)} />,
      <NextTruckCell key="truck" row={row} now={now} />,
      <RunOutCell key="run-out" row={row} now={now} />,
      <ProposalCell key="proposal" row={row} draft={telling.drafts.get(row.store.id)} now={now} onChange={telling.change} />,
    ],
  }));
  return <CardTable label={t('title')} columns={columns} rows={cells} />;
}
