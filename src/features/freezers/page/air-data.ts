import { addDays, dayOf, instantOf, startOfDay } from '../../../../server/domain/civil';
import { SILENT_AFTER_MS } from '../../../../server/domain/freshness';

/** Instant and °F, oldest first. */
export type Air = readonly (readonly [number, number])[];

export interface AirDay {
  middle: number;
  low: number;
  high: number;
}

/** The coldest and the warmest of each local day with a reading. */
export function airDays(air: Air, zone: string): AirDay[] {
  const days = new Map<string, AirDay>();
  for (const [at, degrees] of air) {
    const day = dayOf(at, zone);
    const { low, high } = days.get(day) ?? { low: degrees, high: degrees };
    days.set(day, { middle: instantOf(day, '12:00', zone), low: Math.min(low, degrees), high: Math.max(high, degrees) });
  }
  return [...days.values()];
}

/** The points of the line; it breaks where the thermometer was silent. */
export const airRows = (air: Air): { at: number; degrees: number | null }[] =>
  air.flatMap(([at, degrees], i) => {
    const before = air[i - 1]?.[0] ?? at;
    return [...(at - before > SILENT_AFTER_MS ? [{ at: before + 1, degrees: null }] : []), { at, degrees }];
  });

/** Whole local days, from the first reading to today. */
export function airSpan(air: Air, now: number, zone: string): { from: number; to: number; middles: number[] } {
  const first = dayOf(air[0]?.[0] ?? now, zone);
  const after = addDays(dayOf(now, zone), 1);
  const middles: number[] = [];
  for (let day = first; day < after; day = addDays(day, 1)) middles.push(instantOf(day, '12:00', zone));
  return { from: startOfDay(first, zone), to: startOfDay(after, zone), middles };
}

const step = 10;

/** The degrees beside the line: round ones around all readings, with the melting mark always in sight. */
export function airTicks(air: Air, mark: number): number[] {
  const degrees = [mark, ...air.map(([, value]) => value)];
  const low = Math.floor((Math.min(...degrees) - 1) / step);
  const high = Math.ceil((Math.max(...degrees) + 4) / step);
  return Array.from({ length: high - low + 1 }, (_, i) => (low + i) * step);
}
