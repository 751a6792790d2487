import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { FleetColumn, FleetRow as Row } from '../../../server/contract/fleet';
import { FleetCell } from './fleet-cells';
import { narrowClass } from './narrow-class';
import type { Open } from './use-open';
import { useStanding } from './use-standing';

interface Props {
  row: Row;
  columns: FleetColumn[];
  open: Open;
  now: number;
}

/** One freezer: 52 px on a desk, a card with what matters most on a phone. */
export function FleetRow({ row, columns, open, now }: Props) {
  const { t } = useTranslation('freezers');
  const standing = useStanding()(row, now);
  const picked = row.id === open.shown;
  const narrow = open.shown !== null;
  return (
    <tr role="row" className={`${card} ${picked ? 'bg-fjord-tint lg:shadow-[inset_3px_0_0_var(--fjord)]' : 'bg-surface hover:bg-ice-3'}`}>
      <th scope="row" role="rowheader" className={`${cell} col-span-2 font-normal ${narrow ? `lg:max-w-46 ${narrowClass()}` : 'lg:max-w-64 lg:px-3'}`}>
        <Link
          to={open.linkTo(row.id)}
          preventScrollReset
          data-row={row.id}
          aria-current={picked ? 'true' : undefined}
          className="font-semibold text-ink lg:scroll-mt-14 -outline-offset-2 after:absolute after:inset-0 focus-visible:outline-none focus-visible:after:outline-2 focus-visible:after:-outline-offset-2 focus-visible:after:outline-fjord"
        >
          <span className={name}>{row.store}</span>
          <span className="sr-only">, </span>
          <span title={row.name} className={`${name} text-small font-normal text-ink-3`}>
            {row.name}
          </span>
        </Link>
      </th>
      {columns.map((column) => (
        <td key={column} role="cell" className={`${cell} ${places[column] ?? 'hidden'} ${narrow ? narrowClass(column) : 'lg:px-3'}`}>
          {column !== 'state' && (
            <span aria-hidden className="block text-small text-ink-3 lg:hidden">
              {t(`columns.${column}`)}
            </span>
          )}
          <FleetCell column={column} row={row} standing={standing} now={now} narrow={narrow} />
        </td>
      ))}
    </tr>
  );
}

const card = 'relative grid grid-cols-2 gap-x-4 gap-y-2 rounded-card border border-rule p-4 lg:table-row lg:h-13 lg:rounded-none lg:border-0 lg:p-0';
const name = 'block lg:truncate';
const cell = 'align-middle lg:text-body lg:whitespace-nowrap lg:table-cell lg:border-t lg:border-rule lg:py-1.5';

/** Where a column stands in a card; the others are for the table. */
const places: Partial<Record<FleetColumn, string>> = {
  level: 'block',
  likely: 'block',
  truck: 'block col-span-2',
  state: 'block order-first col-span-2 max-lg:empty:hidden',
};
