import type { ReactNode } from 'react';

interface EmptyProps {
  title: string;
  children?: ReactNode;
  /** What to do next. */
  action?: ReactNode;
}

/** Nothing here yet, or nothing found. */
export const EmptyState = ({ title, children, action }: EmptyProps) => (
  <div className="grid justify-items-start gap-2 rounded-card border border-dashed border-edge px-5 py-6">
    <p className="text-lead font-semibold">{title}</p>
    {children && <div className="max-w-prose text-ink-2">{children}</div>}
    {action && <div className="mt-2">{action}</div>}
  </div>
);
