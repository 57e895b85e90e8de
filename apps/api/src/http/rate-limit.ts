import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import { Failure } from './failure';

const MINUTE = 60_000;

/** At most so many requests a minute from one network address; a flood is refused before anything is looked up. */
export function limitPerMinute(limit: number): RequestHandler {
  return rateLimit({
    windowMs: MINUTE,
    limit,
    standardHeaders: false,
    legacyHeaders: false,
    // Express decides whose address counts (the proxy's word only where a proxy is configured)
    validate: { xForwardedForHeader: false, trustProxy: false },
    handler: (_request, _response, next) => {
      next(
        new Failure(
          'rate-limited',
          429,
          'Too many requests',
          'More requests came from your network address than this server takes. Try again in a minute.',
          { retryAfterSeconds: 60 },
        ),
      );
    },
  });
}
