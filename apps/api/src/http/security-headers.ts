import { randomBytes } from 'node:crypto';
import type { RequestHandler, Response } from 'express';
import helmet from 'helmet';

/** The nonce of this answer's scripts and styles. */
export const nonceOf = (response: Response): string => String(response.locals['nonce'] ?? '');

/** Headers of every answer; scripts run only with this answer's nonce. */
export function securityHeaders(https: boolean): RequestHandler[] {
  return [
    (_request, response, next) => {
      response.locals['nonce'] = randomBytes(18).toString('base64');
      next();
    },
    (request, response, next) => {
      const nonce = `'nonce-${nonceOf(response)}'`;
      helmet({
        contentSecurityPolicy: {
          useDefaults: false,
          directives: {
            defaultSrc: ["'none'"],
            scriptSrc: [nonce, "'strict-dynamic'"],
            styleSrc: ["'self'", nonce],
            // charts place their labels with style attributes; style elements still need the nonce
            styleSrcAttr: ["'unsafe-inline'"],
            fontSrc: ["'self'"],
            imgSrc: ["'self'", 'data:', 'blob:'],
            connectSrc: ["'self'"],
            baseUri: ["'self'"],
            formAction: ["'self'"],
            frameAncestors: ["'none'"],
            objectSrc: ["'none'"],
          },
        },
        hsts: https ? { maxAge: 31_536_000, includeSubDomains: false } : false,
        referrerPolicy: { policy: 'no-referrer' },
      })(request, response, next);
    },
  ];
}
