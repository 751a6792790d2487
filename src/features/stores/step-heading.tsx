import { useEffect, useRef, type ReactNode } from 'react';

/** The heading of a step; takes the focus as the step appears, so that the keyboard and the screen reader follow. */
export function StepHeading({ children }: { children: ReactNode }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus({ preventScroll: true }), []);
  return (
    <h2 ref={heading} tabIndex={-1} className="text-lead font-bold outline-none">
      {children}
    </h2>
  );
}
