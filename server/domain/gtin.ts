const LENGTHS = [8, 12, 13, 14];

/**
 * Whether the digits are a GTIN-8, -12, -13 or -14 with the right check digit: weights 3 and 1 from the right, the sum
 * with the check digit a multiple of ten (GS1 General Specifications, section 7.9.1; ISO/IEC 15420 for its symbols).
 */
export function isGtin(digits: string): boolean {
  if (!/^\d+$/.test(digits) || !LENGTHS.includes(digits.length)) return false;
  const sum = [...digits].reverse().reduce((total, digit, i) => total + Number(digit) * (i % 2 === 0 ? 1 : 3), 0);
  return sum % 10 === 0;
}
