import { useState } from 'react';
import { fleetColumns, type FleetColumn } from '../../../server/contract/fleet';
import { useAbility, useMembership } from '../../lib/me';

export interface Columns {
  /** Those this viewer may look at. */
  all: FleetColumn[];
  /** In the order of the table. */
  shown: FleetColumn[];
  toggle: (column: FleetColumn) => void;
}

/** The columns a person chose at this producer, kept in the browser. */
export function useColumns(): Columns {
  const place = `nilas.columns.${useMembership().membershipId}`;
  const isTold = useAbility().can('read', 'NextTruck');
  const all = fleetColumns.filter((column) => column !== 'truck' || isTold);
  const [kept, keep] = useState(() => keptColumns(localStorage.getItem(place)));
  const toggle = (column: FleetColumn) => {
    const next = fleetColumns.filter((one) => kept.includes(one) !== (one === column));
    localStorage.setItem(place, next.join(','));
    keep(next);
  };
  return { all, shown: all.filter((column) => kept.includes(column)), toggle };
}

/** What was kept, without what no version of the table knows; before a first choice the usual ones. */
export const keptColumns = (kept: string | null): FleetColumn[] =>
  kept === null ? [...usual] : fleetColumns.filter((column) => kept.split(',').includes(column));

const usual: readonly FleetColumn[] = ['level', 'air', 'likely', 'truck', 'state'];
