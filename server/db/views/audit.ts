import { sql, type SQL } from 'drizzle-orm';
import type { Subject } from '../../contract/ability';
import type { Role } from '../../contract/words';
import type { ProducerDb } from '../producer-db';
import { auditEntries, memberships, people } from '../schema';

export interface AuditRow {
  seq: number;
  at: number;
  actor: { id: string; name: string; role: Role } | null;
  act: string;
  subject: Subject;
  subjectId: string;
  changes: string;
}

export interface AuditFilter {
  subject?: Subject;
  subjectId?: string;
  actor?: string;
  /** Instants; `to` is the first that is too late. */
  from?: number;
  to?: number;
}

/** The trail, youngest first, below the sequence number `before`. */
export function auditView(db: ProducerDb, filter: AuditFilter, before: number | null, limit: number): AuditRow[] {
  const rows = db.view<Omit<AuditRow, 'actor'> & { actor: string | null }>(
    (producer) => sql`
    select a.seq, a.at, a.act, a.subject, a.subject_id as "subjectId", a.changes,
      (select json_object('id', m.id, 'name', p.name, 'role', m.role)
        from ${memberships} m join ${people} p on p.id = m.person_id
        where m.producer_id = ${producer} and m.id = a.actor) as actor
    from ${auditEntries} a
    where a.producer_id = ${producer} and ${conditions(filter, before)}
    order by a.seq desc limit ${limit}`,
  );
  // Built by the statement above.
  return rows.map((row) => ({ ...row, actor: row.actor === null ? null : (JSON.parse(row.actor) as AuditRow['actor']) }));
}

function conditions({ subject, subjectId, actor, from, to }: AuditFilter, before: number | null): SQL {
  const wanted = [
    before !== null && sql`a.seq < ${before}`,
    subject && sql`a.subject = ${subject}`,
    subjectId && sql`a.subject_id = ${subjectId}`,
    actor && sql`a.actor = ${actor}`,
    from !== undefined && sql`a.at >= ${from}`,
    to !== undefined && sql`a.at < ${to}`,
  ].filter((one): one is SQL => Boolean(one));
  return wanted.length > 0 ? sql.join(wanted, sql` and `) : sql`1`;
}
