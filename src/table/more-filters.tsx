import { useState, type ReactNode } from 'react';
import { SlidersHorizontal } from 'lucide-react';

interface Props {
  label: string;
  /** The width from which there is room for them all. */
  from: keyof typeof narrower;
  className: string;
  children: ReactNode;
}

/** Filters that narrow screens show only when asked to. */
export function MoreFilters({ label, from, className, children }: Props) {
  const [shown, show] = useState(false);
  return (
    <>
      <button
        type="button"
        aria-expanded={shown}
        onClick={() => show(!shown)}
        className={`flex min-h-12 items-center gap-2 justify-self-start font-semibold text-fjord ${wider[from]}`}
      >
        <SlidersHorizontal aria-hidden size={18} />
        {label}
      </button>
      <div className={`${className} ${shown ? '' : narrower[from]}`}>{children}</div>
    </>
  );
}

const narrower = { sm: 'max-sm:hidden', lg: 'max-lg:hidden' };
const wider = { sm: 'sm:hidden', lg: 'lg:hidden' };
