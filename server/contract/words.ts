/** The closed vocabularies that client, server and database share. */

export const languages = ['en', 'es'] as const;
export type Language = (typeof languages)[number];

export const roles = [
  'store-manager',
  'district-rep',
  'support-agent',
  'dispatcher',
  'driver',
  'technician',
  'producer-admin',
] as const;
export type Role = (typeof roles)[number];

/** A district rep may be the stores' person or the producer's. */
export const sides = ['store', 'producer'] as const;
export type Side = (typeof sides)[number];

/** What a membership may have beyond its role. */
export const grants = ['read-invoices', 'pay-invoices'] as const;
export type Grant = (typeof grants)[number];

export const defrosts = ['cold_wall', 'auto'] as const;
export type Defrost = (typeof defrosts)[number];

export const placements = ['indoor', 'outdoor'] as const;
export type Placement = (typeof placements)[number];

/** ISO 8601: Monday is 1. */
export type Weekday = 1 | 2 | 3 | 4 | 5 | 6 | 7;
/** Local times of day, `HH:MM`. */
export type Span = { days: Weekday[]; from: string; to: string };

export const storeKinds = ['convenience', 'fuel', 'grocery', 'bait', 'liquor', 'other'] as const;
export type StoreKind = (typeof storeKinds)[number];

export const requestKinds = [
  'not-cooling',
  'door-or-hinge',
  'leak',
  'light',
  'ice-quality',
  'damaged-bags',
  'missing-ice',
  'move-or-remove',
  'other',
  'ice-sooner',
] as const;
export type RequestKind = (typeof requestKinds)[number];

export const requestStates = [
  'new',
  'open',
  'waiting-on-store',
  'scheduled',
  'solved',
  'closed',
  'cancelled',
] as const;
export type RequestState = (typeof requestStates)[number];
export const liveStates = ['new', 'open', 'waiting-on-store', 'scheduled'] as const satisfies RequestState[];

export const entryKinds = ['opened', 'reply', 'note', 'state', 'assigned', 'photos'] as const;
export type EntryKind = (typeof entryKinds)[number];

/** Slugs that would shadow a path outside the producers. */
export const reservedSlugs = ['telemetry', 'auth', 'me', 'openapi.json', 'dev', 'healthz', 'api', 'sign-in', 'profile'];
