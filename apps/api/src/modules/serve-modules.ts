import type { Deps } from '../deps';
import type { Api } from '../http/serve';
import { serveAuth } from './auth/auth.routes';
import { serveSiteRules } from './site-rules/site-rules.routes';
import { servePeople } from './people/people.routes';
import { serveHistory } from './history/history.routes';
import { serveHealth } from './health/health.routes';

/** Every module's routes, in one list. */
export function serveModules(api: Api, deps: Deps): void {
  serveAuth(api, deps);
  serveSiteRules(api, deps);
  servePeople(api, deps);
  serveHistory(api, deps);
  serveHealth(api, deps);
}
