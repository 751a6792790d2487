import { describe, expect, it } from 'vitest';
import type { TruckRow } from '../../../server/contract/trucks';
import { instantOf } from '../../../server/domain/civil';
import {
  edit,
  faultOf,
  learn,
  proposeUsual,
  proposeWindow,
  settle,
  shownRows,
  takeBack,
  trucksOf,
  type Drafts,
} from '../../../src/features/trucks/truck-drafts';

const zone = 'America/Chicago';
const now = instantOf('2026-12-01', '21:30', zone);
const thursday = { day: '2026-12-03', from: '07:00', to: '15:00' };
const friday = { day: '2026-12-04', from: '08:00', to: '10:00' };
const truck = { day: '2026-12-02', from: 1, to: 2, version: 4 };

const row = (id: string, parts: Partial<TruckRow> = {}): TruckRow => ({
  store: { id, name: `Store ${id}`, city: 'Marl', timeZone: zone, district: 'North' },
  truck: null,
  usual: thursday,
  runOutLikely: null,
  ...parts,
});

const none: Drafts = new Map();
const ids = (drafts: Drafts) => [...drafts.keys()];

describe('proposing', () => {
  it('gives each chosen store its own usual day and leaves those without one alone', () => {
    const drafts = proposeUsual(none, [row('a'), row('b', { usual: null }), row('c', { usual: friday })]);
    expect(ids(drafts)).toEqual(['a', 'c']);
    expect(drafts.get('a')).toMatchObject(thursday);
    expect(drafts.get('c')).toMatchObject(friday);
  });

  it('keeps what was typed where a store has no usual day', () => {
    const typed = proposeWindow(none, [row('b', { usual: null })], friday);
    expect(proposeUsual(typed, [row('b', { usual: null })]).get('b')).toMatchObject(friday);
  });

  it('gives all chosen stores one window, those with a draft too', () => {
    const drafts = proposeWindow(proposeUsual(none, [row('a')]), [row('a'), row('b')], friday);
    expect(drafts.get('a')).toMatchObject(friday);
    expect(drafts.get('b')).toMatchObject(friday);
  });

  it('changes the one draft meant and takes the one meant back', () => {
    const drafts = edit(proposeUsual(none, [row('a'), row('b')]), 'a', { from: '09:15' });
    expect(drafts.get('a')).toMatchObject({ ...thursday, from: '09:15' });
    expect(drafts.get('b')).toMatchObject(thursday);
    expect(ids(takeBack(drafts, 'a'))).toEqual(['b']);
    expect(edit(drafts, 'gone', { day: '2027-01-01' })).toBe(drafts);
  });
});

describe('what is wrong with a draft', () => {
  const fault = (window: Partial<typeof thursday>, at = zone) => {
    const there = row('a', { store: { ...row('a').store, timeZone: at } });
    const draft = proposeWindow(none, [there], { ...thursday, ...window }).get('a');
    return draft && faultOf(draft, now);
  };

  it('is said in the order in which it can be mended', () => {
    expect(fault({})).toBeNull();
    expect(fault({ day: '' })).toBe('unfilled');
    expect(fault({ to: '' })).toBe('unfilled');
    expect(fault({ day: '2026-11-30' })).toBe('day-past');
    expect(fault({ to: '07:00' })).toBe('window-backwards');
  });

  it('goes by the day of the store', () => {
    expect(fault({ day: '2026-12-01' })).toBeNull();
    expect(fault({ day: '2026-12-01' }, 'America/New_York')).toBeNull();
    expect(fault({ day: '2026-12-01' }, 'Europe/Berlin')).toBe('day-past');
  });
});

describe('telling', () => {
  it('sends what is right with the version that was seen, and 200 at most', () => {
    const drafts = edit(proposeUsual(none, [row('a', { truck }), row('b'), row('c')]), 'c', { to: '06:00' });
    expect(trucksOf(drafts, now)).toEqual([
      { storeId: 'a', ...thursday, version: 4 },
      { storeId: 'b', ...thursday, version: null },
    ]);
    const many = Array.from({ length: 230 }, (_, i) => row(String(i)));
    expect(trucksOf(proposeUsual(none, many), now)).toHaveLength(200);
  });

  it('keeps the refused with their reason and what was typed, and lets go of the told', () => {
    const drafts = edit(proposeUsual(none, [row('a'), row('b'), row('c')]), 'b', { from: '09:15' });
    const left = settle(drafts, { set: ['a'], refused: [{ storeId: 'b', problem: 'truck-changed' }] });
    expect(ids(left)).toEqual(['b', 'c']);
    expect(left.get('b')).toMatchObject({ from: '09:15', refused: 'truck-changed' });
    expect(left.get('c')).toMatchObject({ refused: null });
  });

  it('succeeds at a second try with the version learnt since', () => {
    const refused = settle(proposeUsual(none, [row('a')]), { set: [], refused: [{ storeId: 'a', problem: 'truck-changed' }] });
    expect(trucksOf(refused, now)).toMatchObject([{ version: null }]);
    const learnt = learn(refused, 'a', truck);
    expect(trucksOf(learnt, now)).toEqual([{ storeId: 'a', ...thursday, version: 4 }]);
    expect(learnt.get('a')?.refused).toBe('truck-changed');
  });

  it('forgets the reason once the draft is another', () => {
    const refused = settle(proposeUsual(none, [row('a')]), { set: [], refused: [{ storeId: 'a', problem: 'day-past' }] });
    expect(edit(refused, 'a', { day: '2026-12-09' }).get('a')?.refused).toBeNull();
  });
});

describe('the rows', () => {
  it('hold every draft, found this time or not, each once', () => {
    const drafts = proposeUsual(none, [row('a'), row('b')]);
    const shown = shownRows(drafts, [row('b', { truck }), row('c')]);
    expect(shown.map(({ store }) => store.id)).toEqual(['a', 'b', 'c']);
    expect(shown[1]?.truck).toEqual(truck);
  });
});
