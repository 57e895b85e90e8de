import type { invitePerson as inviteRoute, Person } from '@ligament/domain/contract/people';
import type { z } from 'zod';
import type { Transaction } from '../../db/database';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, unacceptable } from '../../http/failure';
import { queueInvitation } from '../auth/account-mail';
import { issueToken } from '../auth/one-time-token';
import { writeHistory } from '../history/write-history';
import { peopleRepository, type PersonRow } from './people.repository';
import { noSuchPerson, personSnapshot } from './person-view';
import { readPerson, siteToday } from './read-people';

type Input = z.output<typeof inviteRoute.body>;

/** Gives a person access and mails them a link with which they choose their own password. */
export function invitePerson(deps: Deps, actor: Actor, input: Input): Promise<Person> {
  return deps.db.transaction(async (tx) => {
    const now = deps.clock.now();
    const repository = peopleRepository(tx);
    if (await repository.emailTaken(input.email)) {
      throw conflict(
        'person.email-taken',
        'Somebody has access with this e-mail address already.',
        'email',
      );
    }
    if (
      input.accessUntil !== null &&
      input.accessUntil < (await siteToday(tx, actor.siteId, now))
    ) {
      throw unacceptable(
        'person.access-until',
        'The last day of access lies in the past.',
        'accessUntil',
      );
    }
    const person = await repository.add({
      ...input,
      siteId: actor.siteId,
      createdAt: now,
      updatedAt: now,
    });
    if (!person) throw new Error('the invited person was not returned');
    await sendInvitation(deps, tx, actor, person, now);
    await writeHistory(tx, actor, now, {
      action: 'person.invited',
      entity: 'person',
      entityId: person.id,
      summary: `Invited ${person.name} as ${person.role}`,
      after: personSnapshot(person),
    });
    return readPerson(tx, actor.siteId, person.id, now);
  });
}

/** Sends the invitation again, with a new link; the earlier one stops working. */
export function resendInvitation(deps: Deps, actor: Actor, id: string): Promise<Person> {
  return deps.db.transaction(async (tx) => {
    const now = deps.clock.now();
    const found = await peopleRepository(tx).byId(actor.siteId, id, now);
    if (!found) throw noSuchPerson();
    const { person } = found;
    if (!person.active) {
      throw conflict('person.disabled', `${person.name} is disabled. Give access again first.`);
    }
    if (person.passwordHash !== null) {
      throw conflict(
        'person.accepted',
        `${person.name} has accepted the invitation already. A forgotten password is reset on the sign-in page.`,
      );
    }
    await sendInvitation(deps, tx, actor, person, now);
    await writeHistory(tx, actor, now, {
      action: 'person.invitation-resent',
      entity: 'person',
      entityId: person.id,
      summary: `Sent the invitation of ${person.name} again`,
    });
    return readPerson(tx, actor.siteId, person.id, now);
  });
}

async function sendInvitation(
  { config }: Deps,
  tx: Transaction,
  actor: Actor,
  person: PersonRow,
  now: Date,
): Promise<void> {
  const site = await peopleRepository(tx).siteOf(actor.siteId);
  const token = await issueToken(tx, 'invitation', person.id, now);
  await queueInvitation(
    tx,
    config,
    { ...person, siteName: site?.name ?? '' },
    actor.name,
    token,
    now,
  );
}
