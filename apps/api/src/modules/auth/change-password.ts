import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { Failure, notFound } from '../../http/failure';
import { logSecurity } from '../../http/security-log';
import { writeHistory } from '../history/write-history';
import { accountRepository } from './account.repository';
import { checkCredentials } from './check-credentials';
import { hashPassword } from './password-hash';
import { refuseWeakPassword } from './password-rules';
import { sessionStore, type SessionSource } from './session-store';

/** Changes one's own password. Every session ends, and this browser goes on under a new one. */
export async function changePassword(
  deps: Deps,
  actor: Actor,
  input: { readonly current: string; readonly next: string },
  source: SessionSource,
): Promise<{ setCookie: string }> {
  const { db, clock } = deps;
  await confirmPassword(deps, actor, input.current, 'current', source.address);
  const site = await accountRepository(db).siteOf(actor.siteId);
  if (!site) throw notFound('site');
  refuseWeakPassword(input.next, { ...actor, siteName: site.name }, 'next');
  const passwordHash = await hashPassword(input.next);
  const opened = await db.transaction(async (tx) => {
    const now = clock.now();
    await accountRepository(tx).setPassword(actor.personId, passwordHash, now);
    const store = sessionStore(tx, clock);
    await store.endAllOf(actor.personId);
    await writeHistory(tx, actor, now, {
      action: 'person.password-changed',
      entity: 'person',
      entityId: actor.personId,
      summary: `${actor.name} changed the password; all other sessions ended`,
    });
    return store.open(actor.personId, source);
  });
  logSecurity(deps.log, 'password changed', { personId: actor.personId });
  return opened;
}

/** Gives the password again before a sign-off; wrong tries count towards the lock like those at the door. */
export async function proveIdentity(
  deps: Deps,
  actor: Actor,
  password: string,
  address: string,
): Promise<void> {
  await confirmPassword(deps, actor, password, 'password', address);
  await sessionStore(deps.db, deps.clock).prove(actor.sessionId);
}

async function confirmPassword(
  deps: Deps,
  actor: Actor,
  password: string,
  field: string,
  address: string,
): Promise<void> {
  try {
    const mayEnter = () => Promise.resolve(true);
    await checkCredentials(deps, { email: actor.email, password, address, mayEnter });
  } catch (error) {
    if (!(error instanceof Failure) || error.code !== 'sign-in.refused') throw error;
    // the session is good, so 401 would wrongly send the person to the sign-in page
    const message = 'This is not your password.';
    throw new Failure('password.wrong', 422, 'Cannot be accepted', message, {
      errors: [{ field, message }],
    });
  }
}
