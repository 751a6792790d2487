/** One resolved record (RFC 8428 section 4.6): no base fields, absolute time in seconds. */
export interface SenmlRecord {
  name: string;
  unit: string | null;
  time: number;
  value: number | string | boolean | null;
  /** Where in the pack it stood. */
  index: number;
}

/** The pack as a whole cannot be understood; `pointer` says where. */
export class SenmlError extends Error {
  constructor(
    readonly pointer: string,
    readonly fault: 'not-a-pack' | 'not-a-record' | 'base-type' | 'unknown-version' | 'must-understand' | 'bad-time',
  ) {
    super(fault);
  }
}

interface Base {
  name: string;
  time: number;
  unit: string | null;
  value: number | null;
  version: number | null;
}

type Raw = Record<string, unknown>;

/** Times below 2^28 are relative to now (RFC 8428 section 4.5.3). */
const RELATIVE_BELOW = 2 ** 28;
/** Versions of SenML we speak (RFC 8428 section 4.4); lower ones are understood. */
const VERSION = 10;

/**
 * Resolves a parsed SenML pack. `now` is in seconds since 1970, for relative times. Fields that are not understood are
 * passed over, unless they end in `_` (section 4.4). A record's own bad value is left to the caller: only what spoils
 * the records after it throws `SenmlError`.
 */
export function resolveSenml(pack: unknown, now: number): SenmlRecord[] {
  if (!Array.isArray(pack)) throw new SenmlError('', 'not-a-pack');
  const base: Base = { name: '', time: 0, unit: null, value: null, version: null };
  return pack.flatMap((raw: unknown, index) => {
    if (!isObject(raw)) throw new SenmlError(`/${index}`, 'not-a-record');
    const unknown = Object.keys(raw).find((key) => key.endsWith('_'));
    if (unknown !== undefined) throw new SenmlError(`/${index}/${unknown}`, 'must-understand');
    takeBase(base, raw, index);
    return carriesValue(raw, base) ? [resolved(raw, base, index, now)] : [];
  });
}

function takeBase(base: Base, raw: Raw, index: number): void {
  const at = (key: string, isType: (value: unknown) => boolean) => {
    if (!(key in raw)) return false;
    if (!isType(raw[key])) throw new SenmlError(`/${index}/${key}`, 'base-type');
    return true;
  };
  // Each cast stands behind the check of its type just above.
  if (at('bn', isString)) base.name = raw.bn as string;
  if (at('bt', isNumber)) base.time = raw.bt as number;
  if (at('bu', isString)) base.unit = raw.bu as string;
  if (at('bv', isNumber)) base.value = raw.bv as number;
  at('bs', isNumber);
  if (!at('bver', isNumber)) return;
  const version = raw.bver as number;
  if (!Number.isInteger(version) || version < 1 || version > VERSION) throw new SenmlError(`/${index}/bver`, 'unknown-version');
  if (base.version !== null && base.version !== version) throw new SenmlError(`/${index}/bver`, 'unknown-version');
  base.version = version;
}

const VALUES = ['v', 'vs', 'vb', 'vd', 's'];
const carriesValue = (raw: Raw, base: Base): boolean => VALUES.some((key) => key in raw) || ('n' in raw && base.value !== null);

function resolved(raw: Raw, base: Base, index: number, now: number): SenmlRecord {
  if ('t' in raw && !isNumber(raw.t)) throw new SenmlError(`/${index}/t`, 'bad-time');
  if ('n' in raw && !isString(raw.n)) throw new SenmlError(`/${index}/n`, 'base-type');
  const sum = base.time + (isNumber(raw.t) ? raw.t : 0);
  return {
    name: base.name + (isString(raw.n) ? raw.n : ''),
    unit: isString(raw.u) ? raw.u : base.unit,
    time: sum < RELATIVE_BELOW ? now + sum : sum,
    value: valueOf(raw, base),
    index,
  };
}

function valueOf(raw: Raw, base: Base): SenmlRecord['value'] {
  if ('v' in raw) return isNumber(raw.v) ? raw.v + (base.value ?? 0) : null;
  if (isString(raw.vs)) return raw.vs;
  if (typeof raw.vb === 'boolean') return raw.vb;
  if (isString(raw.vd)) return raw.vd;
  return 's' in raw ? null : base.value;
}

const isObject = (value: unknown): value is Raw => typeof value === 'object' && value !== null && !Array.isArray(value);
const isString = (value: unknown): value is string => typeof value === 'string';
const isNumber = (value: unknown): value is number => typeof value === 'number' && Number.isFinite(value);
