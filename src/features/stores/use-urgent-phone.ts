import type { StorePage } from '../../../server/contract/stores';
import { useMembership } from '../../lib/me';

/** Whom a store calls when it cannot wait: a number of its own, else the producer's. */
export function useUrgentPhone(store: StorePage['store']): string {
  const { urgentPhone } = useMembership().producer;
  return store.urgentPhone || urgentPhone;
}
