import { describe, expect, test } from 'vitest';
import { evenShares, shareOfText, sumOfShares, textOfShare } from '../../../src/features/freezers/form/lane-shares';

describe('shares evened out', () => {
  test('three lanes give 34, 33 and 33', () => {
    expect(evenShares(3)).toEqual([0.34, 0.33, 0.33]);
  });

  test.each([1, 2, 3, 4, 5, 6, 7, 8])('%i lanes sum to exactly the whole width', (lanes) => {
    const shares = evenShares(lanes);
    expect(shares).toHaveLength(lanes);
    expect(shares.reduce((sum, share) => sum + Math.round(share * 100), 0)).toBe(100);
    expect(sumOfShares(shares)).toBe(100);
    expect(Math.max(...shares) - Math.min(...shares)).toBeLessThan(0.0101);
  });
});

describe('percent and share', () => {
  test.each([
    ['34', 0.34],
    ['33.5', 0.335],
    ['33,5', 0.335],
    [' 40 % ', 0.4],
    ['0', 0],
  ])('“%s” is the share %d', (text, share) => {
    expect(shareOfText(text)).toBeCloseTo(share, 12);
  });

  test.each(['', ' ', '%', 'half', '1.2.3'])('“%s” is no share', (text) => {
    expect(shareOfText(text)).toBeNaN();
  });

  test('a share is shown to a tenth of a percent, none as nothing', () => {
    expect(textOfShare(0.34)).toBe('34');
    expect(textOfShare(1 / 3)).toBe('33.3');
    expect(textOfShare(NaN)).toBe('');
  });

  test('what was shown is read back as it was', () => {
    for (const percent of [1, 7, 29, 33.3, 57, 58, 99.9, 100]) expect(textOfShare(shareOfText(String(percent)))).toBe(String(percent));
  });

  test('a lane without a number counts nothing', () => {
    expect(sumOfShares([0.5, NaN, 0.2])).toBe(70);
  });
});
