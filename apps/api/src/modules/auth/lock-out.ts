import { Failure } from '../../http/failure';

const FREE_TRIES = 5;
const FIRST_LOCK_MILLISECONDS = 30_000;
const LONGEST_LOCK_MILLISECONDS = 15 * 60_000;
const FORGET_MILLISECONDS = 24 * 3_600_000;

/** How long an account stays locked after so many failures in a row: half a minute at five, doubled each time. */
export function lockMilliseconds(failures: number): number {
  if (failures < FREE_TRIES) return 0;
  return Math.min(
    FIRST_LOCK_MILLISECONDS * 2 ** (failures - FREE_TRIES),
    LONGEST_LOCK_MILLISECONDS,
  );
}

/** Whether failures lie so far back that counting starts anew. */
export const isForgotten = (last: Date | null, now: Date): boolean =>
  last !== null && now.getTime() - last.getTime() > FORGET_MILLISECONDS;

/** Refuses while locked, without looking at the password. */
export function refuseWhileLocked(lockedUntil: Date | null, now: Date): void {
  if (lockedUntil === null || lockedUntil <= now) return;
  const seconds = Math.ceil((lockedUntil.getTime() - now.getTime()) / 1000);
  throw new Failure(
    'sign-in.locked',
    429,
    'Too many failed attempts',
    `Signing in with this address is locked for ${waitInWords(seconds)}. Wait, or ask for a password reset.`,
    { retryAfterSeconds: seconds },
  );
}

export const waitInWords = (seconds: number): string => {
  if (seconds < 90) return `${seconds} seconds`;
  return `${Math.ceil(seconds / 60)} minutes`;
};
