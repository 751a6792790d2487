import { api } from '../../contract';
import { problem } from '../../http/problem';
import { route } from '../../http/route';
import { presentMe } from './present';

export const meRoutes = [
  route(api.me.read, ({ system, personId, now }) => presentMe(system, personId, now)),

  route(api.me.update, ({ system, personId }, { body }) => {
    system.setPerson(personId, body);
    return undefined;
  }),

  route(api.me.sessions, ({ system, personId, sessionHandle, now }) => ({
    sessions: system.sessionsOf(personId, now).map(({ handle, device, createdAt, seenAt }) => ({
      handle,
      device,
      createdAt,
      seenAt,
      current: handle === sessionHandle,
    })),
  })),

  route(api.me.endSession, ({ system, personId }, { params }) => {
    if (system.endSession(personId, params.handle) === 0) throw problem('not-found');
    return undefined;
  }),
];
