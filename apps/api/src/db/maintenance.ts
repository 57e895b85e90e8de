import type { Logger } from 'pino';

const MINUTE = 60_000;
const DAY = 24 * 60 * MINUTE;

/**
 * What a database server does by itself and the embedded one does not: a checkpoint every minute (so that the log stays
 * short and a restart quick), statistics every hour, a vacuum every night. Returns the function that stops it.
 */
export function startMaintenance(
  maintain: (sql: string) => Promise<void>,
  log: Logger,
): () => void {
  const every = (milliseconds: number, sql: string) => {
    const timer = setInterval(() => {
      maintain(sql).catch((error: unknown) => log.warn({ err: error, sql }, 'maintenance failed'));
    }, milliseconds);
    timer.unref();
    return timer;
  };
  const timers = [every(MINUTE, 'checkpoint'), every(60 * MINUTE, 'analyze'), every(DAY, 'vacuum')];
  return () => timers.forEach((timer) => clearInterval(timer));
}
