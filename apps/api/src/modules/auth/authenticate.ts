import { sites } from '@ligament/domain/schema/sites';
import { eq } from 'drizzle-orm';
import type { Deps } from '../../deps';
import type { Authenticate } from '../../http/serve';
import { siteDay } from '../../http/site-day';
import { requestId } from '../../http/request-id';
import { sessionStore, type LiveSession } from './session-store';

/** Who a request's cookie stands for, judged anew each time: a disabled person or an ended visit is nobody at once. */
export function authenticateWith(deps: Deps): Authenticate {
  const store = sessionStore(deps.db, deps.clock);
  return async (request, response) => {
    const cookies = request.get('cookie');
    if (!cookies) return null;
    const live = await store.read(cookies);
    if (!live || !(await mayStillEnter(deps, live.person))) return null;
    const { person, session } = live;
    return {
      personId: person.id,
      siteId: person.siteId,
      name: person.name,
      email: person.email,
      role: person.role,
      competence: person.competence,
      sessionId: session.id,
      provedAt: session.provedAt,
      requestId: requestId(response),
    };
  };
}

/** Whether a person is active and, for a visitor, still within the agreed days. */
export async function mayStillEnter(
  { db, clock }: Pick<Deps, 'db' | 'clock'>,
  person: LiveSession['person'],
): Promise<boolean> {
  if (!person.active) return false;
  if (person.accessUntil === null) return true;
  const [site] = await db
    .select({ timeZone: sites.timeZone })
    .from(sites)
    .where(eq(sites.id, person.siteId));
  return site !== undefined && siteDay(clock.now(), site.timeZone) <= person.accessUntil;
}
