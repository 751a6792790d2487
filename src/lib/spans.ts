import type { Language, Span, Weekday } from '../../server/contract/words';
import { formatIn, type Format } from './format';

/** Hours on some days of the week in words: "Mon–Fri 7:00 am–5:00 pm; Sat 8:00 am–12:00 pm". */
export function spansText(spans: Span[], locale: Language): string {
  // Local times of day are read off clocks, whatever the zone.
  const format = formatIn({ locale, timeZone: 'UTC' });
  return spans.map(({ days, from, to }) => `${daysText(days, format)} ${format.time(clock(from))}–${format.time(clock(to))}`).join('; ');
}

const clock = (timeOfDay: string): number => Date.parse(`1970-01-01T${timeOfDay}:00Z`);

/** Three days and more in a row become first to last. */
function daysText(days: Weekday[], format: Format): string {
  const name = (day: Weekday) => format.weekdayName(day, 'short');
  return format.list(
    rowsOf(days).flatMap((row) => {
      const [first] = row;
      const last = row.at(-1);
      return row.length > 2 && first && last ? [`${name(first)}–${name(last)}`] : row.map(name);
    }),
  );
}

function rowsOf(days: Weekday[]): Weekday[][] {
  const rows: Weekday[][] = [];
  for (const day of [...new Set(days)].toSorted((a, b) => a - b)) {
    const row = rows.at(-1);
    if (row?.at(-1) === day - 1) row.push(day);
    else rows.push([day]);
  }
  return rows;
}
