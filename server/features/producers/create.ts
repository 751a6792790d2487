import type { Language } from '../../contract/words';
import { abilityFor } from '../../contract/ability';
import { memberships, people, producerDb, producers } from '../../db';
import type { Services } from '../../http/context';
import { runAction } from '../../http/run-action';
import { newTelemetryKey } from '../telemetry/new-key';

export interface NewProducer {
  name: string;
  slug: string;
  timeZone: string;
  language: Language;
  urgentPhone: string;
  adminName: string;
  adminEmail: string;
}

export interface MadeProducer {
  producerId: string;
  /** Shown once; only its hash is kept. */
  telemetryKey: string;
}

/** Creates a tenant with its first admin and first telemetry key. Answers null when the slug is taken. */
export function createProducer(services: Services, wanted: NewProducer): MadeProducer | null {
  const { db, system, newId, now } = services;
  const at = now();
  if (system.producerBySlug(wanted.slug)) return null;
  const { name, slug, timeZone, language, urgentPhone, adminName, adminEmail } = wanted;
  const producerId = newId();
  const membershipId = newId();
  return db.$client.transaction(() => {
    db.insert(producers).values({ id: producerId, slug, name, timeZone, language, urgentPhone, createdAt: at }).run();
    const personId = system.personByEmail(adminEmail)?.id ?? newId();
    db.insert(people).values({ id: personId, email: adminEmail, name: adminName, language, createdAt: at }).onConflictDoNothing().run();
    producerDb(db, producerId).insert(memberships, { id: membershipId, personId, role: 'producer-admin', side: 'producer', createdAt: at });
    const viewer = { personId, membershipId, role: 'producer-admin' as const, side: 'producer' as const, storeIds: [], grants: [] };
    const telemetryKey = runAction(services, { producerId, id: 'operator', ability: abilityFor(viewer) }, 'create-producer', at, (tx) => {
      tx.authorise('create', 'Settings', {});
      tx.audit('Settings', producerId, { slug });
      return newTelemetryKey(tx, { id: newId(), key: services.newSecret(), name: 'first source', now: at });
    });
    return { producerId, telemetryKey };
  })();
}
