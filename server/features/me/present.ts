import { abilityFor, actions, subjects } from '../../contract/ability';
import type { Result } from '../../contract/endpoint';
import type { me } from '../../contract/auth';
import type { SystemDb } from '../../db';
import { dayOf } from '../../domain/civil';
import { problem } from '../../http/problem';

/** A person with every producer they work with, or with one `only`, and what the rules allow them there. */
export function presentMe(system: SystemDb, personId: string, now: number, only?: string): Result<typeof me> {
  const person = system.activePerson(personId);
  if (!person) throw problem('not-signed-in');
  return {
    person: { id: person.id, name: person.name, email: person.email, language: person.language },
    memberships: system.membershipsOf(personId).filter(({ producer }) => !only || producer.id === only).map(({ membership, producer }) => {
      const viewer = system.viewerOf(membership, now);
      const { slug, name, timeZone, language, urgentPhone, logo, serviceHours, holidays } = producer;
      const today = dayOf(now, timeZone);
      const ability = abilityFor(viewer);
      return {
        membershipId: viewer.membershipId,
        role: viewer.role,
        side: viewer.side,
        storeIds: viewer.storeIds,
        grants: viewer.grants,
        producer: { slug, name, timeZone, language, urgentPhone, logo, serviceHours, holidays: holidays.filter(({ day }) => day >= today) },
        abilities: subjects.flatMap((subject) => actions.filter((action) => ability.can(action, subject)).map((action) => `${action}:${subject}`)),
      };
    }),
  };
}
