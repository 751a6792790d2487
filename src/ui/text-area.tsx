import type { ComponentProps } from 'react';
import { controlClass } from './text-input';

/** Grows with its words, from `rows` lines on. */
export const TextArea = ({ rows = 4, ...native }: Omit<ComponentProps<'textarea'>, 'className' | 'style'>) => (
  <textarea {...native} rows={rows} style={{ minHeight: `calc(${rows}lh + 1.375rem)` }} className={`${controlClass} field-sizing-content`} />
);
