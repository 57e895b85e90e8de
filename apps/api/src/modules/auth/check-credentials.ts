import type { Deps } from '../../deps';
import { Failure } from '../../http/failure';
import { logSecurity } from '../../http/security-log';
import { accountRepository, type Person } from './account.repository';
import { isForgotten, lockMilliseconds, refuseWhileLocked, waitInWords } from './lock-out';
import { verifyPassword } from './password-hash';
import { throttleKey, throttleRepository } from './throttle.repository';

const ADDRESS_FAILURES = 100;
const ADDRESS_WINDOW_MILLISECONDS = 15 * 60_000;

interface Attempt {
  readonly email: string;
  readonly password: string;
  readonly address: string;
  /** Whether this person may sign in now, apart from the password. */
  readonly mayEnter: (person: Person) => Promise<boolean>;
}

/**
 * The person whose password this is. Whoever is unknown, disabled, not yet invited or simply wrong gets the same answer
 * after the same work, and the same lock after as many tries.
 */
export async function checkCredentials(deps: Deps, attempt: Attempt): Promise<Person> {
  const { db, clock, log } = deps;
  await refuseBusyAddress(deps, attempt.address);
  const person = await accountRepository(db).byEmail(attempt.email);
  refuseWhileLocked(await lockedUntil(deps, attempt.email, person), clock.now());
  const known = person && (await attempt.mayEnter(person)) ? person : undefined;
  const right = await verifyPassword(known?.passwordHash ?? null, attempt.password);
  if (known && right) {
    await forgetFailures(deps, known.id);
    return known;
  }
  const failures = await countFailure(deps, attempt, person);
  logSecurity(log, 'sign-in refused', {
    address: attempt.address,
    personId: person?.id ?? 'unknown',
    failures,
  });
  if (lockMilliseconds(failures) > 0) {
    logSecurity(log, 'account locked', { personId: person?.id ?? 'unknown', failures });
  }
  throw new Failure(
    'sign-in.refused',
    401,
    'Not signed in',
    'The e-mail address or the password is not right, or this access has ended. Check both, or ask for a password reset.',
  );
}

async function refuseBusyAddress({ db, clock, log }: Deps, address: string): Promise<void> {
  const row = await throttleRepository(db).read(throttleKey('address', address));
  if (!row || row.failures < ADDRESS_FAILURES) return;
  const left = row.windowStartedAt.getTime() + ADDRESS_WINDOW_MILLISECONDS - clock.now().getTime();
  if (left <= 0) return;
  const seconds = Math.ceil(left / 1000);
  logSecurity(log, 'address limited', { address });
  throw new Failure(
    'sign-in.address-limited',
    429,
    'Too many failed attempts',
    `Too many failed attempts came from your network address. Try again in ${waitInWords(seconds)}.`,
    { retryAfterSeconds: seconds },
  );
}

/** An address nobody has is locked by the same rule, so that a lock does not tell who exists. */
async function lockedUntil({ db }: Deps, email: string, person?: Person): Promise<Date | null> {
  if (person) return person.lockedUntil;
  const row = await throttleRepository(db).read(throttleKey('account', email));
  if (!row) return null;
  return new Date(row.windowStartedAt.getTime() + lockMilliseconds(row.failures));
}

/** Clears the count, unless parallel tries have locked the account while the password was being checked. */
async function forgetFailures({ db, clock }: Deps, personId: string): Promise<void> {
  await db.transaction(async (tx) => {
    const current = await accountRepository(tx).lockById(personId);
    refuseWhileLocked(current?.lockedUntil ?? null, clock.now());
    if (current && current.failedSignIns > 0) {
      await accountRepository(tx).setFailures(personId, 0, null);
    }
  });
}

async function countFailure(
  { db, clock }: Deps,
  attempt: Attempt,
  person?: Person,
): Promise<number> {
  const now = clock.now();
  return db.transaction(async (tx) => {
    const throttle = throttleRepository(tx);
    await throttle.countInWindow(
      throttleKey('address', attempt.address),
      now,
      ADDRESS_WINDOW_MILLISECONDS,
    );
    if (person) return countForPerson(accountRepository(tx), person.id, now);
    const key = throttleKey('account', attempt.email);
    const before = await throttle.read(key);
    return throttle.countInARow(key, now, isForgotten(before?.windowStartedAt ?? null, now));
  });
}

async function countForPerson(
  accounts: ReturnType<typeof accountRepository>,
  personId: string,
  now: Date,
): Promise<number> {
  const current = await accounts.lockById(personId);
  const before = !current || isForgotten(current.lockedUntil, now) ? 0 : current.failedSignIns;
  const failures = before + 1;
  const lock = lockMilliseconds(failures);
  await accounts.setFailures(personId, failures, lock > 0 ? new Date(now.getTime() + lock) : null);
  return failures;
}
