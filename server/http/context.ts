import type { Logger } from 'pino';
import type { Ability, Action, Subject, Viewer } from '../contract/ability';
import type { Language } from '../contract/words';
import type { Config } from '../config';
import type { Database, FleetPart, Producer, ProducerDb, SystemDb } from '../db';
import type { MailMessage } from '../features/mail/compose';
import type { Storage } from '../ports/storage';
import type { Seen } from './seeing';
import type { Pipeline } from '../telemetry/pipeline';

/** Everything built once at start; only routes' plumbing holds it whole. */
export interface Services {
  config: Config;
  db: Database;
  system: SystemDb;
  storage: Storage;
  pipeline: Pipeline;
  log: Logger;
  now: () => number;
  newId: () => string;
  /** 32 random bytes as text. */
  newSecret: () => string;
  /** Multiplies the limits on how often something may be asked; tests raise it. */
  patience: number;
}

/** A transaction of one business act: it must say who may and what changed, or it does not commit. */
export interface ActionTx {
  db: ProducerDb;
  authorise: (action: Action, type: Subject, row: object) => void;
  /** What changed, for the audit trail; ids and plain values only, no names. */
  audit: (type: Subject, id: string, changes: Record<string, unknown>) => void;
  mail: (message: MailMessage) => void;
  /** Works out anew what the readings of a freezer mean and how lists show it: after its lanes, measures or sensor changed. */
  freezerChanged: (freezerId: string) => void;
  /** Writes anew how lists show freezers: after something else that they show changed. */
  listAnew: (part: FleetPart) => void;
  /** Changes the producer itself; a new risk limit is worked out for its freezers. */
  changeProducer: (patch: Parameters<SystemDb['changeProducer']>[1]) => void;
  /** Gives a member's person another language. */
  speak: (memberId: string, language: Language) => void;
  /** The person of an address, made where there is none. */
  personOf: (wanted: { email: string; name: string; language: Language }) => string;
}

/** What a handler of a producer's route holds: neither the raw database nor the producer's id. */
export interface ProducerContext {
  db: ProducerDb;
  viewer: Viewer;
  ability: Ability;
  /** Of whoever reads the answer. */
  language: Language;
  producer: Omit<Producer, 'id' | 'createdAt'>;
  /** The same, as it stands after an act. */
  readProducer: () => Omit<Producer, 'id' | 'createdAt'>;
  now: number;
  newId: () => string;
  newSecret: () => string;
  storage: Storage;
  baseUrl: string;
  /** The only door to writing. */
  act: <T>(name: string, work: (tx: ActionTx) => T) => T;
}

export interface PersonContext {
  system: SystemDb;
  /** Whose session it is, or who it sees as. */
  personId: string;
  seen: Seen | null;
  sessionHandle: string;
  now: number;
}
