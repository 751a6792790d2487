import { expect, test } from 'vitest';
import { isotonicNonIncreasing } from '../../server/domain/signal';

// Source: R 4.2.2, stats::isoreg, by this script (invented levels of a freezer, pounds):
//   y <- c(452.1,449.8,451.0,440.2,438.9,441.5,430.0,431.2,425.7,425.9,401.3,405.8,398.4,399.9,380.0,382.5,379.1,360.6,361.2,355.5)
//   cat(paste(format(-isoreg(-y)$yf, digits=12), collapse=", "))
const y = [452.1, 449.8, 451.0, 440.2, 438.9, 441.5, 430.0, 431.2, 425.7, 425.9, 401.3, 405.8, 398.4, 399.9, 380.0, 382.5, 379.1, 360.6, 361.2, 355.5];
const fitted = [452.10, 450.40, 450.40, 440.20, 440.20, 440.20, 430.60, 430.60, 425.80, 425.80, 403.55, 403.55, 399.15, 399.15, 381.25, 381.25, 379.10, 360.90, 360.90, 355.50];

test('the isotonic fit equals R’s isoreg', () => {
  isotonicNonIncreasing(y).forEach((value, i) => expect(value).toBeCloseTo(fitted[i] ?? Number.NaN, 8));
});
