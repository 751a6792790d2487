import { expect, test } from 'vitest';
import {
  celsiusIntervalToFahrenheit,
  celsiusToFahrenheit,
  fahrenheitToCelsius,
  ICE_POUNDS_PER_CUBIC_INCH,
  inchesToMetres,
  kilogramsToPounds,
  metresToInches,
  poundsToKilograms,
} from '../../server/domain/units';

test('inch and pound are exact (NIST Handbook 44, appendix C: 2.54 cm, 453.592 37 g)', () => {
  expect(inchesToMetres(1)).toBe(0.0254);
  expect(metresToInches(0.0254 * 41.5)).toBeCloseTo(41.5, 12);
  expect(poundsToKilograms(1)).toBe(0.45359237);
  expect(kilogramsToPounds(453.59237)).toBeCloseTo(1000, 10);
});

test('degrees Fahrenheit (NIST SP 811, appendix B.8: t/°C = (t/°F − 32)/1.8; an interval of 1 °C is 1.8 °F)', () => {
  expect(celsiusToFahrenheit(0)).toBe(32);
  expect(celsiusToFahrenheit(-40)).toBe(-40);
  expect(fahrenheitToCelsius(212)).toBe(100);
  expect(celsiusIntervalToFahrenheit(5)).toBe(9);
});

test('ice weighs 916.7215 kg/m³ at its melting point (IAPWS R10-06, table 6), which is 57.23 lb a cubic foot', () => {
  expect(ICE_POUNDS_PER_CUBIC_INCH * 1728).toBeCloseTo(916.7215 * 0.06242796, 3);
});
