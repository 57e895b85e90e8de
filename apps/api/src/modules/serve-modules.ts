import type { Deps } from '../deps';
import type { Api } from '../http/serve';
import { serveAuth } from './auth/auth.routes';

/** Every module's routes, in one list. */
export function serveModules(api: Api, deps: Deps): void {
  serveAuth(api, deps);
}
