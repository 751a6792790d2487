import { useQuery } from '@tanstack/react-query';
import { loadOutlines, type Outlines } from './outlines';

/** Undefined until they are there: a map's marks do not wait for its land. */
export const useOutlines = (): Outlines | undefined =>
  useQuery({ queryKey: ['map-outlines'], queryFn: loadOutlines, staleTime: Infinity, gcTime: Infinity }).data;
