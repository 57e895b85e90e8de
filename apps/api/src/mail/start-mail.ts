import type { Deps } from '../deps';
import { openBuiltInMailbox } from './built-in-mailbox';
import { smtpMailer, type Mailer } from './mailer';

/** The mailer of the settings: the SMTP server named there, or the built-in mailbox where none is named. */
export async function startMail({
  config,
  db,
  clock,
}: Deps): Promise<{ readonly mailer: Mailer; close(): Promise<void> }> {
  const mailbox = config.smtpUrl === null ? await openBuiltInMailbox(db, clock) : null;
  const mailer = smtpMailer(config.smtpUrl ?? mailbox?.url ?? '', config.mailFrom);
  return {
    mailer,
    close: async () => {
      mailer.close();
      await mailbox?.close();
    },
  };
}
