import type { ReactNode } from 'react';
import { Button } from './button';

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

interface ErrorProps {
  title: string;
  detail?: string;
  retry?: { label: string; busy?: boolean; onRetry: () => void };
  children?: ReactNode;
}

/** It failed: what, and what can be done. */
export const ErrorState = ({ title, detail, retry, children }: ErrorProps) => (
  <div role="alert" className="grid justify-items-start gap-2 rounded-card border border-rust bg-rust-tint px-5 py-6">
    <p className="text-lead font-semibold text-rust">{title}</p>
    {detail && <p className="max-w-prose">{detail}</p>}
    {children}
    {retry && (
      <div className="mt-2">
        <Button variant="quiet" busy={retry.busy} onClick={retry.onRetry}>
          {retry.label}
        </Button>
      </div>
    )}
  </div>
);
