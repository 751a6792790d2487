import type { ComponentProps } from 'react';

interface Props extends ComponentProps<'div'> {
  as?: 'div' | 'section' | 'article' | 'aside';
}

/** A sheet of paper on the page. */
export const Card = ({ as: Element = 'div', className = '', ...native }: Props) => (
  <Element {...native} className={`rounded-card border border-rule bg-surface p-4 sm:p-5 ${className}`} />
);
