import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { levelOf, probeStacks, setupFaults, stackSdIn, usableStackIn } from '../../../server/domain/level';
import type { FreezerSetup } from '../../../server/domain/types';
import { ICE_POUNDS_PER_CUBIC_INCH } from '../../../server/domain/units';

/** 58 × 27 × 48 in inside, 900 lb; a full stack is 48 − 1.5 − 2 − 3 = 41.5 in. The floor is 44.5 in below the probes. */
const setup: FreezerSetup = {
  model: { insideWidthIn: 58, insideDepthIn: 27, insideHeightIn: 48, ratedPounds: 900 },
  mount: { channelDropIn: 1.5, rackIn: 2, headroomIn: 3, probesIn: [10, 29, 48] },
  lanes: [
    { productId: 'seven', widthShare: 0.5, bagPounds: 7 },
    { productId: 'twenty', widthShare: 0.5, bagPounds: 20 },
  ],
};
const oneLane: FreezerSetup = { ...setup, lanes: [{ productId: 'ten', widthShare: 1, bagPounds: 10 }] };
const level = (distances: (number | null)[], given = setup) => {
  const found = levelOf(given, distances);
  if (!found) throw new Error('no level');
  return found;
};

describe('level by hand', () => {
  test('full: the bags stand at the headroom', () => {
    const full = level([3, 3, 3]);
    expect(full.pounds).toBeCloseTo(900, 9);
    expect(full.share).toBeCloseTo(1, 9);
    // 450 / 7 = 64.28…, 450 / 20 = 22.5: whole bags, rounded down.
    expect(full.lanes.map(({ bags }) => bags)).toEqual([64, 22]);
  });

  test('closer than the headroom is not more than full', () => {
    expect(level([0, 0, 0]).pounds).toBeCloseTo(900, 9);
  });

  test('empty: the probes see the rack', () => {
    expect(level([44.5, 44.5, 44.5])).toMatchObject({ pounds: 0, share: 0 });
  });

  test('up to two inches beyond the floor is an empty column, further is no reading', () => {
    expect(level([46.5, 44.5, 46.5]).pounds).toBe(0);
    expect(probeStacks(setup, [46.6, 44.5, -0.1])).toEqual([null, 0, null]);
  });

  test('two lanes, each by its own probe; the one at the boundary tells little of either', () => {
    // 7 lb: stack 44.5 − 20 = 24.5 in → 900 × 0.5 / 41.5 × 24.5 = 265.66 lb → 37 bags.
    // 20 lb: stack 44.5 − 34.5 = 10 in → 108.43 lb → 5 bags.
    const uneven = level([20, 20, 34.5]);
    expect(uneven.lanes[0]).toMatchObject({ bags: 37, stackIn: 24.5, borrowed: false });
    expect(uneven.lanes[1]).toMatchObject({ bags: 5, stackIn: 10, borrowed: false });
    expect(uneven.pounds).toBeCloseTo((450 / 41.5) * 34.5, 9);
  });

  test('one lane: each probe counts for the width that lies nearest it', () => {
    // Cells 0–19.5, 19.5–38.5, 38.5–58 of 58 in; stacks 30, 20, 10 in.
    const stack = (19.5 * 30 + 19 * 20 + 19.5 * 10) / 58;
    expect(level([14.5, 24.5, 34.5], oneLane).pounds).toBeCloseTo((900 / 41.5) * stack, 9);
  });

  test('a dead probe leaves its width to the lane’s others', () => {
    // Cells 0–29 and 29–58 for the probes at 10 and 48; stacks 30 and 10 in.
    expect(level([14.5, null, 34.5], oneLane).pounds).toBeCloseTo((900 / 41.5) * 20, 9);
  });

  test('a lane whose own probe is dead reads the one at the boundary, then borrows, each less sure', () => {
    const sure = level([20, 25, 25]).lanes[1];
    const near = level([20, 25, null]).lanes[1];
    const borrowed = level([25, null, null]).lanes[1];
    expect(near).toMatchObject({ stackIn: 19.5, borrowed: false });
    expect(borrowed).toMatchObject({ stackIn: 19.5, borrowed: true });
    // One more sd of 12 % and of 25 % of a full lane of 450 lb.
    expect(near?.sdPounds).toBeCloseTo(Math.hypot(sure?.sdPounds ?? 0, 0.12 * 450), 6);
    expect(borrowed?.sdPounds).toBeCloseTo(Math.hypot(sure?.sdPounds ?? 0, 0.25 * 450), 6);
  });

  test('more rated pounds than solid ice would weigh are cut to that', () => {
    // 58 × 27 in by a stack of 20 in is 31,320 cubic inches, or 18.125 cubic feet, of 57.229 lb each.
    const heavy = { ...oneLane, model: { ...oneLane.model, ratedPounds: 90_000 } };
    expect(level([24.5, 24.5, 24.5], heavy).pounds).toBeCloseTo(1037.3, 0);
  });

  test('no live probe is no level', () => {
    expect(levelOf(setup, [null, null, null])).toBeNull();
    expect(levelOf(setup, [])).toBeNull();
    expect(levelOf(setup, [Number.NaN, -5, 900])).toBeNull();
  });

  test('whole bags are not lost to arithmetic', () => {
    const uneven: FreezerSetup = {
      model: { ...setup.model, insideWidthIn: 60, ratedPounds: 830 },
      mount: { ...setup.mount, probesIn: [5, 30, 55] },
      lanes: [0.2, 0.8].map((widthShare) => ({ productId: 'seven', widthShare, bagPounds: 7 })),
    };
    // 16 lb an inch by 28 in are 448 lb or 64 bags; in floating point 63.99999999999999.
    const lane = level([16.5, 16.5, 16.5], uneven).lanes[1];
    expect(Math.floor((lane?.pounds ?? 0) / 7)).toBe(63);
    expect(lane?.bags).toBe(64);
  });

  test('thirds written with three digits are a whole width', () => {
    const thirds = { ...setup, lanes: [1, 2, 3].map((n) => ({ productId: `${n}`, widthShare: 0.333, bagPounds: 10 })) };
    expect(level([20, 25, 30], thirds).lanes.map(({ stackIn }) => stackIn)).toEqual([24.5, 19.5, 14.5]);
  });
});

describe('how sure', () => {
  test('more probes see more columns', () => {
    const lane = oneLane.lanes[0]!;
    const one = stackSdIn(oneLane, lane, { weights: [[0, 1]], seen: 'own' });
    const three = stackSdIn(oneLane, lane, { weights: [[0, 1 / 3], [1, 1 / 3], [2, 1 / 3]], seen: 'own' });
    expect(three).toBeCloseTo(one / Math.sqrt(3), 9);
  });

  test('before calibration the pounds are sure to about a fifth, and bags say "about"', () => {
    const half = level([23.75, 23.75, 23.75], oneLane);
    expect(half.sdPounds / half.pounds).toBeGreaterThan(0.2);
    expect(half.sdPounds / half.pounds).toBeLessThan(0.22);
    expect(half.lanes[0]?.about).toBe(true);
    expect(levelOf(oneLane, [44, 44, 44], 0)?.lanes[0]?.about).toBe(true);
  });
});

describe('what cannot be', () => {
  test.each([
    ['shares', { ...setup, lanes: [{ productId: 'a', widthShare: 0.7, bagPounds: 7 }] }],
    ['no-lanes', { ...setup, lanes: [] }],
    ['probe-outside', { ...setup, mount: { ...setup.mount, probesIn: [10, 70] } }],
    ['no-stack', { ...setup, mount: { ...setup.mount, channelDropIn: 50 } }],
    ['no-stack', { ...setup, mount: { ...setup.mount, rackIn: -1 } }],
    ['no-stack', { ...setup, mount: { ...setup.mount, headroomIn: Number.NaN } }],
    ['shares', { ...oneLane, lanes: [{ productId: 'a', widthShare: 1, bagPounds: 0 }] }],
    ['model', { ...setup, model: { ...setup.model, ratedPounds: Infinity } }],
    ['no-probes', { ...setup, mount: { ...setup.mount, probesIn: [] } }],
    ['model', { ...setup, model: { ...setup.model, insideDepthIn: 0 } }],
  ])('%s is named and gives no level', (fault, given) => {
    expect(setupFaults(given)).toContain(fault);
    expect(levelOf(given, [20, 20, 20])).toBeNull();
  });

  const distance = fc.oneof(fc.double({ noNaN: false }), fc.double({ min: -10, max: 80, noNaN: true }), fc.constant(null));
  test('any distances: pounds stay within the room for solid ice, shares within 0 and 1', () => {
    fc.assert(
      fc.property(fc.array(distance, { maxLength: 5 }), fc.double({ min: 100, max: 20_000, noNaN: true }), (distances, ratedPounds) => {
        const found = levelOf({ ...setup, model: { ...setup.model, ratedPounds } }, distances);
        if (!found) return;
        const room = 58 * 27 * usableStackIn(setup) * ICE_POUNDS_PER_CUBIC_INCH;
        expect(found.pounds).toBeLessThanOrEqual(room + 1e-6);
        expect(found.share).toBeGreaterThanOrEqual(0);
        expect(found.share).toBeLessThanOrEqual(1 + 1e-9);
        expect(Number.isFinite(found.sdPounds)).toBe(true);
      }),
    );
  });
});
