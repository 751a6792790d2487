import type { StorePage } from '../../../server/contract/stores';
import type { StoreNow } from '../../../server/domain/answers';

/** The page's data as the three answers ask for it. */
export const knownOf = ({ store, ...rest }: StorePage): StoreNow => ({ ...rest, timeZone: store.timeZone, deliveryDays: store.deliveryDays });
