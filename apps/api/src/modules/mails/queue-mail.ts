import type { outgoingMails } from '@ligament/domain/schema/schedule';
import type { Transaction } from '../../db/database';
import { mailRepository } from './mail.repository';

/** Queues a mail in the transaction of what it tells; the mail job sends it. */
export const queueMail = (
  tx: Transaction,
  mail: typeof outgoingMails.$inferInsert,
): Promise<void> => mailRepository(tx).queue(mail);
