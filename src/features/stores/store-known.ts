import { row } from '../../../server/contract/ability';
import type { StorePage } from '../../../server/contract/stores';
import type { StoreNow } from '../../../server/domain/answers';
import { useAbility } from '../../lib/me';

/** The page's data as the three answers ask for it; who may not read of trucks is told nothing of them. */
export function useKnown({ store, nextTruck, ...rest }: StorePage): StoreNow {
  const isTold = useAbility().can('read', row('NextTruck', { storeId: store.id }));
  return { ...rest, nextTruck: isTold ? nextTruck : undefined, timeZone: store.timeZone, deliveryDays: store.deliveryDays };
}
