import { describe, expect, it } from 'vitest';
import { answersFor } from '../../../server/domain/answers';
import { standingOf } from '../../../server/domain/freezer-standing';
import { dayMs, freezer, hour, minute, now, saturday, state, store, thursday, today } from './store-now';

const full = (over: Parameters<typeof store>[0]) => answersFor(store(over), now).full;
const cold = (over: Parameters<typeof store>[0]) => answersFor(store(over), now).cold;
const coming = (over: Parameters<typeof store>[0], at = now) => answersFor(store(over), at).coming;

describe('Full?', () => {
  it('says that the truck comes first, and the side that would be empty without it', () => {
    const { value, said, known, all } = full({});
    expect(value).toEqual({ share: 0.6, pounds: 900, sdPounds: 30, at: now - 12 * minute, freshness: 'fresh' });
    expect(said).toMatchObject({ key: 'truck-first', place: { freezer: 'Front freezer', bagPounds: 20 }, runOut: { lane: 1 }, truck: { from: thursday.from } });
    expect([known, all]).toEqual([1, 1]);
  });

  it('adds levels and their uncertainties over freezers, and takes the oldest time', () => {
    const second = freezer({ name: 'Side', state: state({ at: now - hour, level: { pounds: 300, sdPounds: 40, capacityPounds: 500, lanes: [{ bags: 9 }, { bags: 9 }] } }) });
    // 30² + 40² = 50²
    expect(full({ freezers: [freezer(), second] }).value).toMatchObject({ share: 0.6, pounds: 1200, sdPounds: 50, at: now - hour });
  });

  it('says that it runs out before the truck', () => {
    expect(full({ nextTruck: saturday }).said).toMatchObject({ key: 'runs-out-first', truck: { to: saturday.to } });
  });

  it('says that it may run out before the truck when only the early time comes first', () => {
    const between = { ...saturday, day: '2026-12-04', from: now + 3 * dayMs + 6 * hour, to: now + 3 * dayMs + 8 * hour };
    expect(full({ nextTruck: between }).said.key).toBe('may-run-out-first');
  });

  it('says when it runs out where no truck is set', () => {
    expect(full({ nextTruck: null }).said).toMatchObject({ key: 'runs-out', truck: null });
  });

  it('says nothing of trucks to whoever is not told of them', () => {
    expect(full({ nextTruck: undefined }).said).toMatchObject({ key: 'runs-out', truck: undefined });
    const empty = freezer({ state: state({ level: { pounds: 0, sdPounds: 9, capacityPounds: 500, lanes: [{ bags: 0 }] } }) });
    expect(full({ freezers: [empty], nextTruck: undefined }).said).toMatchObject({ key: 'empty', truck: undefined });
  });

  it('takes no truck for coming once its day has a delivery', () => {
    const delivered = { at: now - 2 * hour, lines: [{ bags: 96 }] };
    expect(full({ nextTruck: today, deliveries: [delivered] }).said.key).toBe('runs-out');
  });

  it('does not count on a truck that is past its window', () => {
    const soon = state({ laneRunOuts: [{ early: now + hour, likely: now + 2 * hour, late: now + 3 * hour }] });
    const late = { ...today, to: now - 30 * minute };
    expect(full({ freezers: [freezer({ state: soon })], nextTruck: late }).said.key).toBe('runs-out');
  });

  it('says no day of running out within 14 days as keeping on', () => {
    const keeps = state({ laneRunOuts: [{ early: null, likely: null, late: null }] });
    expect(full({ freezers: [freezer({ state: keeps })] }).said).toEqual({ key: 'keeps', past: null });
  });

  it('says the last day with ice where it runs out much later than the truck', () => {
    const far = state({ laneRunOuts: [{ early: now + 8 * dayMs, likely: now + 9 * dayMs, late: null }] });
    expect(full({ freezers: [freezer({ state: far })] }).said).toEqual({ key: 'keeps', past: '2026-12-08' });
  });

  it('says which side is empty, and the whole freezer when both are', () => {
    const level = { pounds: 600, sdPounds: 30, capacityPounds: 1500, lanes: [{ bags: 88 }, { bags: 0 }] };
    expect(full({ freezers: [freezer({ state: state({ level }) })] }).said).toMatchObject({ key: 'empty', place: { bagPounds: 20 } });
    const nothing = { ...level, pounds: 0, lanes: [{ bags: 0 }, { bags: 0 }] };
    expect(full({ freezers: [freezer({ state: state({ level: nothing }) })] }).said).toMatchObject({ key: 'empty', place: { bagPounds: null } });
  });

  it('names no side in a freezer with one lane', () => {
    const one = freezer({ lanes: [{ bagPounds: 10 }], state: state({ laneRunOuts: [{ early: null, likely: now + 2 * dayMs, late: null }] }) });
    expect(full({ freezers: [one], nextTruck: null }).said).toMatchObject({ key: 'runs-out', place: { bagPounds: null } });
  });

  it('tells an empty freezer before one that only runs out', () => {
    const empty = freezer({ name: 'Side', state: state({ level: { pounds: 0, sdPounds: 9, capacityPounds: 500, lanes: [{ bags: 0 }] } }) });
    expect(full({ freezers: [freezer(), empty] }).said).toMatchObject({ key: 'empty', place: { freezer: 'Side' } });
  });

  it('tells the sooner of two run-outs', () => {
    const sooner = freezer({ name: 'Side', state: state({ laneRunOuts: [{ early: null, likely: now + 3 * dayMs, late: null }] }) });
    expect(full({ freezers: [freezer(), sooner], nextTruck: null }).said).toMatchObject({ place: { freezer: 'Side' } });
  });

  it('shows an old level with its age, and still tells its run-out', () => {
    const old = freezer({ state: state({ at: now - 3 * hour }) });
    expect(full({ freezers: [old] })).toMatchObject({ value: { freshness: 'old' }, said: { key: 'truck-first' } });
  });

  it('says that an old level is probably gone by now', () => {
    const gone = state({ at: now - 10 * hour, laneRunOuts: [{ early: now - 4 * hour, likely: now - hour, late: now + hour }] });
    expect(full({ freezers: [freezer({ state: gone })] }).said.key).toBe('perhaps-empty');
  });

  it('promises nothing from a level older than a day', () => {
    const stale = freezer({ state: state({ at: now - 25 * hour }) });
    expect(full({ freezers: [stale] })).toEqual({ value: null, said: { key: 'silent', since: now - 25 * hour }, known: 0, all: 1 });
  });

  it('says that too few days were seen', () => {
    const young = freezer({ state: state({ rates: [{ days: 0 }, { days: 0 }] }) });
    expect(full({ freezers: [young] }).said).toEqual({ key: 'learning' });
  });

  it('waits for a first reading', () => {
    expect(full({ freezers: [freezer({ state: null })] })).toMatchObject({ value: null, said: { key: 'waiting' } });
  });

  it('says what is known without a sensor', () => {
    const bare = freezer({ sensor: null, state: null });
    expect(full({ freezers: [bare] })).toMatchObject({ value: null, said: { key: 'no-sensor', lastDelivery: now - 3 * dayMs } });
    expect(full({ freezers: [bare], deliveries: [] }).said).toEqual({ key: 'no-sensor', lastDelivery: null });
  });

  it('counts the freezers it speaks of', () => {
    expect(full({ freezers: [freezer(), freezer({ sensor: null, state: null })] })).toMatchObject({ known: 1, all: 2, said: { key: 'truck-first' } });
  });

  it('says that no freezer stands here', () => {
    expect(full({ freezers: [] })).toEqual({ value: null, said: { key: 'no-freezers' }, known: 0, all: 0 });
  });
});

describe('Cold?', () => {
  it('says that all are holding, with the warmest air and the longest silence', () => {
    const side = freezer({ state: state({ airF: 21, airAt: now - 40 * minute }) });
    expect(cold({ freezers: [freezer(), side] })).toEqual({
      value: { airF: 21, at: now - 40 * minute, freshness: 'fresh' },
      said: { key: 'holding', count: 2, heard: now - 40 * minute },
    });
  });

  it('says warm since when, before anything colder', () => {
    const warm = freezer({ name: 'Side', state: state({ airF: 41, warmSince: now - 2 * hour }) });
    expect(cold({ freezers: [freezer(), warm] }).said).toEqual({ key: 'warm', freezer: 'Side', since: now - 2 * hour, others: 0 });
  });

  it('does not call one reading above freezing warm', () => {
    expect(cold({ freezers: [freezer({ state: state({ airF: 34 }) })] }).said).toMatchObject({ key: 'above-once' });
    expect(cold({ freezers: [freezer({ state: state({ airF: 32 }) })] }).said).toMatchObject({ key: 'holding' });
  });

  it('counts those of which nothing is known', () => {
    const bare = freezer({ sensor: null, state: null });
    expect(cold({ freezers: [freezer(), bare] }).said).toMatchObject({ key: 'holding-some', count: 1, unknown: 1 });
  });

  it('believes no thermometer after a day of silence, not even a warm one', () => {
    const silent = freezer({ state: state({ airF: 50, airAt: now - 25 * hour, warmSince: now - 30 * hour }) });
    expect(cold({ freezers: [silent] })).toEqual({ value: null, said: { key: 'silent', heard: now - 25 * hour } });
  });

  it('shows an old temperature as old', () => {
    expect(cold({ freezers: [freezer({ state: state({ airAt: now - 2 * hour }) })] }).value?.freshness).toBe('old');
  });

  it('tells no sensor, no reading and no freezer apart', () => {
    expect(cold({ freezers: [freezer({ sensor: null, state: null })] }).said.key).toBe('no-sensor');
    expect(cold({ freezers: [freezer({ state: null })] }).said.key).toBe('waiting');
    expect(cold({ freezers: [freezer({ state: state({ airF: null, airAt: null }) })] }).said.key).toBe('waiting');
    expect(cold({ freezers: [] }).said.key).toBe('no-freezers');
  });
});

describe('Coming?', () => {
  it('tells the window of a later day, and the bags', () => {
    expect(coming({})).toEqual({ value: { day: '2026-12-03', from: thursday.from, to: thursday.to }, said: { key: 'ahead', bags: 96 } });
  });

  it('tells today before, in and after its window', () => {
    expect(coming({ nextTruck: today }, today.from - 1)?.said.key).toBe('today');
    expect(coming({ nextTruck: today }, today.from)?.said.key).toBe('in-window');
    expect(coming({ nextTruck: today }, today.to)?.said.key).toBe('in-window');
    expect(coming({ nextTruck: today }, today.to + 20 * minute)?.said).toEqual({ key: 'late', bags: 96, dueBy: today.to, lateMs: 20 * minute });
  });

  it('tells a truck of a past day without a delivery as missed', () => {
    expect(coming({ nextTruck: { ...thursday, day: '2026-11-30', from: now - dayMs, to: now - dayMs + hour } })).toEqual({ value: null, said: { key: 'missed', day: '2026-11-30' } });
  });

  it('tells what was delivered today, and the truck after it', () => {
    const delivered = { at: now - hour, lines: [{ bags: 40 }, { bags: 24 }] };
    expect(coming({ nextTruck: today, deliveries: [delivered] })).toEqual({ value: null, said: { key: 'delivered', at: now - hour, bags: 64, next: null } });
    expect(coming({ deliveries: [delivered] })?.said).toMatchObject({ key: 'delivered', next: { day: '2026-12-03', bags: 96 } });
  });

  it('counts today in the time zone of the store', () => {
    // 23:30 of the day before in Chicago is already December 1 in UTC.
    const lastNight = { at: Date.UTC(2026, 11, 1, 5, 30), lines: [{ bags: 10 }] };
    expect(coming({ deliveries: [lastNight] })?.said.key).toBe('ahead');
  });

  it('has no answer for whoever is not told of trucks', () => {
    expect(coming({ nextTruck: undefined })).toBeNull();
    expect(coming({ nextTruck: undefined, deliveries: [{ at: now - hour, lines: [{ bags: 40 }] }] })).toBeNull();
  });

  it('tells the usual days where no truck is set', () => {
    expect(coming({ nextTruck: null })).toEqual({ value: null, said: { key: 'none', deliveryDays: [2, 4] } });
  });
});

describe('A standing', () => {
  it('counts on no truck, and on none missing, where trucks are not told', () => {
    const standing = (truck: null | undefined) => standingOf(freezer(), truck, now, 'America/Chicago').kind;
    expect([standing(null), standing(undefined)]).toEqual(['runs-out', 'runs-out-untold']);
  });
});
