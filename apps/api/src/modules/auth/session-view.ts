import type { SessionView } from '@ligament/domain/contract/session';
import type { Database } from '../../db/database';
import { Failure } from '../../http/failure';
import { accountRepository } from './account.repository';

/** What a signed-in page shows of its session. */
export async function sessionView(db: Database, sessionId: string): Promise<SessionView> {
  const facts = await accountRepository(db).sessionFacts(sessionId);
  if (!facts) throw new Failure('unauthenticated', 401, 'Not signed in', 'Sign in to go on.');
  const { session, person, site } = facts;
  const ends = Math.min(session.expiresAt.getTime(), session.absoluteExpiresAt.getTime());
  return {
    user: {
      id: person.id,
      name: person.name,
      email: person.email,
      role: person.role,
      organisation: person.organisation,
    },
    site: {
      id: site.id,
      code: site.code,
      name: site.name,
      timeZone: site.timeZone,
      demo: site.demo,
    },
    expiresAt: new Date(ends).toISOString(),
  };
}
