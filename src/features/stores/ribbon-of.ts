import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { truckToCome, type StoreNow } from '../../../server/domain/answers';
import { addDays, dayOf, startOfDay } from '../../../server/domain/civil';
import { emptyBeforeTruck, forecastCurve, shareLoad } from '../../../server/domain/forecast';
import { freshnessOf } from '../../../server/domain/freshness';
import type { RibbonData } from '../../freezer/ribbon-data';

const hour = 3_600_000;
const stepMs = 3 * hour;
const daysAhead = 5;

type State = NonNullable<Freezer['state']>;
type Truck = NonNullable<StorePage['nextTruck']>;

/** What the ribbon of one freezer is drawn from; nothing is foretold from a level too old to believe. */
export function ribbonOf(freezer: Freezer, state: State, found: StorePage, known: StoreNow, now: number): Omit<RibbonData, 'truck'> & { truck: Truck | null } {
  const zone = found.store.timeZone;
  const believed = freshnessOf(state.at, now) !== 'unusable';
  const coming = truckToCome(known) && found.nextTruck;
  const truck = coming && coming.to >= now ? coming : null;
  return {
    now,
    timeZone: zone,
    history: state.history,
    forecast: believed ? foretold(freezer, state, found, truck, now) : [],
    deliveries: state.deliveries.map(({ at, pounds }) => ({ at, pounds: pounds.reduce((sum, lane) => sum + lane, 0) })),
    truck,
    empty: believed && truck ? emptyBeforeTruck(state.laneRunOuts, truck.to, now) : null,
  };
}

function foretold(freezer: Freezer, state: State, { freezers, store }: StorePage, truck: Truck | null, now: number) {
  return forecastCurve({
    at: state.at,
    lanes: state.level.lanes,
    rates: state.rates,
    truck: truck && { at: truck.to, pounds: broughtTo(freezer, freezers, truck) },
    from: now,
    to: startOfDay(addDays(dayOf(now, store.timeZone), daysAhead + 1), store.timeZone),
    stepMs,
  });
}

/** Pounds the truck brings to each lane of the freezer, by the room that all lanes of the store will have then. */
function broughtTo(freezer: Freezer, freezers: Freezer[], truck: Truck): number[] {
  const lanes = freezers.flatMap((one) => one.lanes.map((_, i) => ({ of: one.id, ...laneAt(one, i, truck.to) })));
  const pounds = shareLoad(lanes, truck.load);
  return pounds.filter((_, i) => lanes[i]?.of === freezer.id);
}

/** A lane as it will likely be; one that nobody sees into is taken for half full. */
function laneAt({ lanes, model, state }: Freezer, i: number, at: number) {
  const level = state?.level.lanes[i];
  const capacityPounds = level?.capacityPounds ?? model.ratedPounds * (lanes[i]?.widthShare ?? 0);
  const sold = state ? ((state.rates[i]?.poundsPerDay ?? 0) * (at - state.at)) / (24 * hour) : 0;
  return { productId: lanes[i]?.productId ?? '', capacityPounds, pounds: level ? Math.max(0, level.pounds - sold) : capacityPounds / 2 };
}
