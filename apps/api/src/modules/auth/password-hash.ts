import { hash, verify } from '@node-rs/argon2';
import { Failure } from '../../http/failure';

// 64 MiB and four passes, well above OWASP's least (19 MiB, two): one guess costs 60 ms or more of a server's core.
const ARGON2ID = 2;
const COST = { memoryCost: 65_536, timeCost: 4, parallelism: 1 } as const;

const AT_ONCE = 2;
const WAITING = 50;

let running = 0;
const waiting: (() => void)[] = [];

/** At most two hashes at a time, so that a flood of sign-ins cannot take the machine from everybody else. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) {
    if (waiting.length >= WAITING) {
      throw new Failure(
        'sign-in.busy',
        429,
        'Busy',
        'Too many people are signing in just now. Try again in a few seconds.',
        { retryAfterSeconds: 5 },
      );
    }
    await new Promise<void>((resolve) => waiting.push(resolve));
  } else {
    running += 1;
  }
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    // the place passes straight to the next in line
    if (next) next();
    else running -= 1;
  }
}

/** One spelling of a password, whatever keyboard composed its letters. */
const spelled = (password: string): string => password.normalize('NFC');

/** Argon2id with its parameters and salt, in the usual text form. */
export const hashPassword = (password: string): Promise<string> =>
  inTurn(() => hash(spelled(password), { algorithm: ARGON2ID, ...COST }));

let decoy: Promise<string> | undefined;

/** Whether the password is right. Without a hash to compare with the same work is done, so that time tells nothing. */
export async function verifyPassword(kept: string | null, password: string): Promise<boolean> {
  decoy ??= hash('nobody has this password', { algorithm: ARGON2ID, ...COST });
  const against = kept ?? (await decoy);
  const right = await inTurn(() => verify(against, spelled(password)));
  return right && kept !== null;
}

/** Whether a hash was made with less work than is asked for today. */
export function needsRehash(kept: string): boolean {
  const match = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=(\d+)\$/.exec(kept);
  if (!match) return true;
  return Number(match[1]) < COST.memoryCost || Number(match[2]) < COST.timeCost;
}
