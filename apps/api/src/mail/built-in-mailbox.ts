import type { AddressInfo } from 'node:net';
import { receivedMails } from '@ligament/domain/schema/schedule';
import { SMTPServer } from 'smtp-server';
import type { Clock } from '../clock';
import type { Database } from '../db/database';
import { readMessage } from './read-message';

const MOST_BYTES = 2 * 1024 * 1024;

/** An SMTP server on this machine that keeps what it receives, so that mail can be read where none is sent for real. */
export async function openBuiltInMailbox(db: Database, clock: Clock) {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: MOST_BYTES,
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const message = readMessage(Buffer.concat(chunks).toString('utf8'));
        const { mailFrom, rcptTo } = session.envelope;
        db.insert(receivedMails)
          .values({
            ...message,
            sender: mailFrom ? mailFrom.address : '',
            recipients: rcptTo.map(({ address }) => address).join(', '),
            receivedAt: clock.now(),
          })
          .then(() => done())
          .catch((error: unknown) =>
            done(error instanceof Error ? error : new Error(String(error))),
          );
      });
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.on('error', reject);
    server.listen(0, '127.0.0.1', () => resolve());
  });
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${port}`,
    close: () => new Promise<void>((resolve) => server.close(() => resolve())),
  };
}
