import * as z from 'zod/mini';
import { fault, id, instant, nextCursor, paging, producerParams, withProducer, words } from './common';
import { endpoint } from './endpoint';
import { quarantineReasons } from './telemetry';

const key = z.object({
  id,
  name: z.string(),
  createdAt: instant,
  lastUsedAt: z.nullable(instant),
  /** From then on it opens nothing; in the future while a successor takes over. */
  endsAt: z.nullable(instant),
});
export type TelemetryKey = z.output<typeof key>;

export const listKeys = endpoint({
  id: 'sensors.listKeys',
  method: 'get',
  path: '/api/:producer/telemetry-keys',
  access: { kind: 'may', action: 'read', subject: 'TelemetryKey' },
  params: producerParams,
  result: z.object({ keys: z.array(key) }),
  problems: [],
});

/** A new key, shown in this answer and never again. One that `replaces` another leaves it some hours to be replaced in. */
export const createKey = endpoint({
  id: 'sensors.createKey',
  method: 'post',
  path: '/api/:producer/telemetry-keys',
  access: { kind: 'may', action: 'create', subject: 'TelemetryKey' },
  params: producerParams,
  body: z.strictObject({
    name: words(80, 1),
    replaces: z._default(z.nullable(id), null),
    overlapHours: z._default(z.int(fault('number')).check(z.minimum(0, fault('number')), z.maximum(720, fault('number'))), 48),
  }),
  status: 201,
  result: z.object({ key, secret: z.string() }),
  problems: ['bad-input', 'not-found', 'not-allowed'],
});

export const revokeKey = endpoint({
  id: 'sensors.revokeKey',
  method: 'delete',
  path: '/api/:producer/telemetry-keys/:keyId',
  access: { kind: 'may', action: 'delete', subject: 'TelemetryKey' },
  params: withProducer({ keyId: id }),
  answer: 'nothing',
  problems: ['not-found', 'not-allowed'],
});

/** Sensors that speak and hang in no freezer. */
export const listUnclaimed = endpoint({
  id: 'sensors.listUnclaimed',
  method: 'get',
  path: '/api/:producer/unclaimed-sensors',
  access: { kind: 'may', action: 'read', subject: 'Sensor' },
  params: producerParams,
  query: z.strictObject(paging),
  result: z.object({
    sensors: z.array(z.object({ id, serial: z.string(), firstHeardAt: z.nullable(instant), lastReadingAt: z.nullable(instant) })),
    next: nextCursor,
  }),
  problems: ['bad-input'],
});

/** Sensors whose serial contains what was typed, in whatever freezer, the unclaimed first. */
export const findSensors = endpoint({
  id: 'sensors.find',
  method: 'get',
  path: '/api/:producer/sensors',
  access: { kind: 'may', action: 'read', subject: 'Sensor' },
  params: producerParams,
  query: z.strictObject({ q: z.string().check(z.minLength(1, fault('required')), z.maxLength(120)) }),
  result: z.object({
    /** At most twenty. */
    sensors: z.array(
      z.object({
        id,
        serial: z.string(),
        lastReadingAt: z.nullable(instant),
        /** Channels of its last reading. */
        probes: z.int(),
        freezer: z.nullable(z.object({ id, name: z.string(), store: z.string() })),
      }),
    ),
  }),
  problems: ['bad-input'],
});

/** Readings that were not believed, youngest first. */
export const listQuarantined = endpoint({
  id: 'sensors.listQuarantined',
  method: 'get',
  path: '/api/:producer/quarantined-readings',
  access: { kind: 'may', action: 'read', subject: 'Sensor' },
  params: producerParams,
  query: z.strictObject(paging),
  result: z.object({
    readings: z.array(
      z.object({
        id: z.string(),
        serial: z.string(),
        at: z.nullable(z.int()),
        reason: z.enum(quarantineReasons),
        records: z.array(z.string()),
        receivedAt: instant,
      }),
    ),
    next: nextCursor,
  }),
  problems: ['bad-input'],
});
