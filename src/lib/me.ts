import { useSuspenseQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { abilityFor, type Ability, type Action, type Subject } from '../../server/contract/ability';
import type { Membership } from '../../server/contract/auth';
import type { Result } from '../../server/contract/endpoint';
import { api } from '../../server/contract/index';
import { Problem } from '../api/call';
import { q } from '../api/query';

export type Me = Result<typeof api.me.read>;

export const meQuery = q(api.me.read, {});

/** The signed-in person; a page under the signed-in routes always has one. */
export const useMe = (): Me => useSuspenseQuery(meQuery).data;

/** The membership of the producer in the path, or of the producer last looked at where the path names none. */
export function useMembership(): Membership {
  const { producer } = useParams();
  const found = membershipAt(useMe(), producer);
  if (!found) throw new Problem('not-found', 404);
  return found;
}

/** What the person may do here, by the same rules as the server's. */
export function useAbility(): Ability {
  const { person } = useMe();
  const member = useMembership();
  return useMemo(() => abilityFor({ ...member, personId: person.id }), [person.id, member]);
}

/** Stops a page that only leads to an act the person may not do, as the server would stop the act. */
export function useMust(action: Action, subject: Subject) {
  if (!useAbility().can(action, subject)) throw new Problem('not-allowed', 403);
}

export const membershipAt = ({ memberships }: Me, producer: string | undefined): Membership | undefined =>
  producer ? memberships.find((member) => member.producer.slug === producer) : lastUsed(memberships);

const remembered = 'nilas.producer';

export const rememberProducer = (producer: string) => localStorage.setItem(remembered, producer);

const lastUsed = (memberships: Membership[]): Membership | undefined =>
  memberships.find((member) => member.producer.slug === localStorage.getItem(remembered)) ?? memberships[0];
