import { useRef, type PointerEvent } from 'react';
import type { Point } from './view';

const slack = 4;

/** A mouse drags, a finger scrolls the page; either presses when it stays in place. */
export function useDrag(onDrag: (by: Point) => void, onPress: (at: Point) => void) {
  const held = useRef<{ from: Point; last: Point; dragging: boolean } | null>(null);
  return {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      if (event.button !== 0 || !event.isPrimary) return;
      const at = pointOf(event);
      held.current = { from: at, last: at, dragging: false };
      if (event.pointerType === 'mouse') event.currentTarget.setPointerCapture(event.pointerId);
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      const { current } = held;
      if (!current) return;
      const at = pointOf(event);
      current.dragging ||= Math.hypot(at.x - current.from.x, at.y - current.from.y) > slack;
      if (!current.dragging || event.pointerType !== 'mouse') return;
      onDrag({ x: current.last.x - at.x, y: current.last.y - at.y });
      current.last = at;
    },
    onPointerUp: (event: PointerEvent<HTMLElement>) => {
      if (held.current && !held.current.dragging) onPress(pointOf(event));
      held.current = null;
    },
    onPointerCancel: () => {
      held.current = null;
    },
  };
}

function pointOf({ clientX, clientY, currentTarget }: PointerEvent<HTMLElement>): Point {
  const { left, top } = currentTarget.getBoundingClientRect();
  return { x: clientX - left, y: clientY - top };
}
