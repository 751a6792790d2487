import type { ReactNode } from 'react';
import { ArrowDown, ArrowUp } from 'lucide-react';

/** By which column the rows stand, counted from 0, and what a press on the head of one does. */
export interface TableSort {
  column: number;
  order: 'ascending' | 'descending';
  onSort: (column: number) => void;
}

interface Props {
  label: string;
  columns: string[];
  /** As many cells as there are columns; the first names the row. */
  rows: { id: string; cells: ReactNode[] }[];
  /** On a desk; a phone has no heads to press. */
  sort?: TableSort;
  /** Short cells: two beside each other on a phone's cards. */
  pairs?: boolean;
}

/** Rows of a table on a desk, cards on a phone. */
export const CardTable = ({ label, columns, rows, sort, pairs = false }: Props) => (
  <div className="lg:overflow-x-auto lg:rounded-card lg:border lg:border-rule lg:bg-surface">
    <table role="table" aria-label={label} className="block w-full text-left lg:table">
      <thead role="rowgroup" className="sr-only lg:not-sr-only lg:table-header-group">
        <tr role="row" className="text-small text-ink-3">
          {columns.map((column, i) => (
            <th key={column} scope="col" role="columnheader" aria-sort={sort?.column === i ? sort.order : undefined} className={`px-3 font-semibold ${sort ? 'py-0.5' : 'py-2.5'}`}>
              {sort ? <SortHead name={column} order={sort.column === i ? sort.order : null} onPress={() => sort.onSort(i)} /> : column}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="grid gap-3 lg:table-row-group">
        {rows.map(({ id, cells: [name, ...rest] }) => (
          <tr key={id} role="row" className={`grid gap-2 ${pairs ? 'grid-cols-2 gap-x-4' : ''} rounded-card border border-rule bg-surface p-4 lg:table-row lg:rounded-none lg:border-0 lg:p-0`}>
            <th scope="row" role="rowheader" className={`${cellClass} ${pairs ? 'col-span-2' : ''} font-semibold wrap-anywhere`}>
              {name}
            </th>
            {rest.map((cell, i) => (
              <td key={columns[i + 1]} role="cell" className={cellClass}>
                <span aria-hidden className="block text-small text-ink-3 lg:hidden">
                  {columns[i + 1]}
                </span>
                {cell}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  </div>
);

const cellClass = 'block min-w-0 align-middle lg:table-cell lg:border-t lg:border-rule lg:px-3 lg:py-2.5';

/** The name alone where the heads are only heard. */
const SortHead = ({ name, order, onPress }: { name: string; order: TableSort['order'] | null; onPress: () => void }) => (
  <>
    <span className="lg:hidden">{name}</span>
    <button type="button" onClick={onPress} className="hidden min-h-11 items-center gap-1 text-left font-semibold hover:text-ink lg:inline-flex">
      {name}
      <span aria-hidden className="size-3.5 shrink-0">
        {order === 'ascending' && <ArrowUp size={14} />}
        {order === 'descending' && <ArrowDown size={14} />}
      </span>
    </button>
  </>
);
