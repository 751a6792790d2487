// @vitest-environment happy-dom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import i18next from 'i18next';
import { useState } from 'react';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, beforeEach, expect, test, vi } from 'vitest';
import en from '../../../locales/en/map.json';
import { PickedPlace } from '../../../src/map/picked-place';
import type { Place } from '../../../src/map/view';

const size = { width: 640, height: 480 };
const marlow = { latitude: 36.42, longitude: -93.1 };

beforeAll(() => i18next.use(initReactI18next).init({ lng: 'en', resources: { en: { map: en } }, interpolation: { escapeValue: false } }));
beforeEach(() => {
  vi.stubGlobal('fetch', () => Promise.reject(new Error('no land here')));
  vi.stubGlobal(
    'ResizeObserver',
    class {
      constructor(private readonly seen: (entries: { contentRect: { width: number } }[]) => void) {}
      observe = () => this.seen([{ contentRect: size }]);
      disconnect = () => undefined;
    },
  );
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function Form({ first, around }: { first: Place | null; around?: Place[] }) {
  const [place, setPlace] = useState(first);
  return (
    <PickedPlace
      latitude={place?.latitude ?? null}
      longitude={place?.longitude ?? null}
      around={around}
      label="Place of the store"
      onPick={(latitude, longitude) => setPlace({ latitude, longitude })}
    />
  );
}

const open = (first: Place | null, around?: Place[]) => {
  render(<QueryClientProvider client={new QueryClient({ defaultOptions: { queries: { retry: false } } })}><Form first={first} around={around} /></QueryClientProvider>);
  return screen.getByRole('application', { name: 'Place of the store' });
};
const at = (): Place => {
  const [latitude, longitude] = [...(screen.getByRole('status').textContent ?? '').matchAll(/-?\d+\.\d{4}/g)].map(Number);
  return { latitude: latitude ?? NaN, longitude: longitude ?? NaN };
};

test('arrow keys move the mark a little, with Shift farther, each in its direction', () => {
  const map = open(marlow);
  fireEvent.keyDown(map, { key: 'ArrowRight' });
  const fine = at().longitude - marlow.longitude;
  expect(fine).toBeGreaterThan(0);
  expect(at().latitude).toBe(marlow.latitude);
  fireEvent.keyDown(map, { key: 'ArrowLeft', shiftKey: true });
  expect(at().longitude - marlow.longitude).toBeLessThan(-5 * fine);
  fireEvent.keyDown(map, { key: 'ArrowUp' });
  expect(at().latitude).toBeGreaterThan(marlow.latitude);
});

test('nearer, the same key moves it less', () => {
  const map = open(marlow);
  fireEvent.keyDown(map, { key: 'ArrowUp', shiftKey: true });
  const before = at().latitude - marlow.latitude;
  for (let i = 0; i < 3; i++) fireEvent.keyDown(map, { key: '+' });
  const from = at().latitude;
  fireEvent.keyDown(map, { key: 'ArrowUp', shiftKey: true });
  expect(at().latitude - from).toBeCloseTo(before / 8, 3);
});

test('without a place it says so, and the first key marks the middle of the neighbours', () => {
  const map = open(null, [marlow]);
  expect(screen.getByRole('status').textContent).toBe('No place marked yet');
  fireEvent.keyDown(map, { key: 'ArrowDown' });
  expect(at()).toEqual(marlow);
});

test('the map is tied to its instructions', () => {
  const map = open(marlow);
  expect(document.getElementById(map.getAttribute('aria-describedby') ?? '')?.textContent).toContain('arrow keys');
});

test('what is typed and is no place yet breaks nothing', () => {
  open({ latitude: 364, longitude: -93.1 });
  expect(screen.getByRole('status').textContent).toBe('No place marked yet');
});
