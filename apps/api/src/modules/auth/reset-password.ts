import { setTimeout as pause } from 'node:timers/promises';
import type { Deps } from '../../deps';
import { logSecurity } from '../../http/security-log';
import { notFound } from '../../http/failure';
import { writeHistory } from '../history/write-history';
import { queuePasswordReset } from './account-mail';
import { accountRepository, type Person } from './account.repository';
import { mayStillEnter } from './authenticate';
import { issueToken, readToken, spendToken } from './one-time-token';
import { hashPassword } from './password-hash';
import { refuseWeakPassword } from './password-rules';
import { sessionStore } from './session-store';
import { throttleKey, throttleRepository } from './throttle.repository';

const ANSWER_AFTER_MILLISECONDS = 200;
const MAILS_PER_HOUR = 5;

/** Mails a link for a new password to whoever has this address; answer and time are the same for an address nobody has. */
export async function requestPasswordReset(deps: Deps, email: string): Promise<{ detail: string }> {
  const sent = pause(ANSWER_AFTER_MILLISECONDS);
  const person = await accountRepository(deps.db).byEmail(email);
  const asked = await throttleRepository(deps.db).countInWindow(
    throttleKey('reset', email),
    deps.clock.now(),
    3_600_000,
  );
  if (person && asked <= MAILS_PER_HOUR && (await mayStillEnter(deps, person))) {
    await mailReset(deps, person);
  }
  await sent;
  return {
    detail:
      'If this address belongs to somebody with access, a mail with a link is on its way. The link works for 30 minutes.',
  };
}

async function mailReset({ db, clock, config, log }: Deps, person: Person): Promise<void> {
  const site = await accountRepository(db).siteOf(person.siteId);
  await db.transaction(async (tx) => {
    const now = clock.now();
    const token = await issueToken(tx, 'password reset', person.id, now);
    await queuePasswordReset(tx, config, { ...person, siteName: site?.name ?? '' }, token, now);
  });
  logSecurity(log, 'password reset asked', { personId: person.id });
}

/** Sets a new password with a token from the mail and ends every session of the person. */
export async function resetPassword(
  deps: Deps,
  token: string,
  password: string,
  requestId: string,
): Promise<void> {
  const { db, clock } = deps;
  const person = await personOfToken(deps, token);
  const site = await accountRepository(db).siteOf(person.siteId);
  refuseWeakPassword(password, { ...person, siteName: site?.name ?? '' });
  const passwordHash = await hashPassword(password);
  await db.transaction(async (tx) => {
    const now = clock.now();
    await spendToken(tx, 'password reset', token, now);
    await accountRepository(tx).setPassword(person.id, passwordHash, now);
    await sessionStore(tx, clock).endAllOf(person.id);
    const { siteId, name, role } = person;
    await writeHistory(tx, { siteId, personId: person.id, name, role, requestId }, now, {
      action: 'person.password-reset',
      entity: 'person',
      entityId: person.id,
      summary: `${name} set a new password with a link sent by mail; all sessions ended`,
    });
  });
  logSecurity(deps.log, 'password reset', { personId: person.id });
}

async function personOfToken({ db, clock }: Deps, token: string): Promise<Person> {
  const { personId } = await readToken(db, 'password reset', token, clock.now());
  const person = personId ? await accountRepository(db).byId(personId) : undefined;
  if (!person) throw notFound('person');
  return person;
}
