// @vitest-environment happy-dom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen } from '@testing-library/react';
import i18next from 'i18next';
import { Suspense } from 'react';
import { initReactI18next } from 'react-i18next';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { afterEach, beforeAll, expect, test } from 'vitest';
import freezers from '../../../locales/en/freezers.json';
import store from '../../../locales/en/store.json';
import type { Membership } from '../../../server/contract/auth';
import { fleetColumns, type FleetRow as Row } from '../../../server/contract/fleet';
import { FleetRow } from '../../../src/features/freezers/fleet-row';
import { meQuery } from '../../../src/lib/me';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', resources: { en: { freezers, store } }, interpolation: { escapeValue: false } });
});
afterEach(cleanup);

const hour = 3_600_000;
// Tuesday 1:10 pm in Chicago.
const now = Date.parse('2026-12-01T19:10:00Z');
const thursday = Date.parse('2026-12-03T15:40:00Z');

const row: Row = {
  id: 'f1',
  name: 'By the pumps',
  assetNumber: '40106',
  storeId: 's1',
  store: 'Juniper Fuel & Bait',
  city: 'Limestone',
  accountNumber: '1003',
  timeZone: 'America/Chicago',
  serial: 'NS-7',
  at: now - 10 * 60_000,
  pounds: 310.2,
  share: 0.4,
  lanes: [{ product: '7 lb', bags: 20, share: 0.68 }, { product: '20 lb', bags: 3, share: 0.1 }],
  airF: 18,
  warmSince: null,
  early: thursday - 40 * hour,
  likely: thursday - 10 * hour,
  late: thursday + 5 * hour,
  riskAt: thursday - 30 * hour,
  truck: { from: thursday, to: thursday + 1.5 * hour },
};

const membership: Membership = {
  membershipId: 'm1',
  role: 'dispatcher',
  side: 'producer',
  storeIds: [],
  grants: [],
  abilities: [],
  producer: { slug: 'kestrel-bend', name: 'Kestrel Bend Ice', timeZone: 'America/Chicago', language: 'en', urgentPhone: '', logo: null, serviceHours: [], holidays: [] },
};

/** The row's cells by their place: the name, then the columns in their order. */
function cells(change: Partial<Row>, role: Membership['role'] = 'dispatcher'): Record<string, string> {
  const client = new QueryClient({ defaultOptions: { queries: { staleTime: Infinity } } });
  client.setQueryData(meQuery.queryKey, { person: { id: 'p1', name: 'Wes', email: 'wes@kestrelbend.example', language: 'en' }, memberships: [{ ...membership, role }] });
  const open = { asked: null, shown: null, linkTo: (id: string) => `/kestrel-bend/freezers/${id}`, close: () => undefined };
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={['/kestrel-bend/freezers']}>
        <Suspense>
          <Routes>
            <Route
              path=":producer/freezers"
              element={
                <table>
                  <tbody>
                    <FleetRow row={{ ...row, ...change }} columns={[...fleetColumns]} open={open} now={now} />
                  </tbody>
                </table>
              }
            />
          </Routes>
        </Suspense>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  const texts = screen.getAllByRole('cell').map((cell) => (cell.textContent ?? '').replace(/\s/g, ' '));
  return Object.fromEntries(fleetColumns.map((column, i) => [column, texts[i] ?? '']));
}

test('a freezer that runs out the night before its truck', () => {
  const said = cells({});
  expect(screen.getByRole('link').textContent).toBe('Juniper Fuel & Bait, By the pumps');
  expect(screen.getByRole('img', { name: '7 lb: 68% full and 20 lb: 10% full' })).toBeTruthy();
  expect(said.level).toContain('310 lb');
  expect(said.likely).toContain('tomorrow night');
  expect(said.truck).toContain('Thu 9:40–11:10');
  expect(said.state).toBe('10 h before truck');
});

test('a store by another clock: the producer’s time, and the store’s with its zone', () => {
  const { truck } = cells({ timeZone: 'America/Denver' });
  expect(truck).toContain('Thu 9:40–11:10');
  expect(truck).toContain('Thu 8:40–10:10, Mountain Time');
});

test('nothing is said of now from a level older than a day', () => {
  const said = cells({ at: now - 26 * hour, warmSince: now - 30 * hour });
  for (const column of ['level', 'air', 'likely']) expect([column, said[column]]).toEqual([column, expect.stringContaining('Not known')]);
  expect(said.level).not.toContain('lb');
  expect(said.state).toBe('silent 26 h');
  expect(said.heard).toContain('26 hours ago');
});

test('an old level says how old it is', () => {
  expect(cells({ at: now - 3 * hour }).level).toContain('3 h old');
});

test('a truck past its window is said to have been due', () => {
  const said = cells({ truck: { from: now - 3 * hour, to: now - hour }, likely: now + 20 * hour });
  expect(said.truck).toContain('Was due Tue 10:10–12:10');
  expect(said.state).toBe('runs out soon, no truck');
});

test('who may not read of trucks is not told that there is none', () => {
  expect(cells({ truck: null, riskAt: null, likely: now + 20 * hour }, 'technician').state).toBe('runs out soon');
});
