/** Exact factors. Sources: NIST Handbook 44 appendix C (inch, pound); NIST SP 811 appendix B.8 (degree Fahrenheit). */
const METRES_PER_INCH = 0.0254;
const KILOGRAMS_PER_POUND = 0.453_592_37;

export const metresToInches = (metres: number): number => metres / METRES_PER_INCH;
export const inchesToMetres = (inches: number): number => inches * METRES_PER_INCH;
export const kilogramsToPounds = (kilograms: number): number => kilograms / KILOGRAMS_PER_POUND;
export const poundsToKilograms = (pounds: number): number => pounds * KILOGRAMS_PER_POUND;

/** A temperature; a difference of temperatures is another function. */
export const celsiusToFahrenheit = (celsius: number): number => celsius * 1.8 + 32;
export const fahrenheitToCelsius = (fahrenheit: number): number => (fahrenheit - 32) / 1.8;
export const celsiusIntervalToFahrenheit = (celsius: number): number => celsius * 1.8;

/** Density of ice at its melting point, 916.7215 kg/m³ (IAPWS R10-06, table 6), in pounds per cubic inch. */
export const ICE_POUNDS_PER_CUBIC_INCH = kilogramsToPounds(916.7215) * METRES_PER_INCH ** 3;

/** Bulk density of cubes in bags, about 560 kg/m³ (FAO Fisheries Technical Paper 436; from memory). */
export const BULK_POUNDS_PER_CUBIC_INCH = kilogramsToPounds(560) * METRES_PER_INCH ** 3;
