import { lazy, Suspense, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { CoverRibbonSkeleton } from '../../freezer/cover-ribbon-skeleton';
import { Skeleton } from '../../ui/skeleton';
import { FreezerSection } from './freezer-section';
import { ribbonOf } from './ribbon-of';
import { useKnown } from './store-known';
import { useStoreWords } from './use-store-words';

// The charts come after the page.
const CoverRibbon = lazy(() => import('../../freezer/cover-ribbon'));

interface Props {
  freezer: Freezer;
  state: NonNullable<Freezer['state']>;
  found: StorePage;
  now: number;
  /** What stands below the ribbon. */
  children: ReactNode;
}

/** The two drawings that carry the proof, in places kept for them. */
export function FreezerDrawings({ children, ...drawn }: Props) {
  return (
    <div className="mt-3 grid gap-x-6 gap-y-4 md:grid-cols-[minmax(200px,260px)_minmax(0,1fr)]">
      <Suspense fallback={<Skeleton className="h-88" />}>
        <FreezerSection freezer={drawn.freezer} state={drawn.state} zone={drawn.found.store.timeZone} now={drawn.now} />
      </Suspense>
      <div className="min-w-0">
        <Suspense fallback={<CoverRibbonSkeleton />}>
          <Ribbon {...drawn} />
        </Suspense>
        <div className="mt-4">{children}</div>
      </div>
    </div>
  );
}

type Drawn = Omit<Props, 'children'>;

function Ribbon({ freezer, state, found, now }: Drawn) {
  const { t } = useTranslation('store');
  const say = useStoreWords(found.store.timeZone, now);
  const known = useKnown(found);
  const { truck, ...ribbon } = ribbonOf(freezer, state, found, known, now);
  const drawn = truck && { from: truck.from, to: truck.to, label: t('freezer.truck', { day: say.shortDay(truck.from) }) };
  return (
    <CoverRibbon
      {...ribbon}
      truck={known.nextTruck === undefined ? undefined : drawn}
      locale={say.locale}
      title={t('freezer.drawing', { freezer: freezer.name })}
    />
  );
}
