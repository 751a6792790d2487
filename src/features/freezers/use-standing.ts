import type { FleetRow } from '../../../server/contract/fleet';
import { fleetStanding, type FleetStanding } from '../../../server/domain/fleet-standing';
import { useAbility } from '../../lib/me';

/** The worst thing about a freezer, for this viewer; who may not read of trucks is told nothing of them. */
export function useStanding(): (row: FleetRow, now: number) => FleetStanding {
  const isTold = useAbility().can('read', 'NextTruck');
  return (row, now) => fleetStanding({ ...row, truck: isTold ? row.truck : undefined }, now);
}
