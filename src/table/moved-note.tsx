import { useRef } from 'react';
import { useTranslation } from 'react-i18next';

interface Props {
  /** As `useSteadyRows` says. */
  moved: boolean;
  showNewest: () => void;
  className?: string;
}

/** A word when a list would stand otherwise by now. It goes below the rows, which it must not push away, and stays in sight. */
export function MovedNote({ moved, showNewest, className = '' }: Props) {
  const { t } = useTranslation();
  const place = useRef<HTMLDivElement>(null);
  const show = () => {
    // The pressed button goes.
    place.current?.focus({ preventScroll: true });
    showNewest();
  };
  return (
    <div ref={place} tabIndex={-1} role="status" className={`sticky bottom-20 z-10 outline-none lg:bottom-2 ${className}`}>
      {moved && (
        <p className="mt-2 rounded-control border border-edge bg-surface px-4 text-ink-2">
          {t('moved.words')}{' '}
          <button type="button" onClick={show} className="min-h-12 font-semibold text-fjord underline underline-offset-4 lg:min-h-8">
            {t('moved.show')}
          </button>
        </p>
      )}
    </div>
  );
}
