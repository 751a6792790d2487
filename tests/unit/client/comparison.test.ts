import { describe, expect, test } from 'vitest';
import type { ComparedStore } from '../../../server/contract/comparison';
import { leadersOf, nextSort, sorted, sortOf, worst } from '../../../src/features/comparison/measures';

const compared = (name: string, measured: Partial<ComparedStore> = {}): ComparedStore => ({
  id: name,
  name,
  city: 'Alder',
  account: 'Alder Stores',
  outDays: 0,
  warmHours: 0,
  known: 1,
  openRequests: 0,
  solvedRequests: 0,
  deliveries: 0,
  lateDeliveries: 0,
  ...measured,
});
const names = (stores: ComparedStore[]) => stores.map(({ name }) => name);

const stores = [
  compared('Campo Verde', { outDays: 0.5, lateDeliveries: 2 }),
  compared('Ánfora', { outDays: 1.5 }),
  compared('Birch', { outDays: 0.5, lateDeliveries: 2 }),
];

describe('sorting', () => {
  test('what was out longest comes first unless the URL says otherwise', () => {
    expect(sortOf(null)).toEqual({ column: 'outDays', order: 'descending' });
    expect(sortOf('no such column')).toEqual(sortOf(null));
    expect(names(sorted(stores, sortOf(null), 'en'))).toEqual(['Ánfora', 'Birch', 'Campo Verde']);
  });

  test('the other way round, equals still by name', () => {
    expect(names(sorted(stores, sortOf('-outDays'), 'en'))).toEqual(['Birch', 'Campo Verde', 'Ánfora']);
  });

  test('names in the order of the language', () => {
    expect(names(sorted(stores, sortOf('name'), 'es'))).toEqual(['Ánfora', 'Birch', 'Campo Verde']);
    expect(names(sorted(stores, sortOf('-name'), 'es'))).toEqual(['Campo Verde', 'Birch', 'Ánfora']);
  });

  test('choosing the same column again turns it round, and back', () => {
    expect(nextSort(sortOf('warmHours'), 'warmHours')).toBe('-warmHours');
    expect(nextSort(sortOf('-warmHours'), 'warmHours')).toBe('warmHours');
    expect(nextSort(sortOf('-warmHours'), 'name')).toBe('name');
    expect(nextSort(sortOf('name'), 'name')).toBe('-name');
  });

  test('the list itself is left as it was', () => {
    sorted(stores, sortOf('name'), 'en');
    expect(names(stores)).toEqual(['Campo Verde', 'Ánfora', 'Birch']);
  });
});

describe('leaders', () => {
  test('one, or all that share the place', () => {
    expect(leadersOf(stores, 'outDays')).toEqual({ value: 1.5, stores: [stores[1]] });
    expect(names(leadersOf(stores, 'lateDeliveries')?.stores ?? [])).toEqual(['Campo Verde', 'Birch']);
  });

  test('what looks the same shares the place', () => {
    const close = [compared('A', { warmHours: 2.04 }), compared('B', { warmHours: 1.96 })];
    expect(leadersOf(close, 'warmHours')).toEqual({ value: 2, stores: close });
  });

  test('nobody where all is well', () => {
    expect(leadersOf(stores, 'warmHours')).toBeNull();
    expect(leadersOf([compared('A', { warmHours: 0.04 })], 'warmHours')).toBeNull();
    expect(leadersOf([], 'outDays')).toBeNull();
  });

  test('the worst of nothing is nothing', () => expect(worst([], 'deliveries')).toBe(0));
});
