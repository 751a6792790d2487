import { createHash } from 'node:crypto';
import { row, type Ability } from '../contract/ability';
import { auditEntries, desc, eq, memberships, outbox, producerDb, writeFleetRows, writeRiskLimit } from '../db';
import { composeMail } from '../features/mail/compose';
import { refreshState } from '../telemetry/refresh-state';
import type { ActionTx, Services } from './context';
import { problem } from './problem';

interface Actor {
  producerId: string;
  /** The acting membership, or a word for the system itself. */
  id: string;
  ability: Ability;
}

/**
 * Runs one business act: one transaction, at least one authorisation on a row, at least one line in the audit trail.
 * Mail goes to the outbox in the same transaction. The work is synchronous, so nothing outside can hide in it.
 */
export function runAction<T>(services: Services, actor: Actor, name: string, now: number, work: (tx: ActionTx) => T): T {
  const { db, newId } = services;
  const scoped = producerDb(db, actor.producerId);
  const done = { authorised: false, audited: false };
  const tx: ActionTx = {
    db: scoped,
    authorise(action, type, object) {
      if (!actor.ability.can(action, row(type, object))) throw problem('not-allowed');
      done.authorised = true;
    },
    audit(subject, subjectId, changes) {
      appendAudit(services, actor, { act: name, subject, subjectId, changes: JSON.stringify(changes), at: now });
      done.audited = true;
    },
    mail(message) {
      const producer = services.system.producerById(actor.producerId);
      const sender = { name: producer?.senderName ?? '', replyTo: producer?.replyTo ?? '' };
      const payload = JSON.stringify({ ...composeMail(message, services.config.baseUrl), sender });
      db.insert(outbox).values({ id: newId(), kind: 'mail', payload, dueAt: now, createdAt: now }).run();
    },
    freezerChanged: (freezerId) => refreshState(db, scoped, freezerId),
    listAnew: (part) => writeFleetRows(scoped, part),
    changeProducer: (patch) => {
      services.system.changeProducer(actor.producerId, patch);
      if (patch.riskLimit !== undefined) writeRiskLimit(scoped, patch.riskLimit);
    },
    speak: (memberId, language) => {
      const member = scoped.find(memberships, memberId);
      if (member) services.system.setPerson(member.personId, { language });
    },
    personOf: (wanted) => services.system.personOf({ id: newId(), ...wanted }, now),
  };
  return db.$client.transaction(() => {
    const result = work(tx);
    if (!done.authorised || !done.audited) throw new Error(`${name} wrote without authorisation or audit`);
    return result;
  }).immediate();
}

type Entry = Pick<typeof auditEntries.$inferInsert, 'act' | 'subject' | 'subjectId' | 'changes' | 'at'>;

function appendAudit({ db, newId }: Services, actor: Actor, entry: Entry): void {
  const last = db
    .select({ seq: auditEntries.seq, hash: auditEntries.hash })
    .from(auditEntries)
    .where(eq(auditEntries.producerId, actor.producerId))
    .orderBy(desc(auditEntries.seq))
    .limit(1)
    .get();
  const seq = (last?.seq ?? 0) + 1;
  const previousHash = last?.hash ?? '';
  const line = { ...entry, id: newId(), producerId: actor.producerId, actor: actor.id, seq, previousHash };
  db.insert(auditEntries).values({ ...line, hash: auditHash(line) }).run();
}

/** The chain: each line's hash covers its own content and the hash before it. */
export const auditHash = (line: Omit<typeof auditEntries.$inferInsert, 'hash'>): string =>
  createHash('sha256')
    .update(JSON.stringify([line.previousHash, line.producerId, line.seq, line.at, line.actor, line.act, line.subject, line.subjectId, line.changes]))
    .digest('hex');
