import type { Deps } from '../../deps';
import type { Mailer } from '../../mail/mailer';
import { sendQueuedMails } from '../mails/send-queued-mails';
import { noteRun } from './heartbeat';
import { queueReminders } from './queue-reminders';

/** Looks for reminders that are due, then sends everything that waits. */
export async function runReminders(deps: Deps, mailer: Mailer) {
  const queued = await queueReminders(deps);
  const { sent, failed } = await sendQueuedMails(deps, mailer);
  noteRun(deps.clock.now());
  return { queued, sent, failed };
}
