import { useMutationState } from '@tanstack/react-query';

/** When the reader last changed something themselves: what follows from that is news to nobody and may move a list. */
export function useOwnActs(): number {
  const sent = useMutationState({ filters: { status: 'success' }, select: ({ state }) => state.submittedAt });
  return Math.max(0, ...sent);
}
