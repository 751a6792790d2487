// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test } from 'vitest';
import es from '../../../locales/es/freezer.json';
import { RibbonSaid } from '../../../src/freezer/ribbon-said';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'es', resources: { es: { freezer: es } }, interpolation: { escapeValue: false } });
});
afterEach(cleanup);

test('the ribbon is told in sentences and points', () => {
  const hour = 3_600_000;
  const now = Date.parse('2026-12-01T16:00:00Z');
  const truck = { from: now + 47.5 * hour, to: now + 49 * hour, label: 'camión jue' };
  const { container } = render(
    <RibbonSaid
      locale="es"
      data={{
        now,
        timeZone: 'America/Chicago',
        history: [[now - 24 * hour, 0.5], [now, 0.3]],
        forecast: [{ at: now, low: 0.3, likely: 0.3, high: 0.3 }, { at: now + 26 * hour, low: 0, likely: 0.1, high: 0.2 }],
        deliveries: [{ at: now - 20 * hour, pounds: 820 }],
        truck,
        empty: { from: now + 40 * hour, to: truck.from },
      }}
    />,
  );
  const [said, ...points] = [...container.querySelectorAll('p:first-child, li')].map(({ textContent }) => textContent.replace(/\s/g, ' '));
  expect(said).toBe(
    'Ahora está lleno al 30%. Próximo camión: jue 9:30–11:00. ' +
      'Es probable que se quede sin hielo desde jue 3 dic, 2:00 a. m. hasta jue 3 dic, 9:30 a. m., antes del camión. ' +
      'Al final, mié 2 dic: lo más probable, 10%; entre 0% y 20%.',
  );
  expect(points).toEqual([
    'lun 30 nov: lleno al 50%',
    'lun 30 nov, 2:00 p. m.: entrega de 820 lb',
    'mar 1 dic: lleno al 30%',
    'mar 1 dic: lo más probable, 10%; entre 0% y 20%',
    'mié 2 dic: lo más probable, 10%; entre 0% y 20%',
  ]);
});
