import { useEffect, useRef, useState, type RefObject } from 'react';

/** The real width of a box, whole pixels; null until it is known. */
export function useWidth(): [RefObject<HTMLDivElement | null>, number | null] {
  const box = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState<number | null>(null);
  useEffect(() => {
    const { current } = box;
    if (!current) return;
    const observer = new ResizeObserver(([entry]) => setWidth(Math.floor(entry?.contentRect.width ?? 0) || null));
    observer.observe(current);
    return () => observer.disconnect();
  }, []);
  return [box, width];
}
