import { createHmac, randomBytes, randomInt } from 'node:crypto';
import type { Request, Response } from 'express';
import { Strategy as MagicLinkStrategy } from 'passport-magic-link';
import passport from 'passport';
import { outbox } from '../../db';
import type { Services } from '../../http/context';
import { problem } from '../../http/problem';
import { hash } from '../../http/session';
import { composeMail } from '../mail/compose';
import { nextWithin } from './next-within';

export const linkMinutes = 10;
const MOST_TRIES = 5;
const askerCookie = 'nilas.asker';

interface Ask {
  email: string;
  next: string;
  asker: string;
  /** The strategy answers every failure alike; the true one is kept for our own handler. */
  failure?: unknown;
}

interface Claimed extends Record<string, unknown> {
  id: string;
  personId: string | null;
}

// What a request carries through the strategy, so that neither body nor link says who is asking.
const asks = new WeakMap<Request, Ask>();

/**
 * passport-magic-link, wrapped so that its token carries only a one-time value: the address never enters it, its own
 * memory of used tokens is off, and a link is claimed by one statement in the database.
 */
export function magicLink(services: Services) {
  const secret = createHmac('sha256', services.config.secret).update('magic-link').digest('base64url');
  const strategy = new MagicLinkStrategy(
    { secret, userFields: ['nonce'], tokenField: 'token', ttl: linkMinutes * 60, passReqToCallbacks: true, verifyUserAfterToken: true },
    async (req: Request, _fields: Record<string, unknown>, token: string) => {
      const ask = asks.get(req);
      if (!ask) throw new Error('a token was made for nobody');
      try {
        keepLink(services, secret, ask, token);
      } catch (error) {
        ask.failure = error;
      }
    },
    async (req: Request) => claimByToken(services, req.body?.token),
  );
  // Its own registry: the library's shared one would mix two servers in one process.
  const authenticator = new passport.Passport();
  authenticator.use(strategy);

  const run = (action: 'requestToken' | 'acceptToken', req: Request, res: Response) =>
    new Promise<Claimed | undefined>((resolve, reject) => {
      authenticator.authenticate(strategy.name, { action, session: false, allowReuse: true }, (error: unknown, found?: Claimed | false) =>
        error ? reject(error instanceof Error ? error : new Error('sign-in failed')) : resolve(found || undefined),
      )(req, res, () => resolve(undefined));
    });

  return {
    /** Writes the link and its mail, or as much that nobody ever reads: the work is the same for a stranger. */
    async request(req: Request, res: Response, email: string, next: string | undefined): Promise<void> {
      const ask: Ask = { email, next: nextWithin(next), asker: askerOf(services, req, res) };
      asks.set(req, ask);
      req.body = { nonce: randomBytes(32).toString('base64url') };
      await run('requestToken', req, res);
      if (ask.failure) throw ask.failure;
    },

    /** The person whose link this browser may use; each way it cannot be is its own problem. */
    async accept(req: Request, res: Response, given: { token?: string; code?: string }): Promise<string> {
      // Without either, having asked would be enough to be let in.
      if (!given.token && !given.code) throw problem('bad-input', undefined, [{ pointer: '/code', fault: 'required' }]);
      const now = services.now();
      const asker = askerCookieOf(req);
      const link = given.token
        ? services.system.signInLinkByToken(hash(given.token))
        : services.system.openLinkOfAsker(hash(asker ?? ''), now);
      if (!link || link.usedAt !== null || link.expiresAt <= now) throw problem('link-expired');
      if (given.code) checkCode(services, secret, link, given.code);
      else if (!asker || link.askerHash !== hash(asker)) throw problem('link-other-browser');
      if (!given.token) return personOf(claimById(services, link.id));
      req.body = { token: given.token };
      return personOf(await run('acceptToken', req, res));
    },
  };
}

export type MagicLink = ReturnType<typeof magicLink>;

function keepLink(services: Services, secret: string, ask: Ask, token: string): void {
  const { db, system, newId, now, config } = services;
  const person = system.personByEmail(ask.email);
  const code = String(randomInt(1_000_000)).padStart(6, '0');
  const at = now();
  const id = newId();
  const mail = composeMail(
    {
      template: 'sign-in',
      to: ask.email,
      language: person?.language ?? 'en',
      params: { name: person?.name ?? '', code },
      path: `/sign-in/confirm#token=${token}&next=${encodeURIComponent(ask.next)}`,
    },
    config.baseUrl,
  );
  db.$client.transaction(() => {
    system.addSignInLink({
      id,
      personId: person?.id ?? null,
      tokenHash: hash(token),
      codeHash: codeHash(secret, id, code),
      askerHash: hash(ask.asker),
      next: ask.next,
      expiresAt: at + linkMinutes * 60_000,
    });
    // A stranger's row is written done and empty.
    const row = { kind: 'mail', payload: person ? JSON.stringify(mail) : '', doneAt: person ? null : at, dueAt: at, createdAt: at };
    db.insert(outbox).values({ id: newId(), ...row }).run();
  })();
}

function claimByToken(services: Services, token: unknown): Claimed | null {
  const link = typeof token === 'string' ? services.system.signInLinkByToken(hash(token)) : undefined;
  return link ? claimById(services, link.id) : null;
}

function claimById(services: Services, id: string): Claimed | null {
  const claimed = services.system.claimLink(id, services.now());
  return claimed ? { id, personId: claimed.personId } : null;
}

function personOf(claimed: Claimed | null | undefined): string {
  if (!claimed?.personId) throw problem('link-expired');
  return claimed.personId;
}

function checkCode(services: Services, secret: string, link: { id: string; codeHash: string }, code: string): void {
  if (!services.system.countTry(link.id, MOST_TRIES)) throw problem('too-many-tries');
  if (codeHash(secret, link.id, code) !== link.codeHash) throw problem('code-wrong');
}

/** Six digits are few, so the hash is keyed and salted by the link. */
const codeHash = (secret: string, linkId: string, code: string): string =>
  createHmac('sha256', secret).update(`${linkId}:${code}`).digest('base64url');

function askerOf({ config }: Services, req: Request, res: Response): string {
  const asker = askerCookieOf(req) ?? randomBytes(24).toString('base64url');
  const secure = config.baseUrl.startsWith('https:');
  res.cookie(askerCookie, asker, { httpOnly: true, sameSite: 'lax', secure, maxAge: 86_400_000, path: '/api/auth' });
  return asker;
}

const askerCookieOf = (req: Request): string | undefined =>
  new RegExp(`(?:^|;\\s*)${askerCookie.replace('.', '\\.')}=([\\w-]{20,60})`).exec(req.get('cookie') ?? '')?.[1];
