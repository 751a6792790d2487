import type { Body } from '../../contract/endpoint';
import { scopedRoles, type changePerson as changeEndpoint, type invitePerson as inviteEndpoint, type MemberOf } from '../../contract/people';
import { abilityFor, actions, subjects } from '../../contract/ability';
import { liveStates, type Grant, type Role, type Side } from '../../contract/words';
import { accounts, and, districts, eq, inArray, memberships, membershipScopes, requests, sql, stores, type ProducerDb } from '../../db';
import { membersByRole, peopleView } from '../../db/views/people';
import type { ActionTx, ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';

type Scopes = Body<typeof inviteEndpoint>['scopes'];

/** Adds somebody to the producer and writes to them. Answers the membership's id. */
export function invitePerson(ctx: ProducerContext, body: Body<typeof inviteEndpoint>): string {
  const { email, name, language, role, scopes, grants } = body;
  return ctx.act('invite-person', (tx) => {
    tx.authorise('create', 'Person', {});
    refuseBeyond(ctx, role, grants);
    refuseUnscoped(role, scopes);
    const personId = tx.personOf({ email, name, language });
    const known = tx.db.select({ id: memberships.id }).from(memberships).where(eq(memberships.personId, personId)).get();
    if (known) throw problem('already-member');
    const id = ctx.newId();
    tx.db.insert(memberships, { id, personId, role, side: sideOf(role, body.side), grants, createdAt: ctx.now });
    assign(ctx, tx, id, role, scopes);
    tx.audit('Person', id, { role, scopes, grants });
    invite(ctx, tx, id);
    return id;
  });
}

export function inviteAgain(ctx: ProducerContext, id: string): void {
  ctx.act('invite-again', (tx) => {
    const member = memberOf(tx.db, id);
    tx.authorise('update', 'Person', { id });
    if (!member.active) throw problem('not-found');
    invite(ctx, tx, id);
    tx.audit('Person', id, { invited: true });
  });
}

/** Changes what somebody may do here; it acts on their next request. The last admin stays one. */
export function changePerson(ctx: ProducerContext, id: string, change: Body<typeof changeEndpoint>): void {
  ctx.act('change-person', (tx) => {
    const member = memberOf(tx.db, id);
    tx.authorise('update', 'Person', { id });
    const role = change.role ?? member.role;
    const active = change.active ?? member.active;
    const grants = change.grants ?? member.grants;
    const scopes = change.scopes ?? member.scopes.map(({ kind, id: place }) => ({ kind, id: place }));
    if (member.role === 'producer-admin' && member.active && (role !== 'producer-admin' || !active)) refuseLastAdmin(tx.db);
    refuseBeyond(ctx, role, grants);
    refuseUnscoped(role, scopes);
    tx.db.update(memberships, id, {
      role,
      side: sideOf(role, change.side ?? member.side),
      grants,
      deactivatedAt: active ? null : ctx.now,
    });
    tx.db.delete(membershipScopes, eq(membershipScopes.membershipId, id));
    assign(ctx, tx, id, role, scopes);
    if (!active && member.active) handOver(ctx, tx, id, change.handOverTo);
    if (change.language) tx.speak(id, change.language);
    tx.audit('Person', id, { role, active, scopes, grants, language: change.language, handOverTo: change.handOverTo });
  });
}

/** Who looks as somebody else is written down before they see anything. */
export function seeAs({ act, viewer }: ProducerContext, id: string): void {
  act('see-as', (tx) => {
    const member = memberOf(tx.db, id);
    tx.authorise('update', 'Person', { id });
    if (!member.active || id === viewer.membershipId) throw problem('not-found');
    tx.audit('Person', id, { seen: true });
  });
}

export const memberOf = (db: ProducerDb, id: string): MemberOf => orNotFound(peopleView(db, sql`m.id = ${id}`, 1)[0]);

/** Nobody gives what they lack: every rule of the new membership must be one of the giver's own. */
export function refuseBeyond({ ability }: Pick<ProducerContext, 'ability'>, role: Role, grants: Grant[]): void {
  const given = abilityFor({ personId: '', membershipId: '', role, side: sideOf(role, 'producer'), storeIds: [], grants });
  const lacking = subjects.some((subject) => actions.some((action) => given.can(action, subject) && !ability.can(action, subject)));
  if (lacking) throw problem('not-allowed');
}

const isScoped = (role: Role): boolean => scopedRoles.some((scoped) => scoped === role);

function refuseUnscoped(role: Role, scopes: Scopes): void {
  if (isScoped(role) && scopes.length === 0) throw problem('scope-needed');
}

/** Only a district rep can be on either side. */
const sideOf = (role: Role, asked: Side): Side => (role === 'store-manager' ? 'store' : role === 'district-rep' ? asked : 'producer');

const places = { store: stores, district: districts, account: accounts };

/** Others than managers and reps see everything, so nothing is assigned to them. */
function assign({ newId }: ProducerContext, tx: ActionTx, membershipId: string, role: Role, scopes: Scopes): void {
  if (!isScoped(role)) return;
  for (const { kind, id } of scopes) {
    if (!tx.db.find(places[kind], id)) throw problem('scope-unknown');
    const place = { storeId: null, districtId: null, accountId: null, [`${kind}Id`]: id };
    tx.db.insert(membershipScopes, { id: newId(), membershipId, ...place });
  }
}

function refuseLastAdmin(db: ProducerDb): void {
  if (membersByRole(db, ['producer-admin']).length < 2) throw problem('last-admin');
}

/** Live requests of somebody who leaves go to whoever is named, or back to nobody. */
function handOver(ctx: ProducerContext, tx: ActionTx, from: string, to: string | null): void {
  if (to && (to === from || !memberOf(tx.db, to).active)) throw problem('unknown-person');
  const held = tx.db
    .select({ id: requests.id, version: requests.version })
    .from(requests)
    .where(and(eq(requests.assigneeId, from), inArray(requests.state, [...liveStates])))
    .all();
  for (const { id, version } of held) {
    tx.db.update(requests, id, { assigneeId: to, version: version + 1, changedAt: ctx.now });
    tx.audit('Request', id, { assigneeId: to });
  }
}

function invite({ producer }: ProducerContext, tx: ActionTx, id: string): void {
  const { email, name, language } = memberOf(tx.db, id);
  tx.mail({ template: 'invitation', to: email, language, params: { name, producer: producer.name }, path: '/sign-in' });
}
