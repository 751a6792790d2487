import type { QuarantineReason } from '../contract/telemetry';
import type { SenmlRecord } from './senml';

/** One sensor at one time, in the sensor's own units; null where it said nothing. */
export interface RawReading {
  serial: string;
  at: number;
  probes: (number | null)[];
  airC: number | null;
  supplyV: number | null;
  /** Two words about this moment contradicted each other; the cautious one stands. */
  conflict: boolean;
}

export interface Quarantined {
  device: string;
  at: number | null;
  reason: QuarantineReason;
  records: string[];
}

export interface Sorted {
  readings: RawReading[];
  quarantined: Quarantined[];
  /** Records of other names. */
  ignored: number;
}

export interface AgeLimits {
  aheadMs: number;
  oldMs: number;
}
/** Of the live doors; import and history play come in behind them. */
export const liveLimits: AgeLimits = { aheadMs: 10 * 60_000, oldMs: 90 * 86_400_000 };

const KNOWN = /^(.*?)[:_/]?(probe([1-9]|1[0-6])|air|supply)$/s;
const DEVICE = /^urn:dev:[A-Za-z0-9][A-Za-z0-9\-._~:%;/]{0,180}$/i;
const UNITS = { probe: 'm', air: 'Cel', supply: 'V' } as const;
/** Beyond these no such sensor can speak the truth: 5 m deep, −90 to 90 °C, 0 to 60 V. */
const BOUNDS = { probe: [0, 5], air: [-90, 90], supply: [0, 60] } as const;

/** Sorts resolved records into readings, good parts from bad. The order of records does not matter. */
export function readingsOf(records: SenmlRecord[], now: number, limits: AgeLimits): Sorted {
  const readings = new Map<string, RawReading>();
  const quarantined = new Map<string, Quarantined>();
  let ignored = 0;
  for (const record of records) {
    const match = KNOWN.exec(record.name);
    if (!match) {
      ignored += 1;
      continue;
    }
    const [, device = '', name = '', probe] = match;
    const at = Math.round(record.time * 1000);
    const reason = faultOf(device, at, record, probe ? 'probe' : name === 'air' ? 'air' : 'supply', now, limits);
    if (reason) keepAside(quarantined, { device, at: Number.isSafeInteger(at) ? at : null, reason, records: [name] });
    // `faultOf` has found a finite number.
    else put(readings, canonical(device), at, name, probe ? Number(probe) : null, record.value as number);
  }
  return { readings: [...readings.values()], quarantined: [...quarantined.values()], ignored };
}

type Kind = keyof typeof UNITS;

function faultOf(device: string, at: number, { value, unit }: SenmlRecord, kind: Kind, now: number, limits: AgeLimits): QuarantineReason | null {
  if (!DEVICE.test(device)) return 'no-device';
  if (!Number.isSafeInteger(at) || at > now + limits.aheadMs) return 'too-far-ahead';
  if (at < now - limits.oldMs) return 'too-old';
  if (typeof value !== 'number') return 'no-number';
  if (unit !== null && unit !== UNITS[kind]) return 'wrong-unit';
  const [least, most] = BOUNDS[kind];
  if (kind === 'probe' && value < 0) return 'negative-distance';
  return value < least || value > most ? 'impossible-value' : null;
}

/** `urn` and `dev` are written in small letters whatever was sent (RFC 8141: both are case-insensitive). */
export const canonical = (device: string): string => device.replace(/^urn:dev:/i, 'urn:dev:');

function put(readings: Map<string, RawReading>, serial: string, at: number, name: string, probe: number | null, value: number): void {
  const key = `${serial} ${at}`;
  const reading = readings.get(key) ?? { serial, at, probes: [], airC: null, supplyV: null, conflict: false };
  readings.set(key, mergeReadings(reading, channel(name, probe, value)));
}

/** One record as a reading that says nothing else. */
function channel(name: string, probe: number | null, value: number): Channels {
  const probes = probe === null ? [] : [...Array<null>(probe - 1).fill(null), value];
  return { probes, airC: name === 'air' ? value : null, supplyV: name === 'supply' ? value : null, conflict: false };
}

function keepAside(quarantined: Map<string, Quarantined>, fault: Quarantined): void {
  const key = `${fault.device} ${fault.at} ${fault.reason}`;
  const known = quarantined.get(key);
  if (known) known.records.push(...fault.records);
  else quarantined.set(key, fault);
}

const larger = (a: number | null, b: number | null): number | null => (a === null ? b : b === null ? a : Math.max(a, b));
const smaller = (a: number | null, b: number | null): number | null => (a === null ? b : b === null ? a : Math.min(a, b));

export type Channels = Omit<RawReading, 'serial' | 'at'>;

/**
 * The join of two readings of one moment: by value and not by arrival, the cautious one stands (less ice, warmer,
 * weaker supply). Commutative, associative, and the same twice, so replays and any order end alike.
 */
export function mergeReadings<R extends Channels>(a: R, b: Channels): R {
  const length = Math.max(a.probes.length, b.probes.length);
  const probes = Array.from({ length }, (_, i) => larger(a.probes[i] ?? null, b.probes[i] ?? null));
  const conflict = a.conflict || b.conflict || contradicts(a, b);
  return { ...a, probes, airC: larger(a.airC, b.airC), supplyV: smaller(a.supplyV, b.supplyV), conflict };
}

function contradicts(a: Channels, b: Channels): boolean {
  const differ = (x: number | null, y: number | null) => x !== null && y !== null && x !== y;
  return differ(a.airC, b.airC) || differ(a.supplyV, b.supplyV) || a.probes.some((probe, i) => differ(probe, b.probes[i] ?? null));
}
