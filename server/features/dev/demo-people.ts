import { asc, eq, memberships, people, producers, type Database } from '../../db';
import { acrossProducers } from '../../db/statement-hook';

/** Everybody who can be signed in with one press, by producer and role. */
export const demoPeople = (db: Database) =>
  acrossProducers('the demo shows everybody of every producer', () =>
    db
      .select({
        email: people.email,
        name: people.name,
        language: people.language,
        role: memberships.role,
        producer: producers.name,
        slug: producers.slug,
      })
      .from(memberships)
      .innerJoin(people, eq(people.id, memberships.personId))
      .innerJoin(producers, eq(producers.id, memberships.producerId))
      .orderBy(asc(producers.createdAt), asc(memberships.role), asc(people.name))
      .all(),
  );
