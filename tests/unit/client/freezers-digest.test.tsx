// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, beforeAll, describe, expect, test } from 'vitest';
import en from '../../../locales/en/freezers.json';
import es from '../../../locales/es/freezers.json';
import type { FleetDigest } from '../../../server/contract/fleet';
import { Digest } from '../../../src/features/freezers/digest';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', resources: { en: { freezers: en }, es: { freezers: es } }, interpolation: { escapeValue: false } });
});
afterEach(cleanup);

const fleet = (counts: Partial<FleetDigest>): FleetDigest => ({ all: 84, first: 0, warm: 0, silent: 0, unfitted: 4, ...counts });

async function said(language: 'en' | 'es', digest: FleetDigest, { url = '/kestrel-bend/freezers', trucks = true } = {}) {
  await i18next.changeLanguage(language);
  const { container } = render(
    <MemoryRouter initialEntries={[url]}>
      <Digest digest={digest} trucks={trucks} />
    </MemoryRouter>,
  );
  const links = [...container.querySelectorAll('a')].map((link) => [link.textContent, link.getAttribute('href')]);
  return { words: container.textContent, links };
}

describe('what is wrong', () => {
  const wrong = fleet({ first: 5, warm: 1, silent: 2 });

  test('one and many in a sentence', async () => {
    expect((await said('en', wrong)).words).toBe('Of 84 freezers, 5 may run out before their next truck, 1 is warm, and 2 are silent.');
    cleanup();
    expect((await said('es', wrong)).words).toBe('De 84 congeladores, 5 podrían quedarse sin hielo antes de su próximo camión, 1 está tibio y 2 están sin señal.');
  });

  test('only what is wrong is named', async () => {
    expect((await said('en', fleet({ first: 1, silent: 1 }))).words).toBe('Of 84 freezers, 1 may run out before its next truck and 1 is silent.');
    cleanup();
    expect((await said('es', fleet({ warm: 3 }))).words).toBe('De 84 congeladores, 3 están tibios.');
  });

  test('each part leads to the freezers meant, within what is already picked, on the first page', async () => {
    const { links } = await said('en', wrong, { url: '/kestrel-bend/freezers?district=d1&show=silent&after=x' });
    expect(links).toEqual([
      ['5 may run out before their next truck', '/kestrel-bend/freezers?district=d1&show=first'],
      ['1 is warm', '/kestrel-bend/freezers?district=d1&show=warm'],
      ['2 are silent', '/kestrel-bend/freezers?district=d1&show=silent'],
    ]);
  });

  test('the only freezer there is', async () => {
    const one = fleet({ all: 1, first: 1, silent: 1, unfitted: 0 });
    expect((await said('en', one)).words).toBe('The one freezer here may run out before its next truck and is silent.');
    cleanup();
    expect((await said('es', one)).words).toBe('El único congelador podría quedarse sin hielo antes de su próximo camión y está sin señal.');
  });
});

describe('nothing wrong', () => {
  test('is said calmly, of those that can be seen into', async () => {
    expect((await said('en', fleet({}))).words).toBe('All 80 freezers with a sensor are fine: cold, heard from and stocked until their next truck.');
    cleanup();
    expect((await said('es', fleet({ all: 2, unfitted: 1 }))).words).toBe('El único congelador con sensor está bien: frío, con señal y con hielo hasta su próximo camión.');
  });

  test('and nothing of trucks to whoever may not read of them', async () => {
    const untold = { trucks: false };
    expect((await said('en', fleet({ first: 2 }), untold)).words).toBe('Of 84 freezers, 2 may run out within two days.');
    cleanup();
    expect((await said('en', fleet({}), untold)).words).toBe('All 80 freezers with a sensor are fine: cold, heard from and stocked for two days.');
    cleanup();
    expect((await said('es', fleet({ all: 1, first: 1, unfitted: 0 }), untold)).words).toBe('El único congelador podría quedarse sin hielo en menos de dos días.');
  });

  test('says nothing good of freezers without a sensor', async () => {
    expect((await said('en', fleet({ all: 4 }))).words).toBe('None of the 4 freezers has a sensor yet.');
    cleanup();
    expect((await said('es', fleet({ all: 1, unfitted: 1 }))).words).toBe('El único congelador todavía no tiene sensor.');
  });

  test('of no freezers there is nothing to say', async () => {
    expect((await said('en', fleet({ all: 0, unfitted: 0 }))).words).toBe('');
  });
});
