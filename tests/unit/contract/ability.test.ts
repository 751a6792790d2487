import { describe, expect, test } from 'vitest';
import { abilityFor, row, type Action, type Subject, type Viewer } from '../../../server/contract/ability';
import type { Grant, Role, Side } from '../../../server/contract/words';

/** PRODUCT.md "Who may do what", line by line, beside the rules and not made from them. */

const viewer = (role: Role, side: Side = 'producer', grants: Grant[] = []): Viewer => ({
  personId: 'person',
  membershipId: 'me',
  role,
  side,
  storeIds: ['own'],
  grants,
});

const manager = viewer('store-manager', 'store');
const rep = viewer('district-rep');
const storeRep = viewer('district-rep', 'store');
const agent = viewer('support-agent');
const dispatcher = viewer('dispatcher');
const driver = viewer('driver');
const technician = viewer('technician');
const admin = viewer('producer-admin');

const own = { storeId: 'own', kind: 'leak', assigneeId: null };
const other = { storeId: 'other', kind: 'leak', assigneeId: null };
const mine = { ...other, assigneeId: 'me' };
const sooner = { ...other, kind: 'ice-sooner' };

type Line = [who: string, viewer: Viewer, action: Action, subject: Subject, object: object];

const may: Line[] = [
  ['a store manager reads an own store', manager, 'read', 'Store', { id: 'own' }],
  ['a store manager reads an own freezer', manager, 'read', 'Freezer', own],
  ['a store manager reads an own truck', manager, 'read', 'NextTruck', own],
  ['a store manager disputes an own delivery', manager, 'dispute', 'Delivery', own],
  ['a store manager files', manager, 'create', 'Request', own],
  ['a store manager cancels', manager, 'cancel', 'Request', own],
  ['a store manager replies', manager, 'reply', 'Request', own],
  ['a store manager pays where granted', viewer('store-manager', 'store', ['pay-invoices']), 'pay', 'Invoice', own],
  ['a district rep changes an assigned request', rep, 'update', 'Request', own],
  ['a district rep of the producer reads notes', rep, 'read', 'Note', own],
  ['a district rep reads invoices where granted', viewer('district-rep', 'producer', ['read-invoices']), 'read', 'Invoice', own],
  ['a support agent changes any request', agent, 'update', 'Request', other],
  ['a support agent writes notes', agent, 'create', 'Note', other],
  ['a support agent reads invoices', agent, 'read', 'Invoice', other],
  ['a dispatcher sets trucks', dispatcher, 'update', 'NextTruck', other],
  ['a dispatcher records deliveries', dispatcher, 'create', 'Delivery', other],
  ['a dispatcher changes ice requests', dispatcher, 'update', 'Request', sooner],
  ['a dispatcher reads any request', dispatcher, 'read', 'Request', other],
  ['a driver records at a stop', driver, 'create', 'Delivery', own],
  ['a driver files at a stop', driver, 'create', 'Request', own],
  ['a driver reads notes at a stop', driver, 'read', 'Note', own],
  ['a technician changes an assigned request', technician, 'update', 'Request', mine],
  ['a technician files at a visit', technician, 'create', 'Request', own],
  ['a technician installs', technician, 'create', 'Install', other],
  ['an admin does everything', admin, 'delete', 'Settings', {}],
];

const mayNot: Line[] = [
  ['a store manager reads another store', manager, 'read', 'Store', { id: 'other' }],
  ['a store manager reads another freezer', manager, 'read', 'Freezer', other],
  ['a store manager changes a request', manager, 'update', 'Request', own],
  ['a store manager reads notes', manager, 'read', 'Note', own],
  ['a store manager sets trucks', manager, 'update', 'NextTruck', own],
  ['a store manager pays without the grant', manager, 'pay', 'Invoice', own],
  ['a store manager reads people', manager, 'read', 'Person', own],
  ['a district rep reads another store', rep, 'read', 'Store', { id: 'other' }],
  ['a district rep of the stores reads notes', storeRep, 'read', 'Note', own],
  ['a district rep reads invoices without the grant', rep, 'read', 'Invoice', own],
  ['a district rep writes notes', rep, 'create', 'Note', own],
  ['a support agent sets trucks', agent, 'update', 'NextTruck', own],
  ['a support agent changes settings', agent, 'update', 'Settings', {}],
  ['a support agent changes a sensor', agent, 'update', 'Sensor', own],
  ['a dispatcher changes other requests', dispatcher, 'update', 'Request', other],
  ['a dispatcher reads invoices', dispatcher, 'read', 'Invoice', other],
  ['a driver records elsewhere', driver, 'create', 'Delivery', other],
  ['a driver cancels', driver, 'cancel', 'Request', own],
  ['a driver writes notes', driver, 'create', 'Note', own],
  ['a technician reads deliveries', technician, 'read', 'Delivery', own],
  ['a technician reads trucks', technician, 'read', 'NextTruck', own],
  ['a technician reads somebody else’s request', technician, 'read', 'Request', { ...own, assigneeId: 'somebody' }],
  ['a technician cancels', technician, 'cancel', 'Request', mine],
  ['a technician reads invoices', technician, 'read', 'Invoice', own],
];

describe('may', () => {
  test.each(may)('%s', (_who, given, action, subject, object) => {
    expect(abilityFor(given).can(action, row(subject, object))).toBe(true);
  });
});

describe('may not', () => {
  test.each(mayNot)('%s', (_who, given, action, subject, object) => {
    expect(abilityFor(given).can(action, row(subject, object))).toBe(false);
  });
});

test('only an admin touches people, settings, keys and the audit trail', () => {
  for (const given of [manager, rep, storeRep, agent, dispatcher, driver, technician]) {
    const ability = abilityFor(given);
    for (const subject of ['Person', 'Settings', 'TelemetryKey', 'Audit'] as const) {
      for (const action of ['read', 'create', 'update', 'delete'] as const) expect(ability.can(action, subject), `${given.role} ${action} ${subject}`).toBe(false);
    }
  }
});

test('somebody without a store sees none', () => {
  for (const given of [manager, rep, storeRep, driver, technician]) {
    const ability = abilityFor({ ...given, storeIds: [] });
    expect(ability.can('read', row('Store', { id: 'own' })), given.role).toBe(false);
    expect(ability.can('read', row('Freezer', own)), given.role).toBe(false);
  }
});
