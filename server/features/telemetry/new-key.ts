import { telemetryKeys } from '../../db';
import type { ActionTx } from '../../http/context';
import { hash } from '../../http/session';

interface NewKey {
  id: string;
  key: string;
  name: string;
  now: number;
}

/** Makes a bearer key for a telemetry source. The key is answered once and kept as a hash only. */
export function newTelemetryKey(tx: ActionTx, { id, key, name, now }: NewKey): string {
  tx.authorise('create', 'TelemetryKey', {});
  tx.db.insert(telemetryKeys, { id, name, keyHash: hash(key), createdAt: now });
  tx.audit('TelemetryKey', id, { name });
  return key;
}
