import type { DailyRate } from './sales';
import type { RunOut } from './types';

const DAY_MS = 86_400_000;
const Z90 = 1.281552;

/** Shares of full at 10, 50 and 90 % of what may be left. */
export interface ForecastPoint {
  at: number;
  low: number;
  likely: number;
  high: number;
}

export interface ForecastInput {
  /** As known at `at`. */
  at: number;
  lanes: { pounds: number; capacityPounds: number }[];
  rates: DailyRate[];
  /** The truck and the pounds it brings to each lane; the forecast starts again from there. */
  truck: { at: number; pounds: number[] } | null;
  from: number;
  to: number;
  stepMs: number;
}

/** The likely line and its band for the ribbon, with the truck's step; empty when no lane has shown a whole day. */
export function forecastCurve({ at, lanes, rates, truck, from, to, stepMs }: ForecastInput): ForecastPoint[] {
  if (rates.every(({ days }) => days === 0)) return [];
  const capacity = lanes.reduce((total, lane) => total + lane.capacityPounds, 0);
  if (!(capacity > 0)) return [];
  const upTo = !truck || truck.at <= at || truck.at >= to ? to : truck.at;
  const before = curveOf(lanes, rates, capacity, at, times(from, upTo, stepMs));
  if (!truck || upTo === to) return before;
  const days = (truck.at - at) / DAY_MS;
  const refilled = lanes.map((lane, i) => {
    const left = Math.max(0, lane.pounds - (rates[i]?.poundsPerDay ?? 0) * days);
    return { ...lane, pounds: Math.min(lane.capacityPounds, left + (truck.pounds[i] ?? 0)) };
  });
  return [...before, ...curveOf(refilled, rates, capacity, truck.at, times(truck.at, to, stepMs))];
}

/** What is left never rises by itself, so neither does a bound of it. */
function curveOf(lanes: ForecastInput['lanes'], rates: DailyRate[], capacity: number, since: number, instants: number[]): ForecastPoint[] {
  let ceiling = 1;
  return instants.map((at) => {
    const point = pointAt(lanes, rates, capacity, (at - since) / DAY_MS);
    ceiling = Math.min(ceiling, point.high);
    return { ...point, at, high: ceiling };
  });
}

/** Each lane's own 10, 50 and 90 %, summed. */
function pointAt(lanes: ForecastInput['lanes'], rates: DailyRate[], capacity: number, days: number): Omit<ForecastPoint, 'at'> {
  const share = (odds: number) =>
    lanes.reduce((total, { pounds }, i) => {
      const { poundsPerDay = 0, sdPounds = 0, days: seen = 0 } = rates[i] ?? {};
      const sd = Math.sqrt(sdPounds ** 2 * (days + (seen > 0 ? days ** 2 / seen : 0)));
      return total + Math.min(capacity, Math.max(0, pounds - poundsPerDay * days + odds * Z90 * sd));
    }, 0) / capacity;
  return { low: share(-1), likely: share(0), high: Math.min(1, share(1)) };
}

/** From `from` by steps, with `to` itself at the end. */
function times(from: number, to: number, stepMs: number): number[] {
  const count = Math.max(0, Math.ceil((to - from) / stepMs));
  return [...Array.from({ length: count }, (_, i) => from + i * stepMs), to];
}

/** The stretch in which a lane is likely empty before the truck comes; null when the truck is first or unknown. */
export function emptyBeforeTruck(runOuts: RunOut[], truckAt: number | null, now: number): { from: number; to: number } | null {
  const times = runOuts.flatMap(({ likely }) => (likely === null ? [] : [likely]));
  const first = Math.max(now, Math.min(...times));
  return truckAt !== null && times.length > 0 && first < truckAt ? { from: first, to: truckAt } : null;
}

/**
 * Shares a truck's load among the lanes of a store's freezers: each product to the lanes that hold it, by their room
 * then. `lanes` are all lanes of the store; answers pounds for each.
 */
export function shareLoad(
  lanes: { productId: string; pounds: number; capacityPounds: number }[],
  load: { productId: string; bagPounds: number; bags: number }[],
): number[] {
  return lanes.map((lane) => {
    const brought = load.filter(({ productId }) => productId === lane.productId).reduce((total, { bags, bagPounds }) => total + bags * bagPounds, 0);
    const same = lanes.filter(({ productId }) => productId === lane.productId);
    const room = same.reduce((total, one) => total + roomOf(one), 0);
    return room > 0 ? (brought * roomOf(lane)) / room : brought / same.length;
  });
}

const roomOf = ({ pounds, capacityPounds }: { pounds: number; capacityPounds: number }): number => Math.max(0, capacityPounds - pounds);
