import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { logSecurity } from '../../http/security-log';
import { sessionStore } from '../auth/session-store';
import { writeHistory } from '../history/write-history';
import { peopleRepository } from './people.repository';
import { noSuchPerson } from './person-view';

/** Ends every session of a person, for example when a telephone was lost; the person can sign in again. */
export function endSessions(
  { db, clock, log }: Deps,
  actor: Actor,
  id: string,
): Promise<{ ended: number }> {
  return db.transaction(async (tx) => {
    const now = clock.now();
    const found = await peopleRepository(tx).byId(actor.siteId, id, now);
    if (!found) throw noSuchPerson();
    const ended = await sessionStore(tx, clock).endAllOf(id);
    if (ended === 0) return { ended };
    logSecurity(log, 'sessions ended', { personId: id, by: actor.personId, ended });
    await writeHistory(tx, actor, now, {
      action: 'person.sessions-ended',
      entity: 'person',
      entityId: id,
      summary: `Ended ${ended === 1 ? 'one session' : `${ended} sessions`} of ${found.person.name}`,
    });
    return { ended };
  });
}
