import type { ComponentProps } from 'react';
import { controlClass } from './text-input';

export const TextArea = ({ rows = 4, ...native }: Omit<ComponentProps<'textarea'>, 'className'>) => (
  <textarea {...native} rows={rows} className={`${controlClass} field-sizing-content`} />
);
