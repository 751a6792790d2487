import { api } from '../../contract';
import { desc, telemetryKeys } from '../../db';
import { quarantined, sensorsFound, unclaimedSensors } from '../../db/views/sensors';
import { orNotFound } from '../../http/problem';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';
import { createKey, presentKey, revokeKey } from './actions';

const { id, name, createdAt, lastUsedAt, revokedAt } = telemetryKeys;
const MOST_FOUND = 20;

export const sensorsRoutes = [
  route(api.sensors.listKeys, ({ db }) => ({
    keys: db.select({ id, name, createdAt, lastUsedAt, revokedAt }).from(telemetryKeys).orderBy(desc(createdAt), desc(id)).all().map(presentKey),
  })),

  route(api.sensors.createKey, (ctx, { body }) => {
    const made = createKey(ctx, body);
    const key = orNotFound(ctx.db.find(telemetryKeys, made.id));
    return { key: presentKey(key), secret: made.secret };
  }),

  route(api.sensors.revokeKey, (ctx, { params }) => {
    revokeKey(ctx, params.keyId);
    return undefined;
  }),

  route(api.sensors.listUnclaimed, ({ db }, { query }) => {
    const limit = query.limit ?? 50;
    const cursor = readCursor(query.after, ['string']);
    const page = pageOf(unclaimedSensors(db, cursor ? String(cursor[0]) : null, limit + 1), limit, ({ serial }) => [serial]);
    return { sensors: page.rows, next: page.next };
  }),

  route(api.sensors.find, ({ db }, { query }) => ({ sensors: sensorsFound(db, query.q, MOST_FOUND) })),

  route(api.sensors.listQuarantined, ({ db }, { query }) => {
    const limit = query.limit ?? 50;
    const cursor = readCursor(query.after, ['number', 'string']);
    const after = cursor ? ([Number(cursor[0]), String(cursor[1])] as const) : null;
    const page = pageOf(quarantined(db, after, limit + 1), limit, ({ receivedAt, id: own }) => [receivedAt, own]);
    return { readings: page.rows, next: page.next };
  }),
];
