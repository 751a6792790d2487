/** Civil time on Intl alone, since pages carry it. Days are `YYYY-MM-DD`, instants milliseconds since 1970 UTC. */
const HOUR_MS = 3_600_000;
const DAY_MS = 24 * HOUR_MS;

const formats = new Map<string, Intl.DateTimeFormat>();
function formatOf(timeZone: string): Intl.DateTimeFormat {
  const known = formats.get(timeZone);
  if (known) return known;
  const made = new Intl.DateTimeFormat('en-US', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
  });
  formats.set(timeZone, made);
  return made;
}

/** Clocks change at whole quarters of an hour only, so an offset holds for its quarter. Asking Intl costs some 10 µs. */
const QUARTER_MS = HOUR_MS / 4;
const MOST_KNOWN = 4096;
const offsets = new Map<string, Map<number, number>>();

/** How far local time is ahead of UTC at an instant. */
function offsetAt(instant: number, timeZone: string): number {
  const known = offsets.get(timeZone) ?? new Map<number, number>();
  if (known.size === 0) offsets.set(timeZone, known);
  if (known.size >= MOST_KNOWN) known.clear();
  const quarter = Math.floor(instant / QUARTER_MS);
  const offset = known.get(quarter) ?? offsetFromIntl(quarter * QUARTER_MS, timeZone);
  known.set(quarter, offset);
  return offset;
}

function offsetFromIntl(instant: number, timeZone: string): number {
  const parts: Record<string, number> = {};
  for (const { type, value } of formatOf(timeZone).formatToParts(instant)) parts[type] = Number(value);
  const { year = 0, month = 1, day = 1, hour = 0, minute = 0, second = 0 } = parts;
  return Date.UTC(year, month - 1, day, hour, minute, second) - instant;
}

/** The local calendar day of an instant. */
export const dayOf = (instant: number, timeZone: string): string =>
  new Date(instant + offsetAt(instant, timeZone)).toISOString().slice(0, 10);

/** The local hour of an instant with its fraction, 0 to 24. */
export const hourOf = (instant: number, timeZone: string): number => {
  const local = instant + offsetAt(instant, timeZone);
  return (((local % DAY_MS) + DAY_MS) % DAY_MS) / HOUR_MS;
};

/** `YYYY-MM-DD HH:MM` by local clocks. */
export const localMinute = (instant: number, timeZone: string): string =>
  new Date(instant + offsetAt(instant, timeZone)).toISOString().slice(0, 16).replace('T', ' ');

/**
 * The instant at which clocks of the zone show `day` and `HH:MM`. An hour that comes twice means its first time; one
 * that is skipped means as long after midnight as if it were not, as RFC 5545 section 3.3.5 reads such times.
 */
export function instantOf(day: string, timeOfDay: string, timeZone: string): number {
  const local = Date.parse(`${day}T${timeOfDay}:00Z`);
  const before = offsetAt(local - DAY_MS, timeZone);
  const after = offsetAt(local + DAY_MS, timeZone);
  const candidates = [local - before, local - after].filter((instant) => instant + offsetAt(instant, timeZone) === local);
  return candidates.length > 0 ? Math.min(...candidates) : local - before;
}

export const startOfDay = (day: string, timeZone: string): number => instantOf(day, '00:00', timeZone);

export const addDays = (day: string, days: number): string =>
  new Date(Date.parse(`${day}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);

/** ISO 8601: Monday is 1. */
export const weekdayOf = (day: string): number => new Date(`${day}T00:00:00Z`).getUTCDay() || 7;

/** The midnights from the day of `from` up to and with the one after the day of `to`. */
export function midnights(from: number, to: number, timeZone: string): number[] {
  const starts: number[] = [];
  for (let day = dayOf(from, timeZone); ; day = addDays(day, 1)) {
    const start = startOfDay(day, timeZone);
    starts.push(start);
    if (start > to) return starts;
  }
}
