import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { bagOutlines, bagsDrawn } from '../../../src/freezer/section-bags';
import { drawingWidth, layOut, rowsWithoutTouch } from '../../../src/freezer/section-geometry';

const freezer = { widthIn: 54, heightIn: 52, channelDropIn: 4, rackIn: 3 };
const lane = { widthShare: 1, label: '7 lb', bags: 88, about: false, stackIn: 20, usableStackIn: 40, bagPounds: 7, low: false };

describe('bags drawn in a lane', () => {
  test.each([1, 2, 14, 30, 61, 88])('%i bags are drawn one by one', (bags) => {
    expect(bagsDrawn(bagOutlines(bags, { x: 0, y: 0, width: 115, height: 110 }))).toBe(bags);
  });

  test('too many to see are fewer, never more', () => {
    const drawn = bagsDrawn(bagOutlines(900, { x: 0, y: 0, width: 115, height: 110 }));
    expect(drawn).toBeGreaterThan(100);
    expect(drawn).toBeLessThan(900);
  });

  test('none without bags or without height', () => {
    expect(bagOutlines(0, { x: 0, y: 0, width: 115, height: 110 })).toBe('');
    expect(bagOutlines(5, { x: 0, y: 0, width: 115, height: 0 })).toBe('');
  });

  test('any lane: never more than it holds, and always some', () => {
    const sizes = fc.record({ bags: fc.integer({ min: 1, max: 2000 }), width: fc.integer({ min: 20, max: 240 }), height: fc.integer({ min: 4, max: 250 }) });
    fc.assert(
      fc.property(sizes, ({ bags, width, height }) => {
        const drawn = bagsDrawn(bagOutlines(bags, { x: 0, y: 0, width, height }));
        expect(drawn).toBeGreaterThan(0);
        expect(drawn).toBeLessThanOrEqual(bags);
      }),
    );
  });
});

describe('where things lie', () => {
  test('a probe whose distance is what the stack leaves ends at the top of the bags', () => {
    // 52 high - 4 channel - 3 rack - 25 seen = 20 of stack.
    const section = layOut(freezer, [lane], [{ probe: { xIn: 27, distanceIn: 25 }, text: '25″' }]);
    expect(section.probes[0]?.endY).toBeCloseTo(section.lanes[0]?.stack.y ?? NaN, 6);
    expect(section.probes[0]?.x).toBeCloseTo(drawingWidth / 2, 6);
  });

  test('a distance beyond the floor ends at the floor, a silent probe nowhere', () => {
    const section = layOut(freezer, [lane], [
      { probe: { xIn: 10, distanceIn: 47 }, text: '47″' },
      { probe: { xIn: 40, distanceIn: null }, text: 'no signal' },
    ]);
    expect(section.probes.map(({ endY }) => endY)).toEqual([section.floorY, null]);
  });

  test('labels in one row never touch', () => {
    const spot = fc.record({ left: fc.integer({ min: 0, max: 200 }), width: fc.integer({ min: 20, max: 70 }) });
    fc.assert(
      fc.property(fc.array(spot, { maxLength: 8 }), (spots) => {
        const rows = rowsWithoutTouch(spots);
        spots.forEach((a, i) =>
          spots.slice(i + 1).forEach((b, j) => {
            if (rows[i] === rows[i + 1 + j]) expect(a.left + a.width <= b.left || b.left + b.width <= a.left).toBe(true);
          }),
        );
      }),
    );
  });
});
