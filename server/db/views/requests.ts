import { and, eq, sql, type SQL } from 'drizzle-orm';
import type { Ability } from '../../contract/ability';
import type { Request, RequestSummary } from '../../contract/requests';
import { allowed } from '../allowed';
import type { ProducerDb } from '../producer-db';
import { freezers, memberships, people, photos, requestEntries, requests, stores } from '../schema';
import { live } from './stores';

/** What rules may ask about a request. */
const requestColumns = {
  id: requests.id,
  storeId: requests.storeId,
  assigneeId: requests.assigneeId,
  kind: requests.kind,
  openedBy: requests.openedBy,
};
export const readableRequests = (ability: Ability): SQL => allowed(ability, 'read', 'Request', requestColumns);

const member = (membershipId: SQL, producer: string): SQL => sql`
  (select json_object('id', m.id, 'name', p.name, 'role', m.role)
    from ${memberships} m join ${people} p on p.id = m.person_id
    where m.producer_id = ${producer} and m.id = ${membershipId})`;

type Row = Omit<RequestSummary, 'assignee'> & { assignee: string | null; words: string; openedBy: string | null };

/** Requests, youngest first, with the names a list shows. */
export function requestsView(db: ProducerDb, where: SQL, limit: number): (RequestSummary & Pick<Request, 'words' | 'openedBy'>)[] {
  const rows = db.view<Row>(
    (producer) => sql`
    select ${requests.id} as id, ${requests.number} as number, ${requests.kind} as kind, ${requests.state} as state,
      ${requests.storeId} as "storeId", ${stores.name} as store, ${stores.timeZone} as "timeZone",
      ${requests.freezerId} as "freezerId", ${freezers.name} as freezer, ${requests.scheduledDay} as "scheduledDay",
      ${requests.language} as language, ${requests.openedAt} as "openedAt", ${requests.changedAt} as "changedAt",
      ${requests.version} as version, ${requests.words} as words,
      ${member(sql`${requests.assigneeId}`, producer)} as assignee,
      ${member(sql`${requests.openedBy}`, producer)} as "openedBy",
      (select count(*) from ${photos} ph where ph.producer_id = ${producer} and ph.request_id = ${requests.id}) as photos
    from ${requests}
    join ${stores} on ${stores.producerId} = ${producer} and ${stores.id} = ${requests.storeId}
    left join ${freezers} on ${freezers.producerId} = ${producer} and ${freezers.id} = ${requests.freezerId}
    where ${requests.producerId} = ${producer} and ${where}
    order by ${requests.openedAt} desc, ${requests.id} desc limit ${limit}`,
  );
  return rows.map((row) => ({
    ...row,
    // Built by `member` above.
    assignee: parsed(row.assignee) as Request['assignee'],
    openedBy: parsed(row.openedBy) as Request['openedBy'],
  }));
}

/** Live ones, and those that ended in the last fourteen days. */
export function recentRequestsOfStore(db: ProducerDb, ability: Ability, storeId: string, now: number): RequestSummary[] {
  const recent = sql`(${requests.state} in (${live}) or ${requests.endedAt} > ${now - 14 * 86_400_000})`;
  const where = and(eq(requests.storeId, storeId), readableRequests(ability), recent) ?? sql`0`;
  return requestsView(db, where, 50);
}

/** One request with its timeline; notes to staff only where `notes` says so. */
export function requestView(db: ProducerDb, where: SQL, notes: (request: RequestSummary & Pick<Request, 'openedBy'>) => boolean): Request | undefined {
  const [request] = requestsView(db, where, 1);
  if (!request) return undefined;
  const entries = db.view<Record<string, unknown> & { kind: string; author: string | null; assignee: string | null }>(
    (producer) => sql`
    select e.id, e.at, e.kind, e.words, e.state, e.day,
      ${member(sql`e.author_id`, producer)} as author, ${member(sql`e.assignee_id`, producer)} as assignee
    from ${requestEntries} e where e.producer_id = ${producer} and e.request_id = ${request.id} order by e.at, e.id`,
  );
  const mayReadNotes = notes(request);
  return {
    ...request,
    entries: entries
      .filter(({ kind }) => kind !== 'note' || mayReadNotes)
      // Built by the statement above in the contract's shape.
      .map((entry) => ({ ...entry, author: parsed(entry.author), assignee: parsed(entry.assignee) }) as Request['entries'][number]),
    photoList: db
      .select({ id: photos.id, width: photos.width, height: photos.height })
      .from(photos)
      .where(eq(photos.requestId, request.id))
      .orderBy(photos.createdAt, photos.id)
      .all(),
  };
}

const parsed = (json: string | null): unknown => (json === null ? null : JSON.parse(json));
