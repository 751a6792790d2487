// @vitest-environment happy-dom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen } from '@testing-library/react';
import i18next from 'i18next';
import type { ReactNode } from 'react';
import { initReactI18next } from 'react-i18next';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { afterEach, beforeAll, expect, test } from 'vitest';
import freezers from '../../../locales/en/freezers.json';
import storesList from '../../../locales/en/stores-list.json';
import type { Membership } from '../../../server/contract/auth';
import { api } from '../../../server/contract/index';
import { q } from '../../../src/api/query';
import { FleetFilters } from '../../../src/features/freezers/fleet-filters';
import { useColumns } from '../../../src/features/freezers/use-columns';
import { StoreFilters } from '../../../src/features/stores/store-filters';
import { meQuery } from '../../../src/lib/me';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', resources: { en: { freezers, 'stores-list': storesList } }, interpolation: { escapeValue: false } });
});
afterEach(cleanup);

const membership: Omit<Membership, 'role'> = {
  membershipId: 'm1',
  side: 'producer',
  storeIds: ['s1'],
  grants: [],
  abilities: [],
  producer: { slug: 'kestrel-bend', name: 'Kestrel Bend Ice', timeZone: 'America/Chicago', language: 'en', urgentPhone: '', logo: null, serviceHours: [], holidays: [] },
};

function drawFor(role: Membership['role'], page: ReactNode): string {
  const client = new QueryClient({ defaultOptions: { queries: { staleTime: Infinity } } });
  client.setQueryData(meQuery.queryKey, { person: { id: 'p1', name: 'Theo', email: 'theo@kestrelbend.example', language: 'en' }, memberships: [{ ...membership, role }] });
  client.setQueryData(q(api.people.places, { params: { producer: 'kestrel-bend' } }).queryKey, { districts: [], accounts: [] });
  const { container } = render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={['/kestrel-bend']}>
        <Routes>
          <Route path=":producer" element={page} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return container.textContent ?? '';
}

function Columns() {
  const { all, shown } = useColumns();
  return `${all.join(' ')} / ${shown.join(' ')}`;
}

test('a technician has no column of trucks, nor may choose one; a driver has', () => {
  expect(drawFor('technician', <Columns />)).toBe('level air likely state account asset serial heard / level air likely state');
  cleanup();
  expect(drawFor('driver', <Columns />)).toContain('truck');
});

test('a technician narrows the freezers to those that run out soon, not before a truck', () => {
  expect(drawFor('technician', <FleetFilters searchRef={null} />)).toContain('Runs out soon');
  expect(screen.queryByText(/truck/)).toBeNull();
  cleanup();
  expect(drawFor('driver', <FleetFilters searchRef={null} />)).toContain('Runs out before truck');
});

test('a technician does not narrow stores by their truck', () => {
  drawFor('technician', <StoreFilters />);
  expect(screen.queryByLabelText('Next truck')).toBeNull();
  cleanup();
  drawFor('driver', <StoreFilters />);
  expect(screen.getByLabelText('Next truck')).toBeTruthy();
});
