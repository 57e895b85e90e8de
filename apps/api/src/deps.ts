import type { Logger } from 'pino';
import type { Clock } from './clock';
import type { Config } from './config';
import type { Database } from './db/database';
import type { Mailer } from './mail/mailer';

/** Everything the app is built from; tests hand in their own. */
export interface Deps {
  readonly db: Database;
  readonly clock: Clock;
  readonly config: Config;
  readonly log: Logger;
  /** Whether the database answers; false after repeated restarts. */
  readonly databaseHealthy: () => boolean;
  /** Sends mail; absent where a process sends none. */
  readonly mailer?: Mailer;
}
