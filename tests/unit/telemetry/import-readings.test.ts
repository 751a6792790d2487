import fc from 'fast-check';
import { beforeEach, describe, expect, test } from 'vitest';
import { openPipeline } from '../../../server/telemetry/pipeline';
import type { RawReading } from '../../../server/telemetry/readings-of';
import { freezerWithSensor, type FreezerBed } from '../../support/freezer-bed';

/** One freezer, one sensor, and readings of it in any order and number. */
let bed: FreezerBed;
beforeEach(() => {
  bed = freezerWithSensor();
});

const start = Date.UTC(2026, 5, 1, 6);
const inch = 0.0254;
const reading = (i: number, distanceIn: number, airC = -8): RawReading => ({
  serial: bed.serial,
  at: start + i * 30 * 60_000,
  probes: [distanceIn * inch, (distanceIn + 0.2) * inch, (distanceIn - 0.2) * inch],
  airC,
  supplyV: 11.9,
  conflict: false,
});

const importAll = (readings: RawReading[]) => bed.import({ readings, quarantined: [], ignored: 0 });

describe('importing readings', () => {
  test('a replay is all duplicates and changes nothing', () => {
    const day = Array.from({ length: 60 }, (_, i) => reading(i, 12 + i * 0.15));
    expect(importAll(day)).toEqual({ accepted: 60, duplicate: 0, quarantined: 0 });
    const before = bed.dump();
    expect(importAll(day)).toEqual({ accepted: 0, duplicate: 60, quarantined: 0 });
    expect(bed.dump()).toEqual(before);
  });

  test('any order, any packs, any repeats end in the same state', () => {
    const all = Array.from({ length: 48 }, (_, i) => reading(i, i < 30 ? 14 + i * 0.3 : 10 + (i - 30) * 0.3));
    const contradicted = [reading(5, 20), reading(40, 6, 2)];
    importAll([...all, ...contradicted]);
    const expected = bed.dump();
    fc.assert(
      fc.property(
        fc.shuffledSubarray([...all, ...contradicted, ...all.slice(0, 20)], { minLength: 70, maxLength: 70 }),
        fc.integer({ min: 1, max: 25 }),
        (shuffled, size) => {
          bed = freezerWithSensor();
          for (let from = 0; from < shuffled.length; from += size) importAll(shuffled.slice(from, from + size));
          expect(bed.dump()).toEqual(expected);
        },
      ),
      { numRuns: 12 },
    );
  });

  test('a reading in two parts becomes one', () => {
    importAll([{ ...reading(0, 12), airC: null, supplyV: null }]);
    expect(importAll([{ ...reading(0, 12), probes: [] }])).toEqual({ accepted: 1, duplicate: 0, quarantined: 0 });
    expect(bed.dump().readings).toHaveLength(1);
  });

  test('an unknown serial is kept as an unclaimed sensor', () => {
    importAll([{ ...reading(0, 12), serial: 'urn:dev:os:32473-unheard' }]);
    expect(bed.serials()).toContain('urn:dev:os:32473-unheard');
  });

  test('what was quarantined is kept once, with its reason', () => {
    const odd = { device: bed.serial, at: start, reason: 'negative-distance' as const, records: ['probe1'] };
    bed.import({ readings: [], quarantined: [odd], ignored: 0 });
    expect(bed.import({ readings: [], quarantined: [odd], ignored: 0 })).toEqual({ accepted: 0, duplicate: 0, quarantined: 1 });
    expect(bed.quarantine()).toEqual([{ serial: bed.serial, reason: 'negative-distance' }]);
  });
});

describe('group commit', () => {
  test('packs that come together are committed together, each with its own counts', async () => {
    const pipeline = openPipeline(bed.db, bed.door);
    const packs = Array.from({ length: 20 }, (_, i) => ({ readings: [reading(i, 12), reading(i + 1, 12)], quarantined: [], ignored: 0 }));
    const counts = await Promise.all(packs.map((pack) => pipeline.submit(bed.producerId, pack)));
    expect(counts.reduce((sum, one) => sum + one.accepted, 0)).toBe(21);
    expect(counts.reduce((sum, one) => sum + one.duplicate, 0)).toBe(19);
    await pipeline.stop();
  });

  test('a pack that cannot be written spoils no other', async () => {
    const pipeline = openPipeline(bed.db, bed.door);
    const good = pipeline.submit(bed.producerId, { readings: [reading(0, 12)], quarantined: [], ignored: 0 });
    const bad = pipeline.submit('no-such-producer', { readings: [reading(0, 12)], quarantined: [], ignored: 0 });
    await expect(bad).rejects.toThrow();
    await expect(good).resolves.toEqual({ accepted: 1, duplicate: 0, quarantined: 0 });
  });
});
