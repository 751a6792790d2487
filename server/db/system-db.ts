import { and, eq, gt, isNull, lt, or, sql } from 'drizzle-orm';
import type { Viewer } from '../contract/ability';
import type { Language } from '../contract/words';
import type { Database } from './open';
import { memberships, membershipScopes, nextTrucks, people, producers, requests, sensors, sessions, signInLinks, stores, telemetryKeys } from './schema';
import { acrossProducers } from './statement-hook';
import { liveStates } from '../contract/words';

export type Person = typeof people.$inferSelect;
export type Producer = typeof producers.$inferSelect;

/** The few named acts that reach across producers: sign-in, memberships, telemetry routing. */
export function systemDb(db: Database) {
  const { activePerson, membershipsOf, membershipAt } = everyRequest(db);
  const producerOf = keptProducers(db);
  return {
    personByEmail: (email: string): Person | undefined =>
      db.select().from(people).where(and(eq(people.email, email), isNull(people.deactivatedAt))).get(),

    activePerson: (id: string): Person | undefined => activePerson.get({ id }),

    producerBySlug: (slug: string): Producer | undefined => db.select().from(producers).where(eq(producers.slug, slug)).get(),

    /** Which producers a person works with, in the order they were joined. */
    membershipsOf: (personId: string) =>
      acrossProducers('a person chooses among their producers', () => membershipsOf.all({ personId })),

    /** What a person is at the producer of a slug. */
    membershipAt: (personId: string, slug: string) => {
      const found = acrossProducers('a person names one of their producers', () => membershipAt.get({ personId, slug }));
      if (!found) return undefined;
      const { producerId, version, ...membership } = found;
      return { membership: { ...membership, producerId }, producer: producerOf(producerId, version) };
    },

    /** A member of a producer with the producer, while they work there. */
    memberAt: (producerId: string, memberId: string) =>
      db
        .select({ membership: memberships, producer: producers })
        .from(memberships)
        .innerJoin(producers, eq(producers.id, memberships.producerId))
        .where(and(eq(memberships.producerId, producerId), eq(memberships.id, memberId), isNull(memberships.deactivatedAt)))
        .get(),

    producerIds: (): string[] => db.select({ id: producers.id }).from(producers).all().map(({ id }) => id),

    producerById: (id: string): Producer | undefined => db.select().from(producers).where(eq(producers.id, id)).get(),

    /** Whoever saw an older version is told before. */
    changeProducer: (id: string, patch: Partial<Omit<Producer, 'id' | 'slug' | 'version' | 'createdAt'>>): void => {
      db.update(producers).set({ ...patch, version: sql`${producers.version} + 1` }).where(eq(producers.id, id)).run();
    },

    /** The scope is worked out from what stands in the database now, so a change acts on the next request. */
    viewerOf: (membership: Member, now: number): Viewer => ({
      personId: membership.personId,
      membershipId: membership.id,
      role: membership.role,
      side: membership.side,
      grants: membership.grants,
      storeIds: scopeOf(db, membership, now),
    }),

    /** The producer whose telemetry key this is, or nothing once it has ended. */
    producerOfKey: (keyHash: string, now: number) =>
      acrossProducers('a key says which producer is speaking', () =>
        db
          .select({ id: telemetryKeys.id, producerId: telemetryKeys.producerId, lastUsedAt: telemetryKeys.lastUsedAt })
          .from(telemetryKeys)
          .where(and(eq(telemetryKeys.keyHash, keyHash), or(isNull(telemetryKeys.revokedAt), gt(telemetryKeys.revokedAt, now))))
          .get(),
      ),

    keyUsed: (id: string, now: number): void =>
      acrossProducers('the key was found by its hash', () => {
        db.update(telemetryKeys).set({ lastUsedAt: now }).where(eq(telemetryKeys.id, id)).run();
      }),

    nextSensorNo: (): number =>
      acrossProducers('sensor numbers are small integers of the installation', () =>
        db.select({ no: sql<number>`coalesce(max(${sensors.no}), 0) + 1` }).from(sensors).get(),
      )?.no ?? 1,

    addSignInLink: (link: typeof signInLinks.$inferInsert): void => {
      db.insert(signInLinks).values(link).run();
    },

    signInLinkByToken: (tokenHash: string) => db.select().from(signInLinks).where(eq(signInLinks.tokenHash, tokenHash)).get(),

    /** The youngest link still open that this browser asked for. */
    openLinkOfAsker: (askerHash: string, now: number) =>
      db
        .select()
        .from(signInLinks)
        .where(and(eq(signInLinks.askerHash, askerHash), isNull(signInLinks.usedAt), gt(signInLinks.expiresAt, now)))
        .orderBy(sql`${signInLinks.expiresAt} desc`)
        .limit(1)
        .get(),

    countTry: (id: string, most: number): boolean =>
      db
        .update(signInLinks)
        .set({ tries: sql`${signInLinks.tries} + 1` })
        .where(and(eq(signInLinks.id, id), lt(signInLinks.tries, most)))
        .run().changes === 1,

    /** Claims a link once: of any number at the same moment one wins. */
    claimLink: (id: string, now: number) =>
      db
        .update(signInLinks)
        .set({ usedAt: now })
        .where(and(eq(signInLinks.id, id), isNull(signInLinks.usedAt), gt(signInLinks.expiresAt, now)))
        .returning({ personId: signInLinks.personId, next: signInLinks.next })
        .get(),

    /** The person of this address, made where there is none; an address belongs to one person in all the installation. */
    personOf: (wanted: { id: string; email: string; name: string; language: Language }, now: number): string => {
      db.insert(people).values({ ...wanted, createdAt: now }).onConflictDoNothing({ target: people.email }).run();
      return db.select({ id: people.id }).from(people).where(eq(people.email, wanted.email)).get()?.id ?? wanted.id;
    },

    expireLinks: (before: number): number => db.delete(signInLinks).where(lt(signInLinks.expiresAt, before)).run().changes,

    setPerson: (id: string, patch: { language?: Language; name?: string }): void => {
      if (Object.keys(patch).length > 0) db.update(people).set(patch).where(eq(people.id, id)).run();
    },

    sessionsOf: (personId: string, now: number) =>
      db
        .select()
        .from(sessions)
        .where(and(eq(sessions.personId, personId), gt(sessions.expiresAt, now)))
        .orderBy(sql`${sessions.seenAt} desc`)
        .all(),

    endSession: (personId: string, handle: string): number =>
      db.delete(sessions).where(and(eq(sessions.personId, personId), eq(sessions.handle, handle))).run().changes,
  };
}

export type SystemDb = ReturnType<typeof systemDb>;

/** Asked with every request, so built once. */
function everyRequest(db: Database) {
  const { placeholder } = sql;
  const { id, personId, role, side, grants } = memberships;
  const activePerson = db
    .select()
    .from(people)
    .where(and(eq(people.id, placeholder('id')), isNull(people.deactivatedAt)))
    .prepare();
  const membershipsOf = acrossProducers('a person chooses among their producers', () =>
    db
      .select({ membership: memberships, producer: producers })
      .from(memberships)
      .innerJoin(producers, eq(producers.id, memberships.producerId))
      .where(and(eq(memberships.personId, placeholder('personId')), isNull(memberships.deactivatedAt)))
      .orderBy(memberships.createdAt, memberships.id)
      .prepare(),
  );
  const membershipAt = acrossProducers('a person names one of their producers', () =>
    db
      .select({ id, personId, role, side, grants, producerId: producers.id, version: producers.version })
      .from(producers)
      .innerJoin(memberships, eq(memberships.producerId, producers.id))
      .where(and(eq(producers.slug, placeholder('slug')), eq(memberships.personId, placeholder('personId')), isNull(memberships.deactivatedAt)))
      .prepare(),
  );
  return { activePerson, membershipsOf, membershipAt };
}

type Member = Pick<typeof memberships.$inferSelect, 'id' | 'producerId' | 'personId' | 'role' | 'side' | 'grants'>;

/** A producer as it was last read, until its version says that it changed. */
function keptProducers(db: Database): (id: string, version: number) => Producer {
  const kept = new Map<string, Producer>();
  return (id, version) => {
    const known = kept.get(id);
    if (known?.version === version) return known;
    const read = db.select().from(producers).where(eq(producers.id, id)).get();
    if (!read) throw new Error('a membership of no producer');
    // What a transaction wrote may yet be undone.
    if (!db.$client.inTransaction) kept.set(id, read);
    return read;
  };
}

function scopeOf(db: Database, member: Member, now: number): string[] {
  const { producerId, id, role } = member;
  if (role === 'store-manager' || role === 'district-rep') return assignedStores(db, producerId, id);
  if (role === 'driver') return stopsOfTheDay(db, producerId, now);
  if (role === 'technician') return visitStores(db, producerId, id);
  return [];
}

/** `cross join` begins with what is assigned, whatever SQLite thinks of the tables' sizes. */
function assignedStores(db: Database, producer: string, member: string): string[] {
  const ids = db.values<[string]>(
    sql`select m.store_id from ${membershipScopes} m
          where m.producer_id = ${producer} and m.membership_id = ${member} and m.store_id is not null
        union all select s.id from ${membershipScopes} m cross join ${stores} s on s.producer_id = ${producer} and s.district_id = m.district_id
          where m.producer_id = ${producer} and m.membership_id = ${member}
        union all select s.id from ${membershipScopes} m cross join ${stores} s on s.producer_id = ${producer} and s.account_id = m.account_id
          where m.producer_id = ${producer} and m.membership_id = ${member}`,
  );
  return [...new Set(ids.map(([id]) => id))].sort();
}

const DAY = 86_400_000;

/** Until routes exist, a driver's stops are the trucks of the coming and the past half day. */
const stopsOfTheDay = (db: Database, producer: string, now: number): string[] =>
  db
    .select({ id: nextTrucks.storeId })
    .from(nextTrucks)
    .where(and(eq(nextTrucks.producerId, producer), gt(nextTrucks.to, now - DAY / 2), lt(nextTrucks.from, now + DAY / 2)))
    .all()
    .map((row) => row.id);

const visitStores = (db: Database, producer: string, member: string): string[] =>
  db
    .selectDistinct({ id: requests.storeId })
    .from(requests)
    .where(
      and(
        eq(requests.producerId, producer),
        eq(requests.assigneeId, member),
        sql`${requests.state} in (${sql.join(liveStates.map((state) => sql`${state}`), sql`, `)})`,
      ),
    )
    .all()
    .map((row) => row.id);
