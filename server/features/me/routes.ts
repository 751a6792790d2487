import { abilityFor, actions, subjects } from '../../contract/ability';
import { api } from '../../contract';
import { problem } from '../../http/problem';
import { route } from '../../http/route';

export const meRoutes = [
  route(api.me.read, ({ system, personId, now }) => {
    const person = system.activePerson(personId);
    if (!person) throw problem('not-signed-in');
    return {
      person: { id: person.id, name: person.name, email: person.email, language: person.language },
      memberships: system.membershipsOf(personId).map(({ membership, producer }) => {
        const viewer = system.viewerOf(membership, now);
        const { slug, name, timeZone, language, urgentPhone } = producer;
        const ability = abilityFor(viewer);
        return {
          membershipId: viewer.membershipId,
          role: viewer.role,
          side: viewer.side,
          storeIds: viewer.storeIds,
          grants: viewer.grants,
          producer: { slug, name, timeZone, language, urgentPhone },
          abilities: subjects.flatMap((subject) =>
            actions.filter((action) => ability.can(action, subject)).map((action) => `${action}:${subject}`),
          ),
        };
      }),
    };
  }),

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
