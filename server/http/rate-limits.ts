import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import type { Config } from '../config/config.ts';
import { ProblemError } from './problems.ts';

const minute = 60_000;

function limiter(limit: number): RequestHandler {
  return rateLimit({
    windowMs: minute,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // Behind no proxy the header is simply not believed; that is no fault to print.
    validate: { xForwardedForHeader: false },
    handler: (_req, _res, next) => next(new ProblemError('rate-limited', { retryAfter: 60 })),
  });
}

/** So many requests a minute from one address, and a hundredth of that for signing in and renewing. */
export function rateLimits(config: Config): { all: RequestHandler; signIn: RequestHandler } {
  const signIn = limiter(Math.max(1, Math.round(config.rateLimitPerMinute / 100)));
  return {
    all: limiter(config.rateLimitPerMinute),
    signIn: (req, res, next) => (req.method === 'POST' ? signIn(req, res, next) : next()),
  };
}
