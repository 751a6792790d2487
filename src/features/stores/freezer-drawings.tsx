import { lazy, Suspense, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { freshnessOf } from '../../../server/domain/freshness';
import { usableStackIn } from '../../../server/domain/level';
import { CoverRibbonSkeleton } from '../../freezer/cover-ribbon-skeleton';
import { FrontSection } from '../../freezer/front-section';
import { Skeleton } from '../../ui/skeleton';
import { isLow } from './lane-low';
import { ribbonOf } from './ribbon-of';
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
        <Section {...drawn} />
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

function Section({ freezer, state, found, now }: Drawn) {
  const say = useStoreWords(found.store.timeZone, now);
  const { model, mount, sensor } = freezer;
  const probesIn = sensor?.probesIn ?? [];
  const usable = usableStackIn({ model, mount: { ...mount, probesIn } });
  const lanes = state.level.lanes.map((level, i) => {
    const lane = freezer.lanes[i];
    const { bags, about, stackIn } = level;
    const bagPounds = lane?.bagPounds ?? 0;
    return { widthShare: lane?.widthShare ?? 0, label: say.pounds(bagPounds), bags, about, stackIn, usableStackIn: usable, bagPounds, low: isLow(level) };
  });
  return (
    <FrontSection
      widthIn={model.insideWidthIn}
      heightIn={model.insideHeightIn}
      channelDropIn={mount.channelDropIn}
      rackIn={mount.rackIn}
      probes={probesIn.map((xIn, i) => ({ xIn, distanceIn: state.distancesIn[i] ?? null }))}
      lanes={lanes}
      airText={state.airF === null ? '' : say.degrees(state.airF)}
      asOf={freshnessOf(state.at, now) === 'fresh' ? undefined : say.when(state.at)}
    />
  );
}

function Ribbon({ freezer, state, found, now }: Drawn) {
  const { t } = useTranslation('store');
  const say = useStoreWords(found.store.timeZone, now);
  const { truck, ...ribbon } = ribbonOf(freezer, state, found, now);
  return (
    <CoverRibbon
      {...ribbon}
      truck={truck && { from: truck.from, to: truck.to, label: t('freezer.truck', { day: say.shortDay(truck.from) }) }}
      locale={say.locale}
      title={t('freezer.drawing', { freezer: freezer.name })}
    />
  );
}
