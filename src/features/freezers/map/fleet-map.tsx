import { lazy, Suspense } from 'react';
import type { QueryInput } from '../../../../server/contract/endpoint';
import type { api } from '../../../../server/contract/index';
import { Skeleton } from '../../../ui/skeleton';

export interface FleetMapProps {
  query: QueryInput<typeof api.freezers.map>;
}

const Drawn = lazy(async () => ({ default: (await import('./stores-map')).StoresMap }));

/** The selection's stores on a map, and the same in a table; what draws maps is fetched with the first one. */
export const FleetMap = (props: FleetMapProps) => (
  <Suspense fallback={<Skeleton className="h-80 lg:h-150" />}>
    <Drawn {...props} />
  </Suspense>
);
