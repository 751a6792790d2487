import { useId, type ReactNode } from 'react';

/** A titled part of a page. */
export function Section({ title, children }: { title: string; children: ReactNode }) {
  const heading = useId();
  return (
    <section aria-labelledby={heading} className="min-w-0">
      <h2 id={heading} className="border-b border-rule pb-2.5 font-bold">
        {title}
      </h2>
      {children}
    </section>
  );
}
