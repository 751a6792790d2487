import { expect, test } from 'vitest';
import { digestQuery, fleetQuery, listQuery } from '../../../src/features/freezers/fleet-query';

const district = '01a23248-5168-71ea-8c1d-59a1512ef1e9';

test('what the URL says about looking is no filter', () => {
  expect(fleetQuery(new URLSearchParams(`q=lantern&show=warm&view=map&open=${district}`))).toEqual({ q: 'lantern', show: 'warm' });
});

test('a filter the contract does not know is left out, the others stay', () => {
  expect(fleetQuery(new URLSearchParams(`show=cold&district=${district}&account=7&q=`))).toEqual({ district });
});

test('the list has its page, and the digest counts all of the selection', () => {
  const search = new URLSearchParams('q=pine&show=silent&after=abc');
  expect(listQuery(search)).toEqual({ q: 'pine', show: 'silent', after: 'abc', limit: '50' });
  expect(digestQuery(search)).toEqual({ q: 'pine' });
});
