import { readHealth } from '@ligament/domain/contract/health';
import { sql } from 'drizzle-orm';
import type { Deps } from '../../deps';
import type { Api } from '../../http/serve';
import { VERSION } from '../../version';

/** Tells a load balancer or a watchman whether requests can be served. */
export function serveHealth(api: Api, deps: Deps): void {
  api.serve(readHealth, async ({ response }) => {
    const up = deps.databaseHealthy() && (await answers(deps));
    if (!up) response.status(503);
    const health = {
      database: up ? 'up' : 'down',
      status: up ? 'ok' : 'degraded',
      version: VERSION,
    } as const;
    if (!up) response.json(health);
    return health;
  });
}

async function answers({ db, log }: Deps): Promise<boolean> {
  try {
    await db.execute(sql`select 1`);
    return true;
  } catch (error) {
    log.error({ err: error }, 'health check: the database does not answer');
    return false;
  }
}
