import { randomBytes } from 'node:crypto';
import { telemetryKeys } from '../../db';
import type { ActionTx } from '../../http/context';
import { hash } from '../../http/session';

/** Makes a bearer key for a telemetry source. The key is answered once and kept as a hash only. */
export function newTelemetryKey(tx: ActionTx, id: string, name: string, now: number): string {
  tx.authorise('create', 'TelemetryKey', {});
  const key = randomBytes(32).toString('base64url');
  tx.db.insert(telemetryKeys, { id, name, keyHash: hash(key), createdAt: now });
  tx.audit('TelemetryKey', id, { name });
  return key;
}
