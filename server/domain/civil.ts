const formats = new Map<string, Intl.DateTimeFormat>();
const formatOf = (zone: string) => {
  const known = formats.get(zone) ?? new Intl.DateTimeFormat('en-US', { timeZone: zone, hourCycle: 'h23', year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit', second: '2-digit' });
  formats.set(zone, known);
  return known;
};
const partsOf = (at: number, zone: string) => Object.fromEntries(formatOf(zone).formatToParts(at).map(({ type, value }) => [type, value]));
export const dayOf = (at: number, zone: string): string => { const p = partsOf(at, zone); return `${p.year}-${p.month}-${p.day}`; };
export const instantOf = (day: string, time: string, zone: string): number => {
  const guess = Date.parse(`${day}T${time}:00Z`);
  const offset = (at: number) => { const p = partsOf(at, zone); return Date.parse(`${p.year}-${p.month}-${p.day}T${p.hour}:${p.minute}:${p.second}Z`) - at; };
  const first = guess - offset(guess);
  return guess - offset(first);
};
export const startOfDay = (day: string, zone: string): number => instantOf(day, '00:00', zone);
export const addDays = (day: string, n: number): string => new Date(Date.parse(`${day}T12:00:00Z`) + n * 86_400_000).toISOString().slice(0, 10);
