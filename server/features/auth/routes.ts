import { createHash } from 'node:crypto';
import type { Request } from 'express';
import { api } from '../../contract';
import { limit } from '../../http/limits';
import { route } from '../../http/route';
import { seenBy, stopSeeing } from '../../http/seeing';
import { endOwnSession, startSession, whoIs } from '../../http/session';
import { presentMe } from '../me/present';
import type { MagicLink } from './magic-link';

const addressed = (req: Request): string => {
  const email: unknown = req.body?.email;
  return createHash('sha256').update(typeof email === 'string' ? email.trim().toLowerCase() : '').digest('base64url');
};

export const authRoutes = (links: MagicLink) => [
  route(
    api.auth.requestLink,
    async (_services, { body, req, res }) => {
      await links.request(req, res, body.email, body.next);
      return undefined;
    },
    ({ patience }) => [
      limit({ seconds: 600, most: 30 }, patience),
      limit({ seconds: 600, most: 6, key: addressed }, patience),
    ],
  ),

  route(
    api.auth.signIn,
    async (services, { body, req, res }) => {
      await startSession(services, req, await links.accept(req, res, body));
      return undefined;
    },
    ({ patience }) => [limit({ seconds: 600, most: 40 }, patience)],
  ),

  route(api.auth.readSession, (services, { req }) => {
    const found = whoIs(services, req);
    const seen = found && seenBy(services, req);
    return { me: found && presentMe(services.system, seen?.membership.personId ?? found.personId, services.now(), seen?.producer.id) };
  }),

  route(api.auth.readSeeing, (services, { req }) => {
    const seen = whoIs(services, req) && seenBy(services, req);
    const person = seen && services.system.activePerson(seen.membership.personId);
    return { seeing: seen && person ? { producer: seen.producer.slug, memberId: seen.memberId, name: person.name, until: seen.until } : null };
  }),

  route(api.auth.endSeeing, (_ctx, { req }) => {
    stopSeeing(req);
    return undefined;
  }),

  route(api.auth.signOut, async (_ctx, { req }) => {
    await endOwnSession(req);
    return undefined;
  }),
];
