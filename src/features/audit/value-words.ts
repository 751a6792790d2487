import type { Subject } from '../../../server/contract/ability';
import type { Format } from '../../lib/format';

/** Where the values of a field have words of their own, as `<noun>:<key>`; null where they say themselves. */
export const wordsOf = (subject: Subject, field: string): string | null => lists[`${subject}.${field}`] ?? lists[field] ?? null;

const lists: Partial<Record<string, string>> = {
  'Request.kind': 'requests:kinds',
  'Store.kind': 'store-form:kinds',
  'Person.kind': 'audit:scopes',
  state: 'requests:states',
  role: 'common:roles',
  language: 'common:language',
  grants: 'people:grants',
  placement: 'freezer-form:placements',
  defrost: 'catalog:models.defrosts',
};

/** The nouns whose words a change may need. */
export const changeNouns = ['audit', 'requests', 'common', 'store-form', 'people', 'freezer-form', 'catalog'];

/** They may speak of people: the trail says only that they changed. */
export const untold = ['contacts', 'driverNotes'];

/** A number as its field means it. */
export function numberWords(field: string, value: number, format: Format): string {
  if (field.endsWith('In')) return format.inches(value);
  if (degrees.includes(field)) return String(value);
  if (shares.includes(field)) return format.percent(value);
  if (pounds.includes(field)) return format.bagPounds(value);
  const weekday = weekdays.includes(field) && week.find((day) => day === value);
  if (weekday) return format.weekdayName(weekday, 'short');
  return value >= EARLIEST ? `${format.longDate(value)}, ${format.time(value)}` : format.tenths(value);
}

const degrees = ['latitude', 'longitude'];
const shares = ['riskLimit', 'widthShare'];
const pounds = ['bagPounds', 'ratedPounds'];
const weekdays = ['days', 'deliveryDays'];
const week = [1, 2, 3, 4, 5, 6, 7] as const;
/** The start of 2001: whatever is counted stays far below it, every instant of the trail lies above. */
const EARLIEST = 978_307_200_000;
