import { dayOf, midnights } from './civil';
import { WARM_ABOVE_F } from './cooling';
import { SILENT_AFTER_MS } from './freshness';

/** What a local day of one freezer was like, in minutes. */
export interface FreezerDay {
  day: string;
  /** Some lane held no whole bag. */
  out: number;
  /** The air was above 32 °F, in two readings in a row. */
  warm: number;
  /** Of which anything is known: between readings no further apart than a silence. */
  known: number;
}

interface Heard {
  at: number;
  /** Pounds by lane. */
  pounds: number[];
}

interface Air {
  at: number;
  airF: number | null;
}

const MINUTE_MS = 60_000;
/** Longer than a state looks back; readings from before are days that were kept already. */
const LOOK_BACK_MS = 10 * 24 * 60 * MINUTE_MS;

/** What the readings say of each local day they touch, back to ten days before the last. Lists are in order of time; `bagPounds` follows the lanes. */
export function freezerDays(told: Heard[], airs: Air[], bagPounds: number[], timeZone: string): FreezerDay[] {
  const last = Math.max(told.at(-1)?.at ?? 0, airs.at(-1)?.at ?? 0);
  const first = Math.max(last - LOOK_BACK_MS, Math.min(told[0]?.at ?? Infinity, airs[0]?.at ?? Infinity));
  if (first >= last) return [];
  const starts = midnights(first, last, timeZone);
  const heard = airs.filter((air): air is Air & { airF: number } => air.airF !== null);
  const isOut = ({ pounds }: Heard) => pounds.some((left, lane) => left < (bagPounds[lane] ?? 0));
  const known = minutesByDay(told, starts, () => true);
  const out = minutesByDay(told, starts, isOut);
  const warm = minutesByDay(heard, starts, ({ airF }, next) => airF > WARM_ABOVE_F && next.airF > WARM_ABOVE_F);
  const days = starts.slice(0, -1).map((start, i) => ({ day: dayOf(start, timeZone), out: out[i] ?? 0, warm: warm[i] ?? 0, known: known[i] ?? 0 }));
  return days.filter((day) => day.known > 0 || day.warm > 0);
}

/** From each reading that counts to the next, shared among the days that the time touches. */
function minutesByDay<T extends { at: number }>(list: T[], starts: number[], counts: (one: T, next: T) => boolean): number[] {
  const days = starts.slice(1).map(() => 0);
  list.forEach((one, i) => {
    const next = list[i + 1];
    if (!next || next.at - one.at > SILENT_AFTER_MS || !counts(one, next)) return;
    for (let day = 0; day < days.length; day += 1) {
      const overlap = Math.min(next.at, starts[day + 1] ?? 0) - Math.max(one.at, starts[day] ?? 0);
      if (overlap > 0) days[day] = (days[day] ?? 0) + overlap / MINUTE_MS;
    }
  });
  return days;
}
