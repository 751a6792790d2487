import express, { type RequestHandler } from 'express';
import { api } from '../../contract';
import { maxPackBytes, maxPackRecords, senmlType } from '../../contract/telemetry';
import type { Services } from '../../http/context';
import { limit } from '../../http/limits';
import { problem } from '../../http/problem';
import { route } from '../../http/route';
import { hash } from '../../http/session';
import { liveLimits, readingsOf, type Quarantined } from '../../telemetry/readings-of';
import { resolveSenml, SenmlError, type SenmlRecord } from '../../telemetry/senml';

declare module 'express-serve-static-core' {
  interface Locals {
    telemetryProducerId?: string;
  }
}

export const telemetryRoutes = [
  route(
    api.telemetry.ingest,
    async ({ pipeline, now }, { req, res }) => {
      const producerId = res.locals.telemetryProducerId;
      if (!producerId) throw problem('bad-key');
      const sorted = readingsOf(recordsOf(req.body, now() / 1000), now(), liveLimits);
      const counts = await pipeline.submit(producerId, sorted);
      return { ...counts, ignored: sorted.ignored, reasons: sorted.quarantined.map(present) };
    },
    (services) => [
      requireKey(services),
      limit({ seconds: 60, most: 3000, key: (req) => hash(req.get('authorization') ?? '') }, services.patience),
      refuseOtherTypes,
      express.json({ type: [senmlType, 'application/json'], limit: maxPackBytes, strict: false }),
    ],
  ),
];

const KEY = /^Bearer ([\w-]{20,100})$/i;
const MINUTE = 60_000;

/** Before the body is read: nobody without a key makes us parse a megabyte. */
function requireKey({ system, now }: Services): RequestHandler {
  return (req, res, next) => {
    const given = KEY.exec(req.get('authorization') ?? '')?.[1];
    const found = given ? system.producerOfKey(hash(given), now()) : undefined;
    if (!found) return next(problem('bad-key'));
    if (now() - (found.lastUsedAt ?? 0) > MINUTE) system.keyUsed(found.id, now());
    res.locals.telemetryProducerId = found.producerId;
    next();
  };
}

const refuseOtherTypes: RequestHandler = (req, _res, next) =>
  next(req.is([senmlType, 'application/json']) ? undefined : problem('wrong-media-type', { type: senmlType }));

function recordsOf(pack: unknown, now: number): SenmlRecord[] {
  if (Array.isArray(pack) && pack.length > maxPackRecords) throw problem('too-many-records', { most: maxPackRecords });
  try {
    return resolveSenml(pack, now);
  } catch (error) {
    if (error instanceof SenmlError) throw problem('senml-invalid', undefined, [{ pointer: error.pointer, fault: error.fault }]);
    throw error;
  }
}

const present = ({ device, at, reason, records }: Quarantined) => ({
  device,
  at: at === null ? null : rfc3339(at),
  reason,
  records,
});

function rfc3339(at: number): string | null {
  const date = new Date(at);
  return Number.isNaN(date.getTime()) ? null : date.toISOString();
}
