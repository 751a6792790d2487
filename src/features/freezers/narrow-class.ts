import type { FleetColumn } from '../../../server/contract/fleet';

/** What fits when a freezer stands beside the list, which says the rest of it. */
export const besideColumns: readonly FleetColumn[] = ['level', 'likely', 'truck', 'state'];

/** Cells stand closer, and of these columns the truck needs a wide window. */
export const narrowClass = (column?: FleetColumn): string => (column === 'truck' ? 'lg:px-2 lg:max-[88rem]:hidden' : 'lg:px-2');
