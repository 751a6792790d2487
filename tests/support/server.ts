import { createHmac } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import type { Express } from 'express';
import { pino } from 'pino';
import request from 'supertest';
import { localMail } from '../../server/adapters/mail/local';
import { buildApp } from '../../server/app';
import { asc, localMails, migrateDatabase, openDatabase, outbox, people, eq, memberships, sessions, systemDb, type Database } from '../../server/db';
import { acrossProducers } from '../../server/db/statement-hook';
import type { Services } from '../../server/http/context';
import { hash, sessionCookie } from '../../server/http/session';
import { sendDue } from '../../server/jobs/outbox';
import type { Mail } from '../../server/ports/mail';
import type { Storage } from '../../server/ports/storage';
import { openPipeline } from '../../server/telemetry/pipeline';
import { alder, alderPeople, birch, birchPeople, twin, twinPeople } from '../cast';
import { morning, photoFiles, plantProducer } from '../factories';

const root = path.resolve(import.meta.dirname, '../..');
const secret = 'only-a-secret-of-the-tests-0123456789';

export type World = 'nobody' | 'alder' | 'alder-and-birch' | 'all';

export interface TestApp {
  app: Express;
  services: Services;
  db: Database;
  url: string;
  clock: { now: number };
  /** What the server wrote to its log. */
  log: string[];
  /** Starts the ids again, so that the same acts make the same ids. */
  resetIds: () => void;
  /** Does the work and undoes what it wrote. */
  undone: <T>(work: () => Promise<T>) => Promise<T>;
  close: () => Promise<void>;
}

/** The whole server in this process: data in memory, frozen clock, ids in order, limits out of the way. */
export async function testApp(world: World = 'alder-and-birch', change: (services: Services) => Services = (services) => services): Promise<TestApp> {
  const db = openDatabase(':memory:');
  migrateDatabase(db, path.join(root, 'drizzle'));
  plant(db, world);
  const clock = { now: morning };
  const ids = { next: 1 };
  const log: string[] = [];
  const now = () => clock.now;
  const newId = () => `00000000-0000-7000-8000-${String(ids.next++).padStart(12, '0')}`;
  const system = systemDb(db);
  const services = change({
    config: { mode: 'test', port: 0, host: '127.0.0.1', dataDir: '', baseUrl: 'http://portal.example', secret, mailFrom: 'Nilas <ice@nilas.example>', trustProxy: 0, logLevel: 'info' },
    db,
    system,
    storage: memoryStorage([alder, birch, twin].flatMap(photoFiles)),
    pipeline: openPipeline(db, { now, newId, nextSensorNo: system.nextSensorNo }),
    log: pino({ level: 'info' }, { write: (line: string) => void log.push(line) }),
    now,
    newId,
    newSecret: () => hash(newId()),
    patience: 1e6,
  });
  const app = buildApp(services, path.join(root, 'tests/.out/no-client'));
  const server = app.listen(0, '127.0.0.1');
  await new Promise((resolve) => server.once('listening', resolve));
  // Listening on a port, so the address is one of the internet.
  const { port } = server.address() as AddressInfo;
  return {
    app,
    services,
    db,
    url: `http://127.0.0.1:${port}`,
    clock,
    log,
    resetIds: () => void (ids.next = 1),
    undone: (work) => undone(db, work),
    close: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await services.pipeline.stop();
      db.$client.close();
    },
  };
}

/** Those who must stay unseen are planted first: a query that forgets its producer finds them first. */
function plant(db: Database, world: World): void {
  if (world === 'nobody') return;
  if (world === 'all') plantProducer(db, twin, twinPeople, 201);
  if (world !== 'alder') plantProducer(db, birch, birchPeople, 101);
  plantProducer(db, alder, alderPeople, 1);
}

/** SQLite's own undo; the server's transactions become savepoints inside. */
async function undone<T>(db: Database, work: () => Promise<T>): Promise<T> {
  db.$client.exec('begin');
  try {
    return await work();
  } finally {
    db.$client.exec('rollback');
  }
}

function memoryStorage(files: string[]): Storage {
  const kept = new Map<string, Buffer>(files.map((name) => [name, Buffer.from(`picture ${name}`)]));
  return {
    put: (name, bytes) => Promise.resolve(void kept.set(name, bytes)),
    get: (name) => Promise.resolve(kept.get(name) ?? null),
  };
}

export type Agent = ReturnType<typeof request.agent>;

/** A browser on the portal's own page, signed in as nobody. */
export const browser = ({ url }: TestApp): Agent => request.agent(url).set('sec-fetch-site', 'same-origin');

/** A browser that is signed in already. */
export const browserOf = (test: TestApp, { email }: { email: string }): Agent => browser(test).set('cookie', cookieOf(test, email));

/** A session as the server keeps it, without the way through the mail; its names are made of the address. */
export function cookieOf({ db, clock }: TestApp, email: string): string {
  const id = `session-of-${email}`;
  const person = db.select().from(people).where(eq(people.email, email)).get();
  if (!person) throw new Error(`nobody in the cast is ${email}`);
  const now = clock.now;
  const staff = acrossProducers('a test', () => db.select().from(memberships).where(eq(memberships.personId, person.id)).all()).some(({ side }) => side === 'producer');
  const handle = hash(id).slice(0, 12);
  const data = { cookie: { originalMaxAge: null, path: '/', httpOnly: true }, personId: person.id, staff, startedAt: now, handle, device: 'Test' };
  db.insert(sessions)
    .values({ id: hash(id), personId: person.id, handle, data: JSON.stringify(data), device: 'Test', createdAt: now, seenAt: now, expiresAt: now + 12 * 3_600_000 })
    .onConflictDoNothing()
    .run();
  const signature = createHmac('sha256', secret).update(id).digest('base64').replace(/=+$/, '');
  return `${sessionCookie}=${encodeURIComponent(`s:${id}.${signature}`)}`;
}

/** Mail that waits to be sent, oldest first. */
export const waitingMail = ({ db }: Pick<TestApp, 'db'>): Mail[] =>
  db
    .select()
    .from(outbox)
    .orderBy(asc(outbox.createdAt), asc(outbox.id))
    .all()
    .filter(({ payload }) => payload !== '')
    // Written by the server as a composed mail.
    .map(({ payload }) => JSON.parse(payload) as Mail);

/** Sends what waits to the local mailbox and answers it whole, oldest first. */
export async function deliveredMail({ services, db }: TestApp): Promise<Mail[]> {
  const { log, now, config } = services;
  await sendDue({ db, mail: localMail(db, config.mailFrom, now), log, now });
  return db.select().from(localMails).orderBy(asc(localMails.at), asc(localMails.id)).all();
}

export interface SignInMail {
  token: string;
  code: string;
  next: string;
  mail: Mail;
}

/** Asks for a link as a person would and reads the newest mail to that address. */
export async function askForLink(test: TestApp, agent: Agent, email: string, next?: string): Promise<SignInMail> {
  await agent.post('/api/auth/link').send({ email, next }).expect(202);
  const mail = (await deliveredMail(test)).filter(({ to }) => to === email).at(-1);
  const found = /#token=([^&\s]+)&next=(\S+)/.exec(mail?.text ?? '');
  const code = /\b(\d{6})\b/.exec(mail?.subject ?? '')?.[1];
  if (!mail || !found?.[1] || !found[2] || !code) throw new Error(`no sign-in mail for ${email}`);
  return { token: found[1], next: decodeURIComponent(found[2]), code, mail };
}

/** The whole way: ask, read the mail, press the button. */
export async function signIn(test: TestApp, agent: Agent, { email }: { email: string }): Promise<void> {
  const { token } = await askForLink(test, agent, email);
  await agent.post('/api/auth/session').send({ token }).expect(204);
}
