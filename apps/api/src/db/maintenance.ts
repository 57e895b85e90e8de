import type { Logger } from 'pino';

export interface Upkeep {
  /** Runs statements with full rights when nobody waits. */
  readonly maintain: (...statements: readonly string[]) => Promise<void>;
  /** Whether anything was written since this was last asked. */
  readonly takeWritten: () => boolean;
}

export interface MaintenanceOptions {
  readonly upkeep: Upkeep;
  readonly tableNames: readonly string[];
  readonly log: Logger;
  readonly now?: () => Date;
}

const MINUTE = 60_000;
const ANALYZE_EVERY = 60;
/** Hour of the server's day at which rows long deleted are cleared away. */
const NIGHT_HOUR = 3;

/**
 * What a database server does by itself and the embedded one does not: a checkpoint in every minute with a write (so that
 * the log stays short and a restart quick), statistics every hour, a vacuum every night. Returns the function that stops it.
 */
export function startMaintenance(options: MaintenanceOptions): () => void {
  const minute = everyMinute(options);
  const timer = setInterval(() => {
    minute().catch((error: unknown) => options.log.warn({ err: error }, 'maintenance failed'));
  }, MINUTE);
  timer.unref();
  return () => clearInterval(timer);
}

/** The work of one minute; called again before it is done, it does nothing. */
export function everyMinute({
  upkeep,
  tableNames,
  log,
  now = () => new Date(),
}: MaintenanceOptions) {
  let running = false;
  let minutesWritten = 0;
  let vacuumed = now().toDateString();
  return async () => {
    if (running) return;
    running = true;
    try {
      if (upkeep.takeWritten()) {
        await upkeep.maintain('checkpoint');
        minutesWritten += 1;
      }
      if (minutesWritten >= ANALYZE_EVERY) {
        minutesWritten = 0;
        await upkeep.maintain('analyze');
      }
      if (now().getHours() === NIGHT_HOUR && vacuumed !== now().toDateString()) {
        vacuumed = now().toDateString();
        // table by table, so that a request never waits for more than one of them
        for (const name of tableNames) await upkeep.maintain(`vacuum (analyze) "${name}"`);
        log.info({ tables: tableNames.length }, 'vacuum done');
      }
    } finally {
      running = false;
    }
  };
}
