import { useMemo, type RefObject } from 'react';
import { useWidth } from '../freezer/use-width';
import type { Size } from './view';

/** As wide as its box; null until that is known. */
export function useMapSize(): [RefObject<HTMLDivElement | null>, Size | null] {
  const [box, width] = useWidth();
  const size = useMemo(() => (width ? { width, height: heightOf(width) } : null), [width]);
  return [box, size];
}

const heightOf = (width: number) => (width < 520 ? 320 : Math.min(600, Math.round(width * 0.75)));
