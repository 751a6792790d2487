import * as z from 'zod/mini';
import { endpoint } from './endpoint';

export const senmlType = 'application/senml+json';
export const maxPackBytes = 1024 * 1024;
export const maxPackRecords = 5000;

/** Why a reading, or a part of one, was not believed. */
export const quarantineReasons = [
  'no-device',
  'no-number',
  'wrong-unit',
  'negative-distance',
  'impossible-value',
  'too-far-ahead',
  'too-old',
] as const;
export type QuarantineReason = (typeof quarantineReasons)[number];

const reading = z.object({
  /** The device's `urn:dev:` name, or what was sent in its place. */
  device: z.string(),
  /** RFC 3339, or null where no time could be read. */
  at: z.nullable(z.string()),
  reason: z.enum(quarantineReasons),
  /** The record names the reason speaks of. */
  records: z.array(z.string()),
});

/**
 * SenML (RFC 8428) in. The device is named by a `urn:dev:` base name (RFC 9039); `probe1`…`probeN` count from the
 * left in m, `air` is in Cel, `supply` in V. A reading is one sensor at one time: its good records are accepted and
 * its bad ones quarantined, so a reading may count under both.
 */
export const ingest = endpoint({
  id: 'telemetry.ingest',
  method: 'post',
  path: '/api/telemetry',
  access: { kind: 'telemetry-key' },
  bodyType: senmlType,
  body: z.array(z.unknown()),
  status: 202,
  result: z.object({
    accepted: z.int(),
    duplicate: z.int(),
    quarantined: z.int(),
    /** Records with a name this door does not know. */
    ignored: z.int(),
    reasons: z.array(reading),
  }),
  problems: ['bad-key', 'malformed-json', 'senml-invalid', 'too-large', 'too-many-records', 'wrong-media-type', 'storage-full', 'too-many-requests'],
});
