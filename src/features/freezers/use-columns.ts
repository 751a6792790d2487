import { useState } from 'react';
import { fleetColumns, type FleetColumn } from '../../../server/contract/fleet';
import { useMembership } from '../../lib/me';

export interface Columns {
  /** In the order of the table. */
  shown: FleetColumn[];
  toggle: (column: FleetColumn) => void;
}

/** The columns a person chose at this producer, kept in the browser. */
export function useColumns(): Columns {
  const place = `nilas.columns.${useMembership().membershipId}`;
  const [shown, show] = useState(() => keptColumns(localStorage.getItem(place)));
  const toggle = (column: FleetColumn) => {
    const next = fleetColumns.filter((one) => shown.includes(one) !== (one === column));
    localStorage.setItem(place, next.join(','));
    show(next);
  };
  return { shown, toggle };
}

/** What was kept, without what no version of the table knows; before a first choice the usual ones. */
export const keptColumns = (kept: string | null): FleetColumn[] =>
  kept === null ? [...usual] : fleetColumns.filter((column) => kept.split(',').includes(column));

const usual: readonly FleetColumn[] = ['level', 'air', 'likely', 'truck', 'state'];
