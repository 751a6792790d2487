import type { ComponentProps } from 'react';

/** The box of every control that is typed into or chosen from. */
export const controlClass =
  'min-h-12 w-full rounded-control border border-edge bg-surface px-3 py-2.5 text-[1rem] text-ink hover:border-ink-2 disabled:bg-sunk disabled:text-ink-3 aria-invalid:border-2 aria-invalid:border-rust';

export const TextInput = ({ type = 'text', ...native }: Omit<ComponentProps<'input'>, 'className'>) => (
  <input {...native} type={type} className={controlClass} />
);
