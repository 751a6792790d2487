import { describe, expect, test } from 'vitest';
import type { Membership } from '../../../server/contract/auth';
import type { Role } from '../../../server/contract/words';
import { landingOf } from '../../../src/layouts/landing';

const member = (role: Role, storeIds: string[] = []): Membership => ({
  membershipId: 'm',
  role,
  side: role === 'store-manager' ? 'store' : 'producer',
  storeIds,
  grants: [],
  abilities: [],
  producer: { slug: 'kestrel-bend', name: 'Kestrel Bend Ice', timeZone: 'America/Chicago', language: 'en', urgentPhone: '555-0100', logo: null, serviceHours: [], holidays: [] },
});

describe('every role lands on its most useful page', () => {
  test.each<[Role, string[], string]>([
    ['store-manager', ['s1'], '/kestrel-bend/stores/s1'],
    ['store-manager', ['s1', 's2'], '/kestrel-bend/stores'],
    ['store-manager', [], '/kestrel-bend/stores'],
    ['district-rep', ['s1'], '/kestrel-bend/stores'],
    ['support-agent', [], '/kestrel-bend/requests'],
    ['dispatcher', [], '/kestrel-bend/freezers'],
    ['driver', ['s1'], '/kestrel-bend/stores?truck=today'],
    ['technician', ['s1'], '/kestrel-bend/requests?assignee=me'],
    ['producer-admin', [], '/kestrel-bend/freezers'],
  ])('%s with %j', (role, storeIds, path) => {
    expect(landingOf(member(role, storeIds))).toBe(path);
  });
});
