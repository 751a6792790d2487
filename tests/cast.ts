import type { Grant, Language, Role, Side } from '../server/contract/words';

/** The named people and places every test speaks of. Birch mirrors Alder thing by thing; Twin even has Alder's ids. */

export interface ProducerCast {
  slug: string;
  name: string;
  language: Language;
  /** Ids are made from this, so that two producers with one namespace have the same ids. */
  namespace: string;
  /** Stands in every text of the producer, so that a text that strays can be recognised. */
  mark: string;
}

export const alder: ProducerCast = { slug: 'alder-ice', name: 'Alder Ice', language: 'en', namespace: 'alder', mark: 'Quillfeather' };
export const birch: ProducerCast = { slug: 'birch-ice', name: 'Hielo Abedul', language: 'es', namespace: 'birch', mark: 'Zanzibarbican' };
export const twin: ProducerCast = { slug: 'twin-ice', name: 'Twin Ice', language: 'en', namespace: 'alder', mark: 'Oxbowmarmalade' };

/** In notes to staff and in lot numbers, to see who is shown them. */
export const noteWord = 'Nightingalenote';
export const lotWord = 'LOTPERIWINKLE';

export type StoreName = 'lantern' | 'juniper' | 'campo' | 'quarry';
export type DistrictName = 'north' | 'south';
export type AccountName = 'chain' | 'corner';

export const places: Record<StoreName, { district: DistrictName; account: AccountName; language: Language; timeZone: string }> = {
  lantern: { district: 'north', account: 'chain', language: 'en', timeZone: 'America/Chicago' },
  juniper: { district: 'north', account: 'corner', language: 'en', timeZone: 'America/Chicago' },
  campo: { district: 'south', account: 'chain', language: 'es', timeZone: 'America/Denver' },
  quarry: { district: 'south', account: 'corner', language: 'en', timeZone: 'America/Chicago' },
};

export interface Scope {
  store?: StoreName;
  district?: DistrictName;
  account?: AccountName;
}

export interface Member {
  name: string;
  email: string;
  language: Language;
  role: Role;
  side: Side;
  scopes?: Scope[];
  grants?: Grant[];
  /** The person may sign in nowhere. */
  deactivated?: boolean;
  /** The person no longer works with this producer. */
  left?: boolean;
}

const staff = (name: string, role: Role, language: Language = 'en'): Member => ({
  name,
  email: `${name.toLowerCase()}@alder.example`,
  language,
  role,
  side: 'producer',
});

export const alderPeople = {
  manager: { name: 'Marta', email: 'marta@lantern.example', language: 'es', role: 'store-manager', side: 'store', scopes: [{ store: 'lantern' }] },
  otherManager: { name: 'Jonas', email: 'jonas@juniper.example', language: 'en', role: 'store-manager', side: 'store', scopes: [{ store: 'juniper' }] },
  managerOfThree: {
    name: 'Tess',
    email: 'tess@three.example',
    language: 'en',
    role: 'store-manager',
    side: 'store',
    scopes: [{ store: 'lantern' }, { store: 'juniper' }, { store: 'campo' }],
  },
  rep: { ...staff('Rhea', 'district-rep'), scopes: [{ district: 'north' }] },
  storeRep: { name: 'Sol', email: 'sol@chain.example', language: 'es', role: 'district-rep', side: 'store', scopes: [{ account: 'chain' }] },
  agent: staff('Agnes', 'support-agent'),
  dispatcher: staff('Dale', 'dispatcher'),
  driver: staff('Drew', 'driver'),
  technician: staff('Theo', 'technician', 'es'),
  admin: staff('Ada', 'producer-admin'),
  gone: { ...staff('Gus', 'producer-admin'), deactivated: true },
  left: { ...staff('Lena', 'producer-admin'), left: true },
  /** Also a store manager of Birch. */
  both: staff('Bea', 'support-agent'),
} satisfies Record<string, Member>;

export const birchPeople = {
  stranger: { name: 'Saul', email: 'saul@birch.example', language: 'es', role: 'store-manager', side: 'store', scopes: [{ store: 'lantern' }] },
  strangerTechnician: { ...staff('Tomas', 'technician'), email: 'tomas@birch.example' },
  strangerAgent: { ...staff('Alma', 'support-agent', 'es'), email: 'alma@birch.example' },
  strangerAdmin: { ...staff('Abel', 'producer-admin', 'es'), email: 'abel@birch.example' },
  both: { ...alderPeople.both, role: 'store-manager', side: 'store', scopes: [{ store: 'lantern' }] },
} satisfies Record<string, Member>;

/** Same roles and, by the namespace, same membership ids as at Alder; other persons. */
export const twinPeople = {
  manager: { ...alderPeople.manager, name: 'Mona', email: 'mona@twin.example' },
  agent: { ...alderPeople.agent, name: 'Arlo', email: 'arlo@twin.example' },
  technician: { ...alderPeople.technician, name: 'Tilda', email: 'tilda@twin.example' },
  dispatcher: { ...alderPeople.dispatcher, name: 'Dora', email: 'dora@twin.example' },
  admin: { ...alderPeople.admin, name: 'Axel', email: 'axel@twin.example' },
} satisfies Record<string, Member>;

export type AlderPerson = keyof typeof alderPeople;
export type BirchPerson = keyof typeof birchPeople;

/** Who works at Alder today, by one of each role and scope. */
export const alderMembers = [
  'manager',
  'otherManager',
  'managerOfThree',
  'rep',
  'storeRep',
  'agent',
  'dispatcher',
  'driver',
  'technician',
  'admin',
] as const satisfies AlderPerson[];
export type AlderMember = (typeof alderMembers)[number];
