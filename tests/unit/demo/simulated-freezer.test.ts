import { describe, expect, test } from 'vitest';
import { levelOf } from '../../../server/domain/level';
import { seeded } from '../../../server/demo/random';
import { capacityOf, refill, sell, sense, stocked, type Failing, type Moment } from '../../../server/demo/simulated-freezer';

const setup = {
  model: { name: 'Two-door', insideWidthIn: 58, insideDepthIn: 27, insideHeightIn: 48, doors: 2, ratedPounds: 900, defrost: 'auto' as const },
  mount: { channelDropIn: 1.5, rackIn: 2, headroomIn: 3, probesIn: [10, 29, 48] },
  lanes: [
    { productId: 'small', widthShare: 0.5, bagPounds: 7 },
    { productId: 'large', widthShare: 0.5, bagPounds: 20 },
  ],
};
const freezer: Failing = { setup, dailyPounds: [90, 90], defrosts: true, outdoor: false, brokeAt: null };
const start = Date.UTC(2026, 5, 1, 6);
const momentAt = (i: number): Moment => ({ at: start + i * 1_800_000, hour: (6 + i / 2) % 24, weekday: 1, open: (6 + i / 2) % 24 >= 6 && (6 + i / 2) % 24 < 22 });

describe('a simulated freezer', () => {
  test('loses whole bags and never gains any by selling', () => {
    const random = seeded('bags');
    let truth = stocked(freezer, random);
    for (let i = 0; i < 480; i += 1) {
      const next = sell(freezer, truth, momentAt(i), random);
      next.pounds.forEach((pounds, lane) => {
        const sold = (truth.pounds[lane] ?? 0) - pounds;
        expect(sold >= 0 && pounds >= 0 && sold % (setup.lanes[lane]?.bagPounds ?? 1) === 0).toBe(true);
      });
      truth = next;
    }
    expect(truth.pounds).toEqual([0, 0]);
  });

  test('sells about as much in a day as it should', () => {
    const random = seeded('day');
    const days = 200;
    let sold = 0;
    for (let i = 0; i < 48 * days; i += 1) sold += 1e6 - (sell(freezer, { pounds: [1e6, 0], tops: [0, 0, 0] }, momentAt(i), random).pounds[0] ?? 0);
    // Monday sells 0.85 of a plain day, and the hours shut hold a few hundredths of the profile.
    expect(sold / days).toBeGreaterThan(90 * 0.85 * 0.93);
    expect(sold / days).toBeLessThan(90 * 0.85 * 1.02);
  });

  test('is filled to no more than it holds, and not at all with a size that is missing', () => {
    const { truth, bags } = refill(freezer, { pounds: [14, 0], tops: [0, 0, 0] }, seeded('truck'), 20);
    expect(bags[1]).toBe(0);
    expect(truth.pounds[1]).toBe(0);
    expect(truth.pounds[0]).toBe(14 + (bags[0] ?? 0) * 7);
    expect(truth.pounds[0]).toBeLessThan(capacityOf(setup, 0));
  });

  test('is seen by its sensor as it is, within a few bags', () => {
    const random = seeded('seen');
    const truth = { pounds: [280, 160], tops: [0, 0, 0] };
    const seen = Array.from({ length: 400 }, (_, i) => levelOf(setup, sense(freezer, truth, momentAt(i), random).distancesIn));
    const middle = (lane: number) => seen.flatMap((level) => level?.lanes[lane]?.pounds ?? []).sort((a, b) => a - b)[200] ?? NaN;
    expect(Math.abs(middle(0) - 280)).toBeLessThan(7);
    expect(Math.abs(middle(1) - 160)).toBeLessThan(20);
  });

  test('is cold while it runs and settles a little above melting once its compressor stops', () => {
    const random = seeded('air');
    const full = { pounds: [280, 160], tops: [0, 0, 0] };
    const cold = Array.from({ length: 480 }, (_, i) => sense(freezer, full, momentAt(i), random).airF).sort((a, b) => a - b);
    expect(cold[240]).toBeGreaterThan(14);
    expect(cold[240]).toBeLessThan(20);
    const broken = { ...freezer, brokeAt: start };
    expect(sense(broken, full, momentAt(2), random).airF).toBeLessThan(32);
    expect(sense(broken, full, momentAt(24), random).airF).toBeGreaterThan(34);
    expect(sense(broken, full, momentAt(24), random).airF).toBeLessThan(42);
    expect(sense(broken, { ...full, pounds: [0, 0] }, momentAt(48), random).airF).toBeGreaterThan(65);
  });
});
