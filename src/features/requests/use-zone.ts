import type { RequestSummary } from '../../../server/contract/requests';
import { useMembership } from '../../lib/me';

/** The store's people read the store's clock, the producer's people their own. */
export function useZone({ timeZone }: Pick<RequestSummary, 'timeZone'>): string {
  const { side, producer } = useMembership();
  return side === 'store' ? timeZone : producer.timeZone;
}
