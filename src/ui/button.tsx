import type { ComponentProps, MouseEvent, ReactNode } from 'react';
import { Spinner } from './spinner';

export type ButtonVariant = 'primary' | 'quiet' | 'danger';
/** `normal` is 44 px high; `big`, 48, for gloves and thumbs. */
export type ButtonSize = 'normal' | 'big';

interface Look {
  size?: ButtonSize;
  /** As wide as its place. */
  wide?: boolean;
}

interface Props extends Look, Omit<ComponentProps<'button'>, 'className' | 'aria-label'> {
  variant?: ButtonVariant;
  /** Works on what was asked: stays in place, keeps focus, takes no second press. */
  busy?: boolean;
  /** A fuller name for those who hear the page. */
  label?: string;
}

export function Button({ variant, size, wide, busy = false, label, type = 'button', onClick, children, ...native }: Props) {
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (busy) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <button
      {...native}
      type={type}
      aria-label={label}
      aria-busy={busy || undefined}
      aria-disabled={busy || undefined}
      onClick={press}
      className={buttonClass(variant, { size, wide })}
    >
      {busy && <Spinner />}
      {children}
    </button>
  );
}

/** The look of a button, for links: `<Link className={buttonClass('quiet')} …>`. */
export const buttonClass = (variant: ButtonVariant = 'primary', { size = 'normal', wide = false }: Look = {}): string =>
  [shape, variants[variant], sizes[size], wide ? 'w-full' : ''].join(' ');

interface IconButtonProps extends Omit<ComponentProps<'button'>, 'className' | 'aria-label' | 'children'> {
  label: string;
  icon: ReactNode;
}

export const IconButton = ({ label, icon, type = 'button', ...native }: IconButtonProps) => (
  <button
    {...native}
    type={type}
    aria-label={label}
    className="grid size-11 shrink-0 place-items-center rounded-control text-ink-2 hover:bg-sunk hover:text-ink disabled:opacity-50"
  >
    {icon}
  </button>
);

/** Buttons side by side; on a narrow screen one under the other before a label would have to wrap. */
export const ButtonRow = ({ children }: { children: ReactNode }) => (
  <div className="flex flex-wrap gap-3 *:grow sm:*:grow-0">{children}</div>
);

const shape =
  'inline-flex items-center justify-center gap-2 rounded-control border px-4 font-semibold whitespace-nowrap no-underline transition-colors duration-100 disabled:opacity-50 aria-disabled:cursor-progress';

const variants: Record<ButtonVariant, string> = {
  primary: 'border-fjord bg-fjord text-on hover:bg-fjord-2 hover:border-fjord-2',
  quiet: 'border-edge bg-transparent text-fjord hover:bg-fjord-tint',
  danger: 'border-rust bg-rust text-on hover:opacity-90',
};

const sizes: Record<ButtonSize, string> = {
  normal: 'min-h-11 text-body',
  big: 'min-h-12 text-base',
};
