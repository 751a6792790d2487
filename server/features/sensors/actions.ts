import type { createKey as createEndpoint, TelemetryKey } from '../../contract/sensors';
import type { Body } from '../../contract/endpoint';
import { telemetryKeys } from '../../db';
import type { ProducerContext } from '../../http/context';
import { problem } from '../../http/problem';
import { newTelemetryKey } from '../telemetry/new-key';

const HOUR_MS = 3_600_000;

/** Makes a key; the one it replaces goes on opening the door for as long as was asked. Answers its id and, once, itself. */
export function createKey({ act, now, newId, newSecret }: ProducerContext, { name, replaces, overlapHours }: Body<typeof createEndpoint>) {
  return act('create-telemetry-key', (tx) => {
    const id = newId();
    const secret = newTelemetryKey(tx, { id, key: newSecret(), name, now });
    if (replaces) {
      const old = tx.db.find(telemetryKeys, replaces);
      if (!old || hasEnded(old, now)) throw problem('not-found');
      const endsAt = Math.min(old.revokedAt ?? Infinity, now + overlapHours * HOUR_MS);
      tx.db.update(telemetryKeys, replaces, { revokedAt: endsAt });
      tx.audit('TelemetryKey', replaces, { endsAt, replacedBy: id });
    }
    return { id, secret };
  });
}

/** From now on the key opens nothing. */
export function revokeKey({ act, now }: ProducerContext, id: string): void {
  act('revoke-telemetry-key', (tx) => {
    const key = tx.db.find(telemetryKeys, id);
    if (!key || hasEnded(key, now)) throw problem('not-found');
    tx.authorise('delete', 'TelemetryKey', { id });
    tx.db.update(telemetryKeys, id, { revokedAt: now });
    tx.audit('TelemetryKey', id, { endsAt: now });
  });
}

type KeyRow = typeof telemetryKeys.$inferSelect;
const hasEnded = ({ revokedAt }: Pick<KeyRow, 'revokedAt'>, now: number): boolean => revokedAt !== null && revokedAt <= now;

export const presentKey = ({ id, name, createdAt, lastUsedAt, revokedAt }: Omit<KeyRow, 'producerId' | 'keyHash'>): TelemetryKey => ({
  id,
  name,
  createdAt,
  lastUsedAt,
  endsAt: revokedAt,
});
