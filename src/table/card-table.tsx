import type { ReactNode } from 'react';

interface Props {
  label: string;
  columns: string[];
  /** As many cells as there are columns; the first names the row. */
  rows: { id: string; cells: ReactNode[] }[];
}

/** Rows of a table on a desk, cards on a phone. */
export const CardTable = ({ label, columns, rows }: Props) => (
  <div className="lg:overflow-x-auto lg:rounded-card lg:border lg:border-rule lg:bg-surface">
    <table role="table" aria-label={label} className="block w-full text-left lg:table">
      <thead role="rowgroup" className="sr-only lg:not-sr-only lg:table-header-group">
        <tr role="row" className="text-small text-ink-3">
          {columns.map((column) => (
            <th key={column} scope="col" role="columnheader" className="px-3 py-2.5 font-semibold">
              {column}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="grid gap-3 lg:table-row-group">
        {rows.map(({ id, cells: [name, ...rest] }) => (
          <tr key={id} role="row" className="grid gap-2 rounded-card border border-rule bg-surface p-4 lg:table-row lg:rounded-none lg:border-0 lg:p-0">
            <th scope="row" role="rowheader" className={`${cellClass} font-semibold wrap-anywhere`}>
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
