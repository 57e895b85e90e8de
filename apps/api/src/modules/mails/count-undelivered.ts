import type { Database } from '../../db/database';
import { mailRepository } from './mail.repository';

/** How many mails of a site could not be delivered. */
export const countUndelivered = (db: Database, siteId: string): Promise<number> =>
  mailRepository(db).undeliveredCount(siteId);
