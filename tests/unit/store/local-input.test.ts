import { describe, expect, it } from 'vitest';
import { instantOfInput, localInputOf, timeOfDayIn } from '../../../src/features/deliveries/local-input';

describe('an input of day and time, by the clock of the store', () => {
  it('shows and reads the local time, in winter and in summer', () => {
    // Chicago is UTC−6 in December and UTC−5 in July.
    const winter = Date.UTC(2026, 11, 1, 13, 5);
    const summer = Date.UTC(2026, 6, 1, 13, 5);
    expect(localInputOf(winter, 'America/Chicago')).toBe('2026-12-01T07:05');
    expect(localInputOf(summer, 'America/Chicago')).toBe('2026-07-01T08:05');
    expect(instantOfInput('2026-12-01T07:05', 'America/Chicago')).toBe(winter);
    expect(instantOfInput('2026-07-01T08:05', 'America/Chicago')).toBe(summer);
  });

  it('counts midnight as hour zero', () => {
    expect(timeOfDayIn(Date.UTC(2026, 11, 1, 6, 30), 'America/Chicago')).toBe('00:30');
  });

  it('reads nothing from an input that is not filled in', () => {
    expect(instantOfInput('', 'America/Chicago')).toBeNaN();
  });
});
