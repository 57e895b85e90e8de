import type { Deps } from '../deps';
import type { Mailer } from '../mail/mailer';
import { runReminders } from '../modules/reminders/run-reminders';

const MINUTE = 60_000;

/** Runs reminders at the start and every minute; one run at a time. */
export function startJobs(deps: Deps, mailer: Mailer) {
  let running: Promise<unknown> | undefined;
  const runOnce = (): Promise<unknown> => {
    running ??= runReminders(deps, mailer)
      .catch((error: unknown) => deps.log.error({ err: error }, 'reminder run failed'))
      .finally(() => {
        running = undefined;
      });
    return running;
  };
  const timer = setInterval(() => void runOnce(), MINUTE);
  timer.unref();
  void runOnce();
  return {
    runOnce,
    close: async (): Promise<void> => {
      clearInterval(timer);
      await running;
    },
  };
}
