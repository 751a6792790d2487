import { useCallback } from 'react';
import type { MapMark } from '../../../../server/contract/fleet';
import { useAbility } from '../../../lib/me';

/** The words of a mark: running out first is before a truck, of which not everybody is told. */
export function useMarkKey(): (mark: MapMark) => MapMark | 'soon' {
  const isTold = useAbility().can('read', 'NextTruck');
  return useCallback((mark) => (mark === 'first' && !isTold ? 'soon' : mark), [isTold]);
}
