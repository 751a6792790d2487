import type { RequestHandler } from 'express';
import { problem } from './problem';
import { sessionCookie } from './session';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses changes that another site asks for: by Fetch Metadata, else by Origin. A request that carries a session
 * cookie and neither header is refused too; one without a cookie (a sensor with its key) needs none.
 */
export const refuseCrossSite =
  (baseUrl: string): RequestHandler =>
  (req, _res, next) => {
    if (SAFE.has(req.method)) return next();
    const site = req.get('sec-fetch-site');
    const origin = req.get('origin');
    const own = [new URL(baseUrl).origin, `${req.protocol}://${req.get('host') ?? ''}`];
    if (site !== undefined) return next(site === 'same-origin' || site === 'none' ? undefined : problem('cross-site'));
    if (origin !== undefined) return next(own.includes(origin) ? undefined : problem('cross-site'));
    const cookie = req.get('cookie') ?? '';
    next(cookie.includes(`${sessionCookie}=`) ? problem('cross-site') : undefined);
  };
