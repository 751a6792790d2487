import type { ComponentProps } from 'react';
import { ChevronDown } from 'lucide-react';
import { controlClass } from './text-input';

/** The device's own list, in our box. */
export const Select = ({ children, ...native }: Omit<ComponentProps<'select'>, 'className'>) => (
  <span className="relative block">
    <select {...native} className={`${controlClass} appearance-none truncate pr-10`}>
      {children}
    </select>
    <ChevronDown aria-hidden size={18} className="pointer-events-none absolute top-1/2 right-3 -translate-y-1/2 text-ink-3" />
  </span>
);
