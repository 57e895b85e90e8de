import type { Deps } from '../../deps';
import { notFound } from '../../http/failure';
import { logSecurity } from '../../http/security-log';
import { writeHistory } from '../history/write-history';
import { accountRepository } from './account.repository';
import { readToken, spendToken } from './one-time-token';
import { hashPassword } from './password-hash';
import { refuseWeakPassword } from './password-rules';
import { sessionStore, type SessionSource } from './session-store';
import { openSession, type OpenedSession } from './sign-in';

/** An invited person chooses name and password and is signed in. */
export async function acceptInvitation(
  deps: Deps,
  token: string,
  input: { readonly name: string; readonly password: string },
  source: SessionSource & { readonly requestId: string; readonly previousSessionId: string | null },
): Promise<OpenedSession> {
  const { db, clock } = deps;
  const accounts = accountRepository(db);
  const { personId } = await readToken(db, 'invitation', token, clock.now());
  const person = personId ? await accounts.byId(personId) : undefined;
  if (!person) throw notFound('person');
  const site = await accounts.siteOf(person.siteId);
  const { name } = input;
  refuseWeakPassword(input.password, { name, email: person.email, siteName: site?.name ?? '' });
  const passwordHash = await hashPassword(input.password);
  await db.transaction(async (tx) => {
    const now = clock.now();
    await spendToken(tx, 'invitation', token, now);
    await accountRepository(tx).setPassword(person.id, passwordHash, now, name);
    await sessionStore(tx, clock).endAllOf(person.id);
    const { siteId, role } = person;
    await writeHistory(
      tx,
      { siteId, personId: person.id, name, role, requestId: source.requestId },
      now,
      {
        action: 'person.invitation-accepted',
        entity: 'person',
        entityId: person.id,
        summary: `${name} accepted the invitation`,
        before: { name: person.name, invited: true },
        after: { name, invited: false },
      },
    );
  });
  logSecurity(deps.log, 'invitation accepted', { personId: person.id, address: source.address });
  return openSession(deps, person.id, source);
}
