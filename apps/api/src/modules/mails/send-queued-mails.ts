import type { Deps } from '../../deps';
import type { Mailer } from '../../mail/mailer';
import { mailRepository, type OutgoingMail } from './mail.repository';

const MINUTE = 60_000;
const LEASE_MS = 2 * MINUTE;
const LONGEST_WAIT_MS = 6 * 60 * MINUTE;
const MOST_ATTEMPTS = 12;
const MOST_AT_ONCE = 500;

export interface SendingResult {
  readonly sent: number;
  readonly failed: number;
}

/**
 * Sends what waits. The attempt is recorded before it is made, so that a crash never sends without a trace; a repeat
 * carries the same Message-ID. A refusal for good (5xx) is parked for a person, everything else is tried again later.
 */
export async function sendQueuedMails(
  { db, clock, log }: Deps,
  mailer: Mailer,
): Promise<SendingResult> {
  const repository = mailRepository(db);
  let sent = 0;
  let failed = 0;
  while (sent + failed < MOST_AT_ONCE) {
    const now = clock.now();
    const mail = await repository.lease(now, new Date(now.getTime() + LEASE_MS));
    if (!mail) break;
    if ((await repository.reminderState(mail.id)) === 'cancelled') {
      await repository.settle(mail.id, {
        state: 'not delivered',
        lastError: 'No longer true: the task was done or moved before it was sent.',
      });
      continue;
    }
    try {
      await mailer.send({ ...mail, to: mail.recipient });
      await repository.settle(mail.id, { state: 'sent', sentAt: clock.now(), lastError: '' });
      await repository.settleReminder(mail.id, 'sent', clock.now());
      sent += 1;
    } catch (error) {
      failed += 1;
      log.warn({ err: error, mail: mail.id }, 'mail not sent');
      await postpone(repository, mail, error, clock.now());
    }
  }
  return { sent, failed };
}

async function postpone(
  repository: ReturnType<typeof mailRepository>,
  mail: OutgoingMail,
  error: unknown,
  now: Date,
): Promise<void> {
  const lastError = (error instanceof Error ? error.message : String(error)).slice(0, 500);
  if (isForGood(error) || mail.attempts >= MOST_ATTEMPTS) {
    await repository.settle(mail.id, { state: 'not delivered', lastError });
    await repository.settleReminder(mail.id, 'not delivered', null);
    return;
  }
  await repository.settle(mail.id, {
    lastError,
    nextAttemptAt: new Date(now.getTime() + waitAfter(mail)),
  });
}

/** Doubling waits with a spread that depends on the mail, so that many do not come back at the same moment. */
function waitAfter({ attempts, id }: OutgoingMail): number {
  const spread = parseInt(id.slice(0, 4), 16) / 0xffff;
  return Math.min(LONGEST_WAIT_MS, MINUTE * 2 ** (attempts - 1)) * (0.75 + spread / 2);
}

function isForGood(error: unknown): boolean {
  const code = error instanceof Error && 'responseCode' in error ? Number(error.responseCode) : 0;
  return code >= 500;
}
