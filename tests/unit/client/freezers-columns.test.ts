import { expect, test } from 'vitest';
import { keptColumns } from '../../../src/features/freezers/use-columns';

const usual = ['level', 'air', 'likely', 'truck', 'state'];

test('the usual columns before a first choice', () => {
  expect(keptColumns(null)).toEqual(usual);
});

test('what was kept, in the order of the table', () => {
  expect(keptColumns('serial,level,truck')).toEqual(['level', 'truck', 'serial']);
});

test('a column that the table no longer has is left out', () => {
  expect(keptColumns('level,moon')).toEqual(['level']);
});

test('none at all may be wanted', () => {
  expect(keptColumns('')).toEqual([]);
});
