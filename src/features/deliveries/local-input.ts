import { dayOf, instantOf } from '../../../server/domain/civil';

const clocks = new Map<string, Intl.DateTimeFormat>();

/** `HH:MM` of an instant in a time zone, as an input of time takes it. */
export function timeOfDayIn(at: number, zone: string): string {
  const clock = clocks.get(zone) ?? new Intl.DateTimeFormat('en-GB', { timeZone: zone, hour: '2-digit', minute: '2-digit' });
  clocks.set(zone, clock);
  return clock.format(at);
}

/** `YYYY-MM-DDTHH:MM` in a time zone, as an input of day and time takes it. */
export const localInputOf = (at: number, zone: string): string => `${dayOf(at, zone)}T${timeOfDayIn(at, zone)}`;

/** The instant an input of day and time means in a time zone; NaN while it is not filled in. */
export function instantOfInput(value: string, zone: string): number {
  const [day, time] = value.split('T');
  return day && time ? instantOf(day, time.slice(0, 5), zone) : NaN;
}
