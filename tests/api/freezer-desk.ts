import { afterEach, beforeEach } from 'vitest';
import { and, asc, auditEntries, desc, eq, installs, producerDb, type ProducerDb } from '../../server/db';
import { alder, alderPeople } from '../cast';
import { idOf } from '../factories';
import { browserOf, testApp, type Agent, type TestApp } from '../support/server';

export const at = `/api/${alder.slug}`;
export const id = (thing: string) => idOf(alder.namespace, thing);
export const front = id('lantern freezer');
export const problemOf = (type: string) => ({ type: `urn:nilas:problem:${type}` });

interface Listed {
  id: string;
  serial: string | null;
  pounds: number | null;
  lanes: unknown[];
}

/** A portal of its own for each test of the file, its admin, and what they ask about freezers. */
export function freezerDesk() {
  const bed = {} as { server: TestApp; ada: Agent; db: ProducerDb };
  beforeEach(async () => {
    bed.server = await testApp('alder-and-birch');
    bed.ada = browserOf(bed.server, alderPeople.admin);
    bed.db = producerDb(bed.server.db, idOf(alder.slug, 'producer'));
  });
  afterEach(() => bed.server.close());
  return {
    bed,
    change: (freezer: string, body: object) => bed.ada.patch(`${at}/freezers/${freezer}`).send(body),
    /** Which sensors hang or hung in a freezer, the oldest first. */
    hung: (freezerId: string) => {
      const { sensorId, probesIn, from, to } = installs;
      return bed.db.select({ sensorId, probesIn, from, to }).from(installs).where(eq(installs.freezerId, freezerId)).orderBy(asc(from)).all();
    },
    /** What the trail says of a freezer, the youngest first. */
    trailOf: (freezerId: string) =>
      bed.db
        .select({ act: auditEntries.act, changes: auditEntries.changes })
        .from(auditEntries)
        .where(and(eq(auditEntries.subject, 'Freezer'), eq(auditEntries.subjectId, freezerId)))
        .orderBy(desc(auditEntries.seq))
        .all()
        .map(({ act, changes }) => ({ act, changes: JSON.parse(changes) })),
    listed: async (store: string): Promise<Listed[]> => (await bed.ada.get(`${at}/freezers?store=${id(store)}`).expect(200)).body.freezers,
  };
}
