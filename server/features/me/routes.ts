import { api } from '../../contract';
import { problem } from '../../http/problem';
import { route } from '../../http/route';
import { presentMe } from './present';

export const meRoutes = [
  route(api.me.read, ({ system, personId, seen, now }) => presentMe(system, personId, now, seen?.producer.id)),

  route(api.me.update, ({ system, personId }, { body }) => {
    system.setPerson(personId, body);
    return undefined;
  }),

  // Where somebody is signed in is theirs alone.
  route(api.me.sessions, ({ system, personId, seen, sessionHandle, now }) => ({
    sessions: seen ? [] : system.sessionsOf(personId, now).map(({ handle, device, createdAt, seenAt }) => ({
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
