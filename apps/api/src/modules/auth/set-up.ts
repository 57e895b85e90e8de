import { randomUUID } from 'node:crypto';
import type { setUp as setUpRoute } from '@ligament/domain/contract/session';
import { people } from '@ligament/domain/schema/people';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import { conflict, unacceptable } from '../../http/failure';
import { logSecurity } from '../../http/security-log';
import { writeHistory } from '../history/write-history';
import { accountRepository } from './account.repository';
import { readToken, spendToken } from './one-time-token';
import { openSite } from './open-site';
import { hashPassword } from './password-hash';
import { refuseWeakPassword } from './password-rules';
import type { SessionSource } from './session-store';
import { openSession, type OpenedSession } from './sign-in';

type Input = z.output<typeof setUpRoute.body>;

/** Creates the site and its first administrator, once in the life of a database. */
export async function setUp(
  deps: Deps,
  input: Input,
  source: SessionSource & { readonly requestId: string },
): Promise<OpenedSession> {
  const { db, clock } = deps;
  refuseUnknownTimeZone(input.timeZone);
  refuseWeakPassword(input.password, input);
  await readToken(db, 'set-up', input.token, clock.now());
  const passwordHash = await hashPassword(input.password);
  const personId = randomUUID();
  await db.transaction(async (tx) => {
    const now = clock.now();
    await spendToken(tx, 'set-up', input.token, now);
    if (await accountRepository(tx).anybody()) {
      throw conflict('set-up.done', 'The first administrator exists already; sign in instead.');
    }
    const { name, email } = input;
    const by = { personId, name, role: 'administrator', requestId: source.requestId };
    const siteId = await openSite(tx, now, by, {
      code: input.siteCode,
      name: input.siteName,
      timeZone: input.timeZone,
      demo: false,
    });
    const person = { id: personId, siteId, name, email, role: 'administrator' } as const;
    await tx.insert(people).values({ ...person, passwordHash, createdAt: now, updatedAt: now });
    await writeHistory(tx, { ...by, siteId }, now, {
      action: 'person.created',
      entity: 'person',
      entityId: personId,
      summary: `Created the first administrator, ${name}`,
      after: { name, email, role: 'administrator' },
    });
  });
  logSecurity(deps.log, 'site set up', { personId, address: source.address });
  return openSession(deps, personId, { ...source, previousSessionId: null });
}

function refuseUnknownTimeZone(timeZone: string): void {
  try {
    Intl.DateTimeFormat('en-GB', { timeZone });
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    throw unacceptable(
      'site.time-zone',
      'Give a time zone by its name, such as Europe/London.',
      'timeZone',
    );
  }
}
