import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { isGtin } from '../../../server/domain/gtin';

describe('numbers that were published as right', () => {
  test.each([
    // Looked up: the worked example of GS1 Hong Kong, "Example of a check digit calculation for the 13 digit field", gs1hk.org/CheckDigitCalculator_en.htm.
    ['6291041500213'],
    // Looked up: the example of the GS1 Digital Link standard, as GS1's own syntax engine quotes it in its tests.
    ['09520123456788'],
    // From memory: the example of the EPC Tag Data Standard, SGTIN 0614141.812345.6789.
    ['80614141123458'],
    // From memory: sample symbols of GS1 for EAN-8, UPC-A and EAN-13.
    ['95050003'],
    ['614141000036'],
    ['9501101530003'],
  ])('%s is one', (digits) => {
    expect(isGtin(digits)).toBe(true);
  });
});

const body = fc.constantFrom(7, 11, 12, 13).chain((length) => fc.array(fc.integer({ min: 0, max: 9 }), { minLength: length, maxLength: length }));

describe('any number', () => {
  test('has exactly one check digit', () => {
    fc.assert(
      fc.property(body, (digits) => {
        const right = [...'0123456789'].filter((check) => isGtin(digits.join('') + check));
        expect(right).toHaveLength(1);
      }),
    );
  });

  test('with one digit mistyped is none', () => {
    fc.assert(
      fc.property(fc.nat(12), fc.integer({ min: 1, max: 9 }), (at, by) => {
        const digits = [...'6291041500213'].map((digit, i) => (i === at ? (Number(digit) + by) % 10 : digit));
        expect(isGtin(digits.join(''))).toBe(false);
      }),
    );
  });

  test('stays one with zeros before it, as GS1 right-justifies it in fourteen', () => {
    expect(isGtin('614141000036'.padStart(14, '0'))).toBe(true);
  });

  test.each(['', '0', '629104150021', '62910415002130', '629104150021a', ' 6291041500213', '٦٢٩١٠٤١٥٠٠٢١٣', '123456789'])('%j is none', (text) => {
    expect(isGtin(text)).toBe(false);
  });
});
