import type { SessionView } from '@ligament/domain/contract/session';
import type { Deps } from '../../deps';
import { logSecurity } from '../../http/security-log';
import { accountRepository } from './account.repository';
import { mayStillEnter } from './authenticate';
import { checkCredentials } from './check-credentials';
import { hashPassword, needsRehash } from './password-hash';
import { sessionStore, type SessionSource } from './session-store';
import { sessionView } from './session-view';

/** A session just opened: what to show, and the cookie to set. */
export interface OpenedSession {
  readonly view: SessionView;
  readonly setCookie: string;
}

/** Signs a person in under a new session; one the browser carried before is ended. */
export async function signIn(
  deps: Deps,
  input: { readonly email: string; readonly password: string },
  source: SessionSource & { readonly previousSessionId: string | null },
): Promise<OpenedSession> {
  const person = await checkCredentials(deps, {
    ...input,
    address: source.address,
    mayEnter: (each) => mayStillEnter(deps, each),
  });
  if (person.passwordHash && needsRehash(person.passwordHash)) {
    await accountRepository(deps.db).rehash(person.id, await hashPassword(input.password));
  }
  logSecurity(deps.log, 'sign-in', { personId: person.id, address: source.address });
  return openSession(deps, person.id, source);
}

/** Opens a session for somebody who has just proved who they are. */
export function openSession(
  deps: Deps,
  personId: string,
  source: SessionSource & { readonly previousSessionId: string | null },
): Promise<OpenedSession> {
  return deps.db.transaction(async (tx) => {
    const store = sessionStore(tx, deps.clock);
    if (source.previousSessionId) await store.end(source.previousSessionId);
    const { id, setCookie } = await store.open(personId, source);
    return { view: await sessionView(tx, id), setCookie };
  });
}
