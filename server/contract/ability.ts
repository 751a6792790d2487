import { createMongoAbility, subject as tag, type ForcedSubject, type MongoAbility, type RawRuleOf } from '@casl/ability';
import type { Grant, Role, Side } from './words';

export const actions = ['read', 'create', 'update', 'delete', 'reply', 'cancel', 'confirm', 'dispute', 'pay'] as const;
export type Action = (typeof actions)[number];

export const subjects = [
  'Account',
  'Audit',
  'Delivery',
  'District',
  'Event',
  'Freezer',
  'Install',
  'Invoice',
  'Model',
  'NextTruck',
  'Note',
  'Payment',
  'Person',
  'Plan',
  'Price',
  'Product',
  'Request',
  'Sensor',
  'Settings',
  'Store',
  'TelemetryKey',
] as const;
export type Subject = (typeof subjects)[number];

/** A signed-in person as a member of one producer. `storeIds` is the scope, worked out anew for each request. */
export interface Viewer {
  personId: string;
  membershipId: string;
  role: Role;
  side: Side;
  /** Store manager and district rep: assigned stores. Driver: the day's stops. Technician: visits' stores. Others: empty, they see all. */
  storeIds: string[];
  grants: Grant[];
}

export type Ability = MongoAbility<[Action, Subject | (Record<string, unknown> & ForcedSubject<Subject>)]>;

/** The row as a subject, so that a rule's conditions are asked of it and not of the type. */
export const row = (type: Subject, object: object) => tag(type, { ...object } as Record<string, unknown>);

/** Those whose rules say nothing of who they are: one ability serves them all. */
const seeAll: Role[] = ['support-agent', 'dispatcher', 'producer-admin'];
const known = new Map<Role, Ability>();

/** Every rule of who may do what; what is not here is not allowed. */
export function abilityFor(viewer: Viewer): Ability {
  const ability = known.get(viewer.role) ?? ruledBy(viewer);
  if (seeAll.includes(viewer.role)) known.set(viewer.role, ability);
  return ability;
}

function ruledBy(viewer: Viewer): Ability {
  const granted: RawRuleOf<Ability>[] = [];
  rules[viewer.role]((action, subject, conditions) => granted.push({ action, subject, conditions }), viewer);
  return createMongoAbility<Ability>(granted);
}

type Can = (action: Action | Action[], subject: Subject | Subject[], conditions?: Record<string, unknown>) => void;

const rules: Record<Role, (can: Can, viewer: Viewer) => void> = {
  'store-manager': storeManager,
  'district-rep': districtRep,
  'support-agent': supportAgent,
  dispatcher,
  driver,
  technician,
  'producer-admin': producerAdmin,
};

function storeManager(can: Can, viewer: Viewer) {
  const own = { storeId: { $in: viewer.storeIds } };
  can('read', 'Store', { id: { $in: viewer.storeIds } });
  can('read', ['Freezer', 'NextTruck', 'Delivery'], own);
  can(['confirm', 'dispute'], 'Delivery', own);
  can(['read', 'create', 'reply', 'cancel'], 'Request', own);
  can(['read', 'create', 'cancel'], 'Event', own);
  can('read', 'Invoice', own);
  if (viewer.grants.includes('pay-invoices')) can('pay', 'Invoice', own);
}

function districtRep(can: Can, viewer: Viewer) {
  const assigned = { storeId: { $in: viewer.storeIds } };
  can('read', 'Store', { id: { $in: viewer.storeIds } });
  can('read', ['Freezer', 'NextTruck', 'Plan', 'Delivery'], assigned);
  can(['read', 'create', 'update', 'reply', 'cancel'], ['Request', 'Event'], assigned);
  if (viewer.side === 'producer') can('read', 'Note', assigned);
  if (viewer.grants.includes('read-invoices')) can('read', 'Invoice', assigned);
}

function supportAgent(can: Can) {
  can('read', ['Account', 'District', 'Store', 'Freezer', 'Product', 'Model', 'Sensor', 'Install', 'NextTruck', 'Plan', 'Delivery', 'Invoice', 'Price', 'Payment']);
  can(['read', 'create', 'update', 'reply', 'cancel'], ['Request', 'Event']);
  can(['read', 'create'], 'Note');
}

function dispatcher(can: Can) {
  can('read', ['Account', 'District', 'Store', 'Freezer', 'Product', 'Model', 'Sensor', 'Install', 'Request', 'Event']);
  can(['create', 'update', 'reply', 'cancel'], 'Request', { kind: 'ice-sooner' });
  can(['read', 'create'], 'Note');
  can(['read', 'create', 'update', 'delete'], ['NextTruck', 'Plan', 'Delivery']);
}

function driver(can: Can, viewer: Viewer) {
  const stops = { storeId: { $in: viewer.storeIds } };
  can('read', 'Store', { id: { $in: viewer.storeIds } });
  can('read', ['Freezer', 'Request', 'Event', 'Note', 'NextTruck', 'Plan', 'Delivery'], stops);
  can('create', ['Request', 'Delivery'], stops);
  can('read', 'Product');
}

function technician(can: Can, viewer: Viewer) {
  const visits = { storeId: { $in: viewer.storeIds } };
  const mine = { assigneeId: viewer.membershipId };
  can('read', 'Store', { id: { $in: viewer.storeIds } });
  can('read', ['Freezer', 'Event'], visits);
  can(['read', 'update', 'reply'], 'Request', mine);
  // What they filed themselves they can look after until somebody has it.
  can('read', 'Request', { openedBy: viewer.membershipId });
  can('create', 'Request', visits);
  can(['read', 'create'], 'Note', mine);
  can(['read', 'create', 'update'], ['Install', 'Sensor', 'Model']);
  can('read', ['Product', 'District']);
}

function producerAdmin(can: Can) {
  can([...actions], [...subjects]);
}
