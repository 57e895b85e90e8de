import type { RequestHandler } from 'express';
import { forbidden } from './failure';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses writes that another site's page could have sent: the browser must say same-origin, or the Origin must be ours,
 * and the body must be of a kind that a plain form cannot send unless our own header is there too.
 */
export function sameOriginOnly(publicUrl: string): RequestHandler {
  const ours = new URL(publicUrl);
  return (request, _response, next) => {
    if (SAFE.has(request.method)) return next();
    const site = request.get('sec-fetch-site');
    const origin = request.get('origin');
    if (site !== undefined && site !== 'same-origin') throw refusal();
    if (origin !== undefined && !isOurs(origin, ours, request.get('host'))) throw refusal();
    if (site === undefined && origin === undefined) throw refusal();
    const json =
      request.is('application/json') !== false && request.is('application/json') !== null;
    if (!json && request.get('x-requested-with') !== 'ligament') throw refusal();
    return next();
  };
}

const refusal = () =>
  forbidden('The request did not come from this product’s own pages, so nothing was changed.');

/** Our configured address, or this machine itself on the port that was asked. */
function isOurs(origin: string, ours: URL, host: string | undefined): boolean {
  if (!URL.canParse(origin)) return false;
  const from = new URL(origin);
  if (from.origin === ours.origin) return true;
  return from.host === host && ['localhost', '127.0.0.1', '[::1]'].includes(from.hostname);
}
