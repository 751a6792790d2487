import { describe, expect, it } from 'vitest';
import { reportStep, withAnswers } from '../../../src/features/stores/report-steps';

const step = (search: string, freezers: string[]) => reportStep(new URLSearchParams(search), freezers);

describe('a report by its address', () => {
  it('asks first what is wrong', () => {
    expect(step('', ['a', 'b'])).toEqual({ step: 'kind' });
    expect(step('freezer=a', ['a', 'b'])).toEqual({ step: 'kind' });
  });

  it('takes no kind that is not a problem', () => {
    expect(step('kind=ice-sooner', ['a'])).toEqual({ step: 'kind' });
    expect(step('kind=fire', ['a'])).toEqual({ step: 'kind' });
  });

  it('asks which freezer only where there are several', () => {
    expect(step('kind=leak', ['a', 'b'])).toEqual({ step: 'freezer', kind: 'leak' });
    expect(step('kind=leak', ['a'])).toEqual({ step: 'details', kind: 'leak', freezerId: 'a' });
    expect(step('kind=leak', [])).toEqual({ step: 'details', kind: 'leak', freezerId: null });
  });

  it('takes a freezer of this store, or none of them', () => {
    expect(step('kind=leak&freezer=b', ['a', 'b'])).toEqual({ step: 'details', kind: 'leak', freezerId: 'b' });
    expect(step('kind=leak&freezer=none', ['a', 'b'])).toEqual({ step: 'details', kind: 'leak', freezerId: null });
    expect(step('kind=leak&freezer=elsewhere', ['a', 'b'])).toEqual({ step: 'freezer', kind: 'leak' });
  });

  it('cannot be sent again once it is filed', () => {
    expect(step('filed=r1&kind=leak', ['a'])).toEqual({ step: 'filed', requestId: 'r1' });
  });

  it('keeps the other answers when one changes', () => {
    const search = new URLSearchParams('kind=leak&freezer=a');
    expect(withAnswers(search, { kind: 'light' })).toBe('?kind=light&freezer=a');
    expect(withAnswers(search, { freezer: null })).toBe('?kind=leak');
  });
});
