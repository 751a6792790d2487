import { lazy, Suspense, type ReactNode } from 'react';
import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { Skeleton } from '../../ui/skeleton';

const FrontSection = lazy(async () => ({ default: (await import('../../freezer/front-section')).FrontSection }));
const CoverRibbon = lazy(async () => ({ default: (await import('../../freezer/cover-ribbon')).CoverRibbon }));

interface Props {
  freezer: Freezer;
  state: NonNullable<Freezer['state']>;
  found: StorePage;
  now: number;
  /** What stands below the ribbon. */
  children: ReactNode;
}

/** The two drawings that carry the proof; they come after the words, into a place kept for them. */
export function FreezerDrawings({ children }: Props) {
  return (
    <div className="mt-3 grid gap-x-6 gap-y-4 md:grid-cols-[minmax(200px,260px)_minmax(0,1fr)]">
      <Suspense fallback={<Skeleton className="h-72" />}>
        <FrontSection />
      </Suspense>
      <div className="min-w-0">
        <Suspense fallback={<Skeleton className="h-40" />}>
          <CoverRibbon />
        </Suspense>
        <div className="mt-4">{children}</div>
      </div>
    </div>
  );
}
