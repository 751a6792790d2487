import { expect, test } from 'vitest';
import { roles } from '../../../server/contract/words';
import { grantedTo, grantsOf } from '../../../src/features/people/grants';

test('stores’ managers may pay, district reps may read, nobody else is offered anything', () => {
  expect(roles.map((role) => [role, grantsOf(role)]).filter(([, offered]) => offered?.length)).toEqual([
    ['store-manager', ['pay-invoices']],
    ['district-rep', ['read-invoices']],
  ]);
  expect(grantsOf(undefined)).toEqual([]);
});

test('what was ticked for another role stays behind', () => {
  expect(grantedTo('district-rep', ['pay-invoices', 'read-invoices'])).toEqual(['read-invoices']);
  expect(grantedTo('driver', ['pay-invoices'])).toEqual([]);
});
