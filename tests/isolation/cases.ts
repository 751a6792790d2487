import { api, endpoints } from '../../server/contract';
import type { Endpoint } from '../../server/contract/endpoint';
import { senmlType } from '../../server/contract/telemetry';
import { alder, alderMembers, alderPeople, type AlderMember } from '../cast';
import { hour, idOf, morning, serialOf, telemetryKeyOf } from '../factories';

/** Something named in a call: the caller's own, and where there is one its like at a store that is not theirs. */
export interface Thing {
  own: string;
  sibling?: string;
}

/** How an endpoint is called, and what PRODUCT.md "Who may do what" says of each role. */
export interface Case {
  endpoint: Endpoint;
  path?: Record<string, Thing>;
  query?: Record<string, Thing | string>;
  /** What is named in the body, and the body that names it. */
  named?: Record<string, Thing>;
  body?: (named: Record<string, unknown>) => unknown;
  form?: () => FormData;
  headers?: Record<string, string>;
  /** For `may`: who succeeds. */
  allowed?: readonly AlderMember[];
  /** For `may`: who may do so elsewhere, so that here there is nothing for them. */
  hidden?: readonly AlderMember[];
  /** An address outside the cast that the call itself names and may write to. */
  invites?: string;
  /** For the other kinds: what anybody let in is answered. */
  status?: number;
}

const thing = (own: string, sibling?: string): Thing => ({ own: idOf(alder.namespace, own), sibling: sibling && idOf(alder.namespace, sibling) });
const store = { storeId: thing('lantern', 'juniper') };
const freezer = { freezerId: thing('lantern freezer', 'juniper freezer') };
const request = { requestId: thing('cold request', 'sooner request') };
const sooner = { requestId: thing('lantern sooner') };
const account = { accountId: thing('chain') };
const places = { accountId: thing('corner'), districtId: thing('south') };
const parts = { storeId: thing('lantern'), modelId: thing('model'), productId: thing('small bag') };
const model = { name: 'Chest', insideWidthIn: 40, insideDepthIn: 24, insideHeightIn: 30, doors: 1, ratedPounds: 400, defrost: 'auto' };

const placesAsked = { district: thing('north'), account: thing('chain') };

const all = alderMembers;
const but = (...left: AlderMember[]): AlderMember[] => all.filter((name) => !left.includes(name));
const stranger = ['otherManager'] as const;
const desk = ['rep', 'storeRep', 'agent', 'technician', 'admin'] as const;

export const cases: Case[] = [
  { endpoint: api.stores.list, query: { district: thing('north'), account: thing('chain') }, allowed: all },
  { endpoint: api.stores.read, path: store, allowed: but('otherManager'), hidden: stranger },
  { endpoint: api.freezers.list, query: { ...placesAsked, store: thing('lantern', 'juniper'), q: 'front' }, allowed: all },
  { endpoint: api.freezers.digest, query: placesAsked, allowed: all },
  { endpoint: api.freezers.map, query: { show: 'first' }, allowed: all },
  { endpoint: api.freezers.csv, query: { columns: 'level,state' }, allowed: all },
  { endpoint: api.freezers.read, path: freezer, allowed: but('otherManager'), hidden: stranger },
  {
    endpoint: api.deliveries.setNextTruck,
    path: store,
    named: { productId: thing('small bag') },
    body: ({ productId }) => ({ day: '2026-12-02', from: '09:00', to: '10:30', load: [{ productId, bags: 30 }], version: 1 }),
    allowed: ['dispatcher', 'admin'],
  },
  { endpoint: api.deliveries.clearNextTruck, path: store, allowed: ['dispatcher', 'admin'] },
  { endpoint: api.deliveries.list, path: store, allowed: but('otherManager', 'technician'), hidden: stranger },
  {
    endpoint: api.deliveries.record,
    path: store,
    named: { productId: thing('small bag'), freezerId: { ...thing('lantern freezer', 'juniper freezer') } },
    body: ({ productId, freezerId }) => ({ at: morning - hour, lines: [{ productId, freezerId, bags: 20, lot: 'L1' }] }),
    allowed: ['dispatcher', 'driver', 'admin'],
  },
  { endpoint: api.trucks.list, query: { district: thing('north'), account: thing('chain') }, allowed: ['dispatcher', 'admin'] },
  {
    endpoint: api.trucks.set,
    named: store,
    body: ({ storeId }) => ({ trucks: [{ storeId, day: '2026-12-02', from: '09:00', to: '10:30', version: 1 }] }),
    allowed: ['dispatcher', 'admin'],
  },
  { endpoint: api.comparison.read, allowed: all },
  { endpoint: api.comparison.csv, query: { q: 'a' }, allowed: all },
  { endpoint: api.products.list, query: { retired: 'too' }, allowed: ['agent', 'dispatcher', 'driver', 'technician', 'admin'] },
  { endpoint: api.products.create, body: () => ({ name: '10 lb cubes', bagPounds: 10, gtin: '' }), allowed: ['admin'] },
  { endpoint: api.products.change, path: { productId: thing('small bag') }, body: () => ({ version: 1, name: 'Seven' }), allowed: ['admin'] },
  { endpoint: api.models.list, query: { retired: 'too' }, allowed: ['agent', 'dispatcher', 'technician', 'admin'] },
  { endpoint: api.models.create, body: () => model, allowed: ['technician', 'admin'] },
  { endpoint: api.models.change, path: { modelId: thing('model') }, body: () => ({ version: 1, name: 'Two-door' }), allowed: ['technician', 'admin'] },

  { endpoint: api.accounts.list, query: { q: 'c' }, allowed: ['agent', 'dispatcher', 'admin'] },
  { endpoint: api.accounts.read, path: account, allowed: ['agent', 'dispatcher', 'admin'] },
  { endpoint: api.accounts.create, body: () => ({ number: '9', name: 'Bluff', terms: '', language: 'en', contacts: [] }), allowed: ['admin'] },
  { endpoint: api.accounts.change, path: account, body: () => ({ version: 1, number: '9' }), allowed: ['admin'] },
  { endpoint: api.districts.list, allowed: ['agent', 'dispatcher', 'technician', 'admin'] },
  { endpoint: api.districts.create, body: () => ({ name: 'Lakeside' }), allowed: ['admin'] },
  { endpoint: api.districts.change, path: { districtId: thing('north') }, body: () => ({ version: 1, name: 'Lakeside' }), allowed: ['admin'] },
  { endpoint: api.stores.readSettings, path: { storeId: thing('lantern') }, allowed: ['admin'] },
  { endpoint: api.stores.create, named: places, body: (named) => ({ ...shop, ...named }), allowed: ['admin'] },
  { endpoint: api.stores.change, path: { storeId: thing('lantern') }, named: places, body: (named) => ({ version: 1, name: 'Lighthouse', ...named }), allowed: ['admin'] },
  { endpoint: api.freezers.readSettings, path: { freezerId: thing('lantern freezer') }, allowed: ['admin'] },
  { endpoint: api.freezers.create, named: parts, body: (named) => ({ assetNumber: 'S-1', ...cabinet(named) }), allowed: ['admin'] },
  {
    endpoint: api.freezers.change,
    path: { freezerId: thing('lantern freezer') },
    named: parts,
    body: (named) => ({ version: 1, ...cabinet(named) }),
    allowed: ['admin'],
  },
  {
    endpoint: api.freezers.tieSensor,
    path: freezer,
    named: { sensorId: thing('lantern sensor') },
    body: ({ sensorId }) => ({ sensorId, probesIn: [11, 36, 59] }),
    allowed: ['technician', 'admin'],
  },
  { endpoint: api.freezers.takeSensorOff, path: freezer, allowed: ['technician', 'admin'] },
  { endpoint: api.requests.list, query: { store: thing('lantern', 'juniper'), assignee: thing('technician'), state: 'any' }, allowed: all },
  {
    endpoint: api.requests.file,
    named: { ...store, ...freezer },
    body: ({ storeId, freezerId }) => ({ storeId, freezerId, kind: 'not-cooling', words: 'it hums' }),
    allowed: but('otherManager', 'dispatcher'),
    hidden: stranger,
  },
  {
    endpoint: api.requests.file,
    named: { ...store, ...freezer },
    body: ({ storeId, freezerId }) => ({ storeId, freezerId, kind: 'ice-sooner' }),
    allowed: but('otherManager'),
    hidden: stranger,
  },
  { endpoint: api.requests.read, path: request, allowed: but('otherManager'), hidden: stranger },
  { endpoint: api.requests.read, path: sooner, allowed: but('otherManager', 'technician'), hidden: ['otherManager', 'technician'] },
  {
    endpoint: api.requests.change,
    path: request,
    named: { assigneeId: thing('agent') },
    body: ({ assigneeId }) => ({ version: 1, state: 'scheduled', scheduledDay: '2026-12-03', assigneeId }),
    allowed: desk,
  },
  { endpoint: api.requests.change, path: request, body: () => ({ version: 1, state: 'waiting-on-store' }), allowed: desk },
  {
    endpoint: api.requests.change,
    path: sooner,
    body: () => ({ version: 1, state: 'open' }),
    allowed: ['rep', 'storeRep', 'agent', 'dispatcher', 'admin'],
    hidden: ['technician'],
  },
  { endpoint: api.requests.cancel, path: request, allowed: ['manager', 'managerOfThree', 'rep', 'storeRep', 'agent', 'admin'], hidden: stranger },
  {
    endpoint: api.requests.reply,
    path: request,
    body: () => ({ words: 'on our way' }),
    allowed: ['manager', 'managerOfThree', ...desk],
    hidden: stranger,
  },
  { endpoint: api.requests.note, path: request, body: () => ({ words: 'bring a gasket' }), allowed: ['agent', 'dispatcher', 'technician', 'admin'] },
  { endpoint: api.requests.addPhotos, path: request, form: () => picture('photos'), allowed: but('otherManager', 'dispatcher'), hidden: stranger },
  {
    endpoint: api.requests.readPhoto,
    path: { ...request, photoId: thing('cold request photo', 'sooner request photo') },
    allowed: but('otherManager'),
    hidden: stranger,
  },
  { endpoint: api.requests.assignees, allowed: ['rep', 'storeRep', 'agent', 'dispatcher', 'technician', 'admin'] },

  { endpoint: api.sensors.listKeys, allowed: ['admin'] },
  {
    endpoint: api.sensors.createKey,
    named: { replaces: thing('key') },
    body: ({ replaces }) => ({ name: 'second gateway', replaces }),
    allowed: ['admin'],
  },
  { endpoint: api.sensors.revokeKey, path: { keyId: thing('key') }, allowed: ['admin'] },
  { endpoint: api.sensors.listUnclaimed, allowed: ['agent', 'dispatcher', 'technician', 'admin'] },
  { endpoint: api.sensors.find, query: { q: 'lantern' }, allowed: ['agent', 'dispatcher', 'technician', 'admin'] },
  { endpoint: api.sensors.listQuarantined, allowed: ['agent', 'dispatcher', 'technician', 'admin'] },

  { endpoint: api.people.list, allowed: ['admin'] },
  {
    endpoint: api.people.invite,
    named: { id: thing('lantern') },
    invites: 'new@lantern.example',
    body: ({ id }) => ({ email: 'new@lantern.example', name: 'New', language: 'en', role: 'store-manager', scopes: [{ kind: 'store', id }] }),
    allowed: ['admin'],
  },
  {
    endpoint: api.people.change,
    path: { memberId: thing('manager') },
    named: { id: thing('north') },
    body: ({ id }) => ({ role: 'district-rep', scopes: [{ kind: 'district', id }] }),
    allowed: ['admin'],
  },
  {
    endpoint: api.people.change,
    path: { memberId: thing('technician') },
    named: { handOverTo: thing('agent') },
    body: ({ handOverTo }) => ({ active: false, handOverTo }),
    allowed: ['admin'],
  },
  { endpoint: api.people.inviteAgain, path: { memberId: thing('manager') }, allowed: ['admin'] },
  { endpoint: api.people.seeAs, path: { memberId: thing('manager') }, allowed: ['admin'] },
  { endpoint: api.people.places, allowed: ['agent', 'dispatcher', 'technician', 'admin'] },
  { endpoint: api.audit.list, query: { actor: thing('manager') }, allowed: ['admin'] },
  { endpoint: api.audit.csv, query: { actor: thing('manager') }, allowed: ['admin'] },
  { endpoint: api.settings.read, allowed: ['admin'] },
  { endpoint: api.settings.change, body: () => ({ version: 1, riskLimit: 0.3, urgentPhone: '555-0199' }), allowed: ['admin'] },
  { endpoint: api.settings.setLogo, form: () => picture('logo'), allowed: ['admin'] },
  { endpoint: api.settings.clearLogo, allowed: ['admin'] },
  { endpoint: api.settings.readLogo, allowed: all },

  { endpoint: api.me.read, status: 200 },
  { endpoint: api.me.update, body: () => ({ language: 'es' }), status: 204 },
  { endpoint: api.me.sessions, status: 200 },
  { endpoint: api.me.endSession, path: { handle: { own: 'nobodys-handle' } }, status: 404 },
  { endpoint: api.auth.signOut, status: 204 },
  { endpoint: api.auth.readSession, status: 200 },
  { endpoint: api.auth.readSeeing, status: 200 },
  { endpoint: api.auth.endSeeing, status: 204 },
  { endpoint: api.auth.requestLink, body: () => ({ email: alderPeople.manager.email }), status: 202 },
  { endpoint: api.auth.signIn, body: () => ({ token: 'guessed' }), status: 410 },
  { endpoint: api.system.health, status: 200 },
  { endpoint: api.system.openapi, status: 200 },
  { endpoint: api.telemetry.ingest, body: pack, named: { serial: { own: serialOf(alder, 'lantern') } }, status: 401, headers: { 'content-type': senmlType } },
  { endpoint: api.dev.mail, status: 200 },
  { endpoint: api.dev.mailOne, path: { mailId: thing('a mail') }, status: 404 },
  { endpoint: api.dev.mailJson, status: 200 },
  { endpoint: api.dev.people, status: 200 },
  { endpoint: api.dev.signIn, headers: { 'content-type': 'application/x-www-form-urlencoded' }, status: 400 },
];

export const ingestWithKey: Case = {
  endpoint: api.telemetry.ingest,
  named: { serial: { own: serialOf(alder, 'lantern') } },
  body: pack,
  headers: { 'content-type': senmlType, authorization: `Bearer ${telemetryKeyOf(alder)}` },
  status: 202,
};

/** Endpoints nobody has told this table how to call. */
export const uncovered = (): string[] => endpoints.filter((endpoint) => !cases.some((one) => one.endpoint.id === endpoint.id)).map(({ id }) => id);

const shop = {
  ...{ name: 'Heron Dock', kind: 'bait', street: '9 Ferry Road', city: 'Tern Point', region: 'AR', postalCode: '72600', latitude: 36, longitude: -93 },
  ...{ timeZone: 'America/Chicago', language: 'en', phone: '', urgentPhone: '', driverNotes: '' },
  ...{ openHours: [6, 22], receivingHours: [{ days: [1], from: '07:00', to: '11:00' }], deliveryDays: [2] },
};

function cabinet({ storeId, modelId, productId }: Record<string, unknown>): object {
  const mount = { channelDropIn: 2, rackIn: 4, headroomIn: 5 };
  return { storeId, modelId, name: 'Side', placement: 'indoor', condition: '', mount, lanes: [{ productId, widthShare: 1 }] };
}

function pack({ serial }: Record<string, unknown>): unknown {
  return [
    { bn: `${String(serial)}_`, bt: morning / 1000, n: 'probe1', u: 'm', v: 0.5 },
    { n: 'probe2', u: 'm', v: 0.6 },
    { n: 'air', u: 'Cel', v: -8 },
  ];
}

/** One white pixel as PNG. */
const PIXEL = 'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mP8/5+hHgAHggJ/PchI7wAAAABJRU5ErkJggg==';

function picture(field: string): FormData {
  const form = new FormData();
  form.append(field, new Blob([Buffer.from(PIXEL, 'base64')], { type: 'image/png' }), 'p.png');
  return form;
}
