import { useTranslation } from 'react-i18next';
import type { FleetColumn, FleetRow as Row } from '../../../server/contract/fleet';
import { FleetRow } from './fleet-row';
import { besideColumns, narrowClass } from './narrow-class';
import type { Open } from './use-open';

interface Props {
  rows: Row[];
  columns: FleetColumn[];
  open: Open;
  now: number;
}

/** Dense rows under a head that stays, on a desk; cards on a phone. */
export function FleetTable({ rows, columns, open, now }: Props) {
  const { t } = useTranslation('freezers');
  const narrow = open.shown !== null;
  const shown = narrow ? columns.filter((column) => besideColumns.includes(column)) : columns;
  return (
    <div className="lg:min-h-0 lg:overflow-auto lg:rounded-card lg:border lg:border-rule lg:bg-surface">
      <table role="table" aria-label={t('title')} className="block w-full text-left lg:table">
        <thead role="rowgroup" className="sr-only lg:not-sr-only lg:sticky lg:top-0 lg:z-10 lg:table-header-group lg:bg-surface">
          <tr role="row" className="text-small text-ink-3">
            <th scope="col" role="columnheader" className={`${head} ${narrow ? narrowClass() : 'lg:px-3'}`}>
              {t('columns.name')}
            </th>
            {shown.map((column) => (
              <th key={column} scope="col" role="columnheader" aria-sort={column === 'likely' ? 'ascending' : undefined} className={`${head} ${narrow ? narrowClass(column) : 'lg:px-3'}`}>
                {t(column === 'likely' && !narrow ? 'columns.likely-days' : `columns.${column}`)}
                {column === 'likely' && <span aria-hidden> ▾</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" className="grid gap-3 lg:table-row-group">
          {rows.map((row) => (
            <FleetRow key={row.id} row={row} columns={shown} open={open} now={now} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

const head = 'py-2.5 font-semibold whitespace-nowrap shadow-[inset_0_-1px_0_var(--rule)]';
