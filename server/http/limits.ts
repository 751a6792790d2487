import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { problem } from './problem';

interface Limit {
  seconds: number;
  most: number;
  /** Who is counted; the address unless said. */
  key?: (req: Request) => string;
}

/** At most so many in so many seconds, answered with how long to wait. */
export const limit = ({ seconds, most, key }: Limit, patience: number): RequestHandler =>
  rateLimit({
    windowMs: seconds * 1000,
    limit: most * patience,
    // Who is under the limit needs no word of it, and working it out costs more than the answer.
    standardHeaders: false,
    legacyHeaders: false,
    keyGenerator: key ?? addressOf,
    handler: (_req, _res, next) => next(problem('too-many-requests', { seconds })),
  });

export const addressOf = (req: Request): string => ipKeyGenerator(req.ip ?? '');
