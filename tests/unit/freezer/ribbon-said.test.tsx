// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test } from 'vitest';
import en from '../../../locales/en/freezer.json';
import es from '../../../locales/es/freezer.json';
import type { RibbonData } from '../../../src/freezer/ribbon-data';
import { RibbonSaid } from '../../../src/freezer/ribbon-said';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', resources: { en: { freezer: en }, es: { freezer: es } }, interpolation: { escapeValue: false } });
});
afterEach(cleanup);

const hour = 3_600_000;
// Tuesday 1:10 pm in Chicago.
const now = Date.parse('2026-12-01T19:10:00Z');
const truck = Date.parse('2026-12-03T15:40:00Z');
const data: RibbonData = {
  now,
  timeZone: 'America/Chicago',
  history: [[now - 24 * hour, 0.7], [now, 0.2]],
  forecast: [{ at: now, low: 0.2, likely: 0.2, high: 0.2 }, { at: truck, low: 0, likely: 0.05, high: 0.1 }],
  deliveries: [{ at: now - 20 * hour, pounds: 800 }],
  truck: { from: truck, to: truck + 1.5 * hour, label: 'Thu truck' },
  empty: { from: truck - 12 * hour, to: truck },
};

const said = async (language: 'en' | 'es', ribbon: RibbonData) => {
  await i18next.changeLanguage(language);
  const { container } = render(<RibbonSaid data={ribbon} locale={language} />);
  const plain = (text: string | null | undefined) => (text ?? '').replace(/\s/g, ' ');
  return { sentence: plain(container.querySelector('p')?.textContent), points: [...container.querySelectorAll('li')].map((li) => plain(li.textContent)) };
};

test('the ribbon in a sentence: level, truck, the empty stretch, the end', async () => {
  const { sentence } = await said('en', data);
  expect(sentence).toBe(
    'Now 20% full. Next truck: Thu 9:40–11:10. Likely empty from Wed Dec 2, 9:40 pm to Thu Dec 3, 9:40 am, before the truck. ' +
      'At the end, Thu Dec 3: likely 5%, between 0% and 10%.',
  );
});

test('in Spanish, with no truck and nothing known, it says so', async () => {
  const { sentence, points } = await said('es', { ...data, history: [], forecast: [], deliveries: [], truck: null, empty: null });
  expect(sentence).toBe('No se sabe cuánto hay ahora. Todavía no hay camión programado.');
  expect(points).toEqual([]);
});

test('who is not told of trucks hears nothing of them', async () => {
  const { sentence } = await said('en', { ...data, forecast: [], truck: undefined, empty: null });
  expect(sentence).toBe('Now 20% full.');
});
