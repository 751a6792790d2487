import { createHash, randomBytes } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import session, { Store, type SessionData } from 'express-session';
import { eq, lt, sessions, sql, type Database } from '../db';
import type { Config } from '../config';
import type { Services } from './context';
import { problem } from './problem';

declare module 'express-session' {
  interface SessionData {
    personId?: string;
    handle?: string;
    device?: string;
    startedAt?: number;
    staff?: boolean;
    /** As the row said when the session was read. */
    seenAt?: number;
  }
}

export const sessionCookie = 'nilas.session';
const HOUR = 3_600_000;
const DAY = 24 * HOUR;
/** Idle and absolute limits in milliseconds. */
export const sessionLimits = {
  store: { idle: 30 * DAY, absolute: 180 * DAY },
  staff: { idle: 12 * HOUR, absolute: 30 * DAY },
};
const TOUCH_EVERY = 60_000;

export const hash = (value: string): string => createHash('sha256').update(value).digest('base64url');

/** Sessions in SQLite: ids only as hashes, a person's own listable, limits by side. */
class SqliteSessions extends Store {
  /** Asked with every request, so built once. */
  private readonly byId;

  constructor(
    private readonly db: Database,
    private readonly now: () => number,
  ) {
    super();
    this.byId = db
      .select({ data: sessions.data, seenAt: sessions.seenAt, expiresAt: sessions.expiresAt })
      .from(sessions)
      .where(eq(sessions.id, sql.placeholder('id')))
      .prepare();
  }

  get = (sid: string, done: (error: unknown, data?: SessionData | null) => void): void => {
    attempt(done, () => {
      const found = this.byId.get({ id: hash(sid) });
      if (!found || found.expiresAt <= this.now()) return null;
      // Written by `set` below and by nothing else.
      return { ...(JSON.parse(found.data) as SessionData), seenAt: found.seenAt };
    });
  };

  set = (sid: string, data: SessionData, done: (error?: unknown) => void = () => {}): void => {
    attempt(done, () => {
      const now = this.now();
      const { personId, handle = randomBytes(9).toString('base64url'), device = '', startedAt = now } = data;
      const row = { data: JSON.stringify({ ...data, seenAt: undefined, handle, startedAt }), seenAt: now, expiresAt: expiry(data, now) };
      if (data.seenAt !== undefined) {
        // It was read before this; if it has ended meanwhile, it stays ended.
        this.db.update(sessions).set(row).where(eq(sessions.id, hash(sid))).run();
        return;
      }
      this.db
        .insert(sessions)
        .values({ id: hash(sid), personId, handle, device, createdAt: startedAt, ...row })
        .onConflictDoUpdate({ target: sessions.id, set: row })
        .run();
    });
  };

  /** Moves the idle limit, at most once a minute. */
  override touch = (sid: string, data: SessionData, done: () => void = () => {}): void => {
    attempt(done, () => {
      const now = this.now();
      if (now - (data.seenAt ?? now) < TOUCH_EVERY) return;
      this.db.update(sessions).set({ seenAt: now, expiresAt: expiry(data, now) }).where(eq(sessions.id, hash(sid))).run();
    });
  };

  destroy = (sid: string, done: (error?: unknown) => void = () => {}): void => {
    attempt(done, () => void this.db.delete(sessions).where(eq(sessions.id, hash(sid))).run());
  };
}

function attempt<T>(done: (error: unknown, value?: T) => void, work: () => T): void {
  let value: T;
  try {
    value = work();
  } catch (error) {
    return done(error);
  }
  done(null, value);
}

function expiry({ staff, startedAt }: SessionData, now: number): number {
  const { idle, absolute } = staff ? sessionLimits.staff : sessionLimits.store;
  return Math.min(now + idle, (startedAt ?? now) + absolute);
}

export const expireSessions = (db: Database, now: number): number => db.delete(sessions).where(lt(sessions.expiresAt, now)).run().changes;

export const sessionMiddleware = (config: Config, db: Database, now: () => number): RequestHandler =>
  session({
    name: sessionCookie,
    secret: config.secret,
    store: new SqliteSessions(db, now),
    resave: false,
    saveUninitialized: false,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: config.baseUrl.startsWith('https:'),
      maxAge: sessionLimits.store.absolute,
      path: '/',
    },
  });

/** Gives the browser a new session of this person; the old id is gone. */
export function startSession(services: Services, req: Request, personId: string): Promise<void> {
  const staff = services.system.membershipsOf(personId).some(({ membership }) => membership.side === 'producer');
  return new Promise((resolve, reject) => {
    req.session.regenerate((error) => {
      if (error) return reject(error instanceof Error ? error : new Error(String(error)));
      Object.assign(req.session, {
        personId,
        staff,
        startedAt: services.now(),
        handle: randomBytes(9).toString('base64url'),
        device: deviceOf(req.get('user-agent') ?? ''),
      });
      req.session.save((fault) => (fault ? reject(fault instanceof Error ? fault : new Error(String(fault))) : resolve()));
    });
  });
}

export const endOwnSession = (req: Request): Promise<void> =>
  new Promise((resolve, reject) => {
    req.session.destroy((error) => (error ? reject(error instanceof Error ? error : new Error(String(error))) : resolve()));
  });

/** Who is asking; somebody deactivated is nobody from the next request on. */
export function signedIn(services: Services, req: Request): SignedIn {
  const found = whoIs(services, req);
  if (!found) throw problem('not-signed-in');
  return found;
}

interface SignedIn {
  personId: string;
  handle: string;
}

export function whoIs({ system }: Services, req: Request): SignedIn | null {
  const { personId, handle } = req.session;
  return personId && handle && system.activePerson(personId) ? { personId, handle } : null;
}

/** Before a large body is taken in. */
export const requireSession =
  (services: Services): RequestHandler =>
  (req, _res, next) => {
    signedIn(services, req);
    next();
  };

const BROWSERS = ['Edg', 'Firefox', 'Chrome', 'Safari'];
const SYSTEMS = ['iPhone', 'iPad', 'Android', 'Windows', 'Mac OS', 'Linux'];
/** A short name a person recognises: "Chrome, Android". */
function deviceOf(userAgent: string): string {
  const browser = BROWSERS.find((name) => userAgent.includes(name));
  const system = SYSTEMS.find((name) => userAgent.includes(name));
  return [browser === 'Edg' ? 'Edge' : browser, system].filter(Boolean).join(', ') || userAgent.slice(0, 40);
}
