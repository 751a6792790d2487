import type { ComparedStore } from '../../../server/contract/comparison';

export const measures = ['outDays', 'warmHours', 'openRequests', 'solvedRequests', 'deliveries', 'lateDeliveries'] as const;
export type Measure = (typeof measures)[number];

export const columns = ['name', ...measures] as const;
export type Column = (typeof columns)[number];

export interface Sort {
  column: Column;
  order: 'ascending' | 'descending';
}

/** Names from A on, measures from the worst on. */
const firstOrder = (column: Column): Sort['order'] => (column === 'name' ? 'ascending' : 'descending');
const other = (order: Sort['order']): Sort['order'] => (order === 'ascending' ? 'descending' : 'ascending');

/** `outDays` in the URL is the usual order of that column, `-outDays` the other; anything unknown is what was out longest. */
export function sortOf(text: string | null): Sort {
  const turned = text?.startsWith('-') ?? false;
  const column = columns.find((known) => known === text?.replace(/^-/, ''));
  if (!column) return { column: 'outDays', order: 'descending' };
  return { column, order: turned ? other(firstOrder(column)) : firstOrder(column) };
}

/** What the URL says once a column was chosen: again the same turns it round. */
export function nextSort(now: Sort, column: Column): string {
  return now.column === column && now.order === firstOrder(column) ? `-${column}` : column;
}

/** Equals stand by name. */
export function sorted(stores: ComparedStore[], { column, order }: Sort, locale: string): ComparedStore[] {
  const sign = order === 'ascending' ? 1 : -1;
  const byName = (a: ComparedStore, b: ComparedStore) => a.name.localeCompare(b.name, locale);
  if (column === 'name') return stores.toSorted((a, b) => sign * byName(a, b));
  return stores.toSorted((a, b) => sign * (a[column] - b[column]) || byName(a, b));
}

/** The largest of the list, with which every bar is compared. */
export const worst = (stores: ComparedStore[], measure: Measure): number => Math.max(0, ...stores.map((store) => store[measure]));

export interface Leaders {
  stores: ComparedStore[];
  value: number;
}

/** Who leads a measure as it is shown, with a tenth; null where all have none. */
export function leadersOf(stores: ComparedStore[], measure: Measure): Leaders | null {
  const value = tenth(worst(stores, measure));
  return value > 0 ? { value, stores: stores.filter((store) => tenth(store[measure]) === value) } : null;
}

export const tenth = (value: number): number => Math.round(value * 10) / 10;
