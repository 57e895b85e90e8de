import type { Person, PersonChange } from '@ligament/domain/contract/people';
import type { Transaction } from '../../db/database';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, forbidden, staleVersion } from '../../http/failure';
import { logSecurity } from '../../http/security-log';
import { sessionStore } from '../auth/session-store';
import { writeHistory } from '../history/write-history';
import { peopleRepository, type PersonRow } from './people.repository';
import { noSuchPerson, personSnapshot } from './person-view';
import { readPerson, siteToday } from './read-people';

/** Changes a person. Another role, or no access any more, ends their sessions in the same breath. */
export function changePerson(
  deps: Deps,
  actor: Actor,
  id: string,
  seen: number,
  change: PersonChange,
): Promise<Person> {
  const { db, clock, log } = deps;
  return db.transaction(async (tx) => {
    const now = clock.now();
    const repository = peopleRepository(tx);
    await repository.lockSite(actor.siteId);
    const found = await repository.byId(actor.siteId, id, now);
    if (!found) throw noSuchPerson();
    const before = found.person;
    if (before.version !== seen) {
      throw staleVersion('person', await readPerson(tx, actor.siteId, id, now));
    }
    const today = await siteToday(tx, actor.siteId, now);
    await keepAdministered(tx, actor, before, change, today);
    const after = await repository.change(actor.siteId, id, seen, { ...change, updatedAt: now });
    if (!after) throw staleVersion('person', await readPerson(tx, actor.siteId, id, now));
    if (losesStanding(before, after, today)) {
      const ended = await sessionStore(tx, clock).endAllOf(id);
      logSecurity(log, 'sessions ended', { personId: id, by: actor.personId, ended });
    }
    await writeHistory(tx, actor, now, {
      action: actionOf(before, after),
      entity: 'person',
      entityId: id,
      summary: summaryOf(before, after),
      before: personSnapshot(before),
      after: personSnapshot(after),
    });
    return readPerson(tx, actor.siteId, id, now);
  });
}

/** Nobody changes their own role or access, and a site always keeps somebody who can administer it. */
async function keepAdministered(
  tx: Transaction,
  actor: Actor,
  before: PersonRow,
  change: PersonChange,
  today: string,
): Promise<void> {
  const after = { ...before, ...change };
  const loses = losesStanding(before, after, today);
  if (loses && before.id === actor.personId) {
    throw forbidden(
      'Nobody changes their own role or ends their own access; another administrator has to.',
    );
  }
  const administers = before.role === 'administrator' && before.active;
  if (!loses || !administers) return;
  if (await peopleRepository(tx).hasOtherAdministrator(before.siteId, before.id, today)) return;
  throw conflict(
    'person.last-administrator',
    `${before.name} is the last administrator of this site. Make somebody else an administrator first.`,
  );
}

type Standing = Pick<PersonRow, 'role' | 'active' | 'accessUntil'>;

/** Whether the change takes rights away or moves them, so that open sessions must end. */
const losesStanding = (before: Standing, after: Standing, today: string): boolean =>
  before.role !== after.role ||
  (before.active && !after.active) ||
  (after.accessUntil !== null && after.accessUntil < today);

function actionOf(before: PersonRow, after: PersonRow): string {
  if (before.active && !after.active) return 'person.disabled';
  if (!before.active && after.active) return 'person.enabled';
  return before.role === after.role ? 'person.changed' : 'person.role-changed';
}

function summaryOf(before: PersonRow, after: PersonRow): string {
  if (before.active && !after.active) return `Ended the access of ${after.name}`;
  if (!before.active && after.active) return `Gave ${after.name} access again`;
  if (before.role !== after.role)
    return `Changed the role of ${after.name} from ${before.role} to ${after.role}`;
  return `Changed the record of ${after.name}`;
}
