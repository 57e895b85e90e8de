import { sites } from '@ligament/domain/schema/sites';
import { eq } from 'drizzle-orm';
import type { Clock } from '../../clock';
import type { Database } from '../../db/database';
import { siteDay } from '../../http/site-day';

/** Today's calendar date at a site. */
export async function todayAt(db: Database, clock: Clock, siteId: string): Promise<string> {
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(sites)
    .where(eq(sites.id, siteId));
  return siteDay(clock.now(), site?.timeZone ?? 'UTC');
}
