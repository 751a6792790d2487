import type { Services } from '../http/context';
import { importReadings } from '../telemetry/import-readings';
import type { Sorted } from '../telemetry/readings-of';
import type { DemoProducer } from './data/producers';

const MINUTE = 60_000;

/** Two sensors on a bench that hang in no freezer yet, and readings that were not believed. */
export function createStrays({ db, now, newId, system }: Services, { serialPrefix }: DemoProducer, producerId: string): void {
  const at = now();
  const bench = (number: number, minutes: number, airC: number) => ({
    serial: `${serialPrefix}${number}`,
    at: at - minutes * MINUTE,
    probes: [1.219, 1.222, 1.217],
    airC,
    supplyV: 12.1,
    conflict: false,
  });
  const sorted: Sorted = {
    readings: [bench(9001, 22, 21.4), bench(9002, 61, 20.9), bench(9002, 31, 21)],
    quarantined: [
      { device: `${serialPrefix}9002`, at: at - 91 * MINUTE, reason: 'negative-distance', records: ['probe2'] },
      { device: `${serialPrefix}0012`, at: at + 372 * MINUTE, reason: 'too-far-ahead', records: ['probe1', 'probe2', 'probe3', 'air'] },
      { device: `${serialPrefix}0007`, at: at - 240 * MINUTE, reason: 'wrong-unit', records: ['air'] },
    ],
    ignored: 0,
  };
  importReadings(db, { now, newId, nextSensorNo: system.nextSensorNo }, producerId, sorted);
}
