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
  const before = (instant: number) => pointAt(lanes, rates, capacity, (instant - at) / DAY_MS, instant);
  if (!truck || truck.at <= at || truck.at >= to) return times(from, to, stepMs).map(before);
  const days = (truck.at - at) / DAY_MS;
  const refilled = lanes.map((lane, i) => {
    const left = Math.max(0, lane.pounds - (rates[i]?.poundsPerDay ?? 0) * days);
    return { ...lane, pounds: Math.min(lane.capacityPounds, left + (truck.pounds[i] ?? 0)) };
  });
  const after = (instant: number) => pointAt(refilled, rates, capacity, (instant - truck.at) / DAY_MS, instant);
  return [...times(from, truck.at, stepMs).map(before), ...times(truck.at, to, stepMs).map(after)];
}

function pointAt(lanes: ForecastInput['lanes'], rates: DailyRate[], capacity: number, days: number, at: number): ForecastPoint {
  const left = lanes.reduce((total, { pounds }, i) => total + Math.max(0, pounds - (rates[i]?.poundsPerDay ?? 0) * days), 0);
  const variance = rates.reduce((total, { sdPounds, days: seen }) => total + sdPounds ** 2 * (days + (seen > 0 ? days ** 2 / seen : 0)), 0);
  const width = Z90 * Math.sqrt(Math.max(0, variance));
  const share = (pounds: number) => Math.min(1, Math.max(0, pounds / capacity));
  return { at, low: share(left - width), likely: share(left), high: share(left + width) };
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
