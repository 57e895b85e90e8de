import type { Request } from 'express';
import type { SessionSource } from './session-store';

/** Network address (the proxy's word for it only where a proxy is configured) and browser of a request. */
export const sourceOf = (request: Request): SessionSource => ({
  address: request.ip ?? '',
  userAgent: request.get('user-agent') ?? '',
});
