// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test } from 'vitest';
import en from '../../../locales/en/freezer.json';
import es from '../../../locales/es/freezer.json';
import { FrontSection } from '../../../src/freezer/front-section';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', resources: { en: { freezer: en }, es: { freezer: es } }, interpolation: { escapeValue: false } });
});
afterEach(cleanup);

const draw = async (language: 'en' | 'es') => {
  await i18next.changeLanguage(language);
  return render(
    <FrontSection
      widthIn={54}
      heightIn={52}
      channelDropIn={4}
      rackIn={3}
      airText="18 °F"
      probes={[{ xIn: 12, distanceIn: 18.5 }, { xIn: 42, distanceIn: null }]}
      lanes={[
        { widthShare: 0.5, label: '7 lb', bags: 88, about: false, stackIn: 26.5, usableStackIn: 36, bagPounds: 7, low: false },
        { widthShare: 0.5, label: '20 lb', bags: 14, about: true, stackIn: 11, usableStackIn: 36, bagPounds: 20, low: true },
      ]}
    />,
  );
};

test('the text alternative says what the drawing shows', async () => {
  const { container } = await draw('en');
  expect(container.querySelector('figcaption')?.textContent).toBe(
    'Front view, from left to right. 7 lb: 88 bags, stacked 26.5 of 36 inches high. ' +
      '20 lb: about 14 bags, stacked 11 of 36 inches high. Running low. ' +
      'Probe 1 of 2: 18.5 inches down to the bags. Probe 2 of 2: no signal. Air: 18 °F.',
  );
  expect(container.querySelector('svg')?.getAttribute('aria-hidden')).toBe('true');
});

test('a silent probe has words and no line; a low lane is hatched', async () => {
  const { container } = await draw('es');
  expect(container.querySelector('svg')?.textContent).toContain('sin señal');
  expect(container.querySelectorAll('path.stroke-fjord-2')).toHaveLength(1);
  expect(container.querySelectorAll('pattern')).toHaveLength(1);
});
