import { listMails, listUndelivered, readMail } from '@ligament/domain/contract/reminders';
import type { Deps } from '../../deps';
import { cutPage } from '../../http/cursor';
import { notFound } from '../../http/failure';
import type { Api } from '../../http/serve';
import { mailRepository } from './mail.repository';

/** Mail that the built-in mailbox received, and mail that could not be delivered. */
export function serveMails(api: Api, { db }: Deps): void {
  api.serve(listMails, async ({ actor, query }) => {
    const found = await mailRepository(db).received(
      actor.siteId,
      query.cursor,
      query.limit,
      actor.role === 'administrator',
    );
    const { rows, nextCursor } = cutPage(found, query.limit, (row) => [
      row.receivedAt.toISOString(),
      row.id,
    ]);
    return {
      rows: rows.map((row) => ({ ...row, receivedAt: row.receivedAt.toISOString() })),
      nextCursor,
    };
  });

  api.serve(readMail, async ({ actor, params }) => {
    const found = await mailRepository(db).receivedById(
      actor.siteId,
      params.id,
      actor.role === 'administrator',
    );
    if (!found) throw notFound('mail');
    return { ...found, receivedAt: found.receivedAt.toISOString() };
  });

  api.serve(listUndelivered, async ({ actor }) => ({
    rows: (await mailRepository(db).undelivered(actor.siteId)).map((row) => ({
      ...row,
      createdAt: row.createdAt.toISOString(),
    })),
  }));
}
