import type { Request } from 'express';
import { abilityFor } from '../contract/ability';
import type { Endpoint } from '../contract/endpoint';
import type { SystemDb } from '../db';
import type { Services } from './context';
import { problem } from './problem';

/** A session that is answered as somebody else's would be, and may only read. */
export interface Seeing {
  /** The producer's; nothing of any other producer is seen. */
  slug: string;
  memberId: string;
  until: number;
}

declare module 'express-session' {
  interface SessionData {
    seeing?: Seeing;
  }
}

const SEEING_MS = 30 * 60_000;

export function beginSeeing(req: Request, slug: string, memberId: string, now: number): void {
  req.session.seeing = { slug, memberId, until: now + SEEING_MS };
}

export function stopSeeing(req: Request): void {
  delete req.session.seeing;
}

export type Seen = Omit<Seeing, 'slug'> & ReturnType<SystemDb['membershipsOf']>[number];

/** Whom the session sees as: only while both work there and the one who looks still may. */
export function seenBy({ system, now }: Services, req: Request): Seen | null {
  const { seeing, personId } = req.session;
  if (!seeing || !personId || seeing.until <= now()) return null;
  const own = system.membershipAt(personId, seeing.slug);
  const may = own && abilityFor(system.viewerOf(own.membership, now())).can('update', 'Person');
  const seen = may && system.memberAt(own.producer.id, seeing.memberId);
  return seen && system.activePerson(seen.membership.personId) ? { memberId: seeing.memberId, until: seeing.until, ...seen } : null;
}

/** Reads go through; of what changes something only the way out does. */
export function refuseWhileSeeing({ access, method }: Endpoint, seen: Seen | null): void {
  if (!seen || method === 'get') return;
  if (access.kind === 'may' || (access.kind === 'person' && !access.evenSeeing)) throw problem('seeing-only');
}
