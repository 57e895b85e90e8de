import * as contract from '@ligament/domain/contract/reminders';
import type { Deps } from '../../deps';
import { cutPage } from '../../http/cursor';
import { Failure, notFound } from '../../http/failure';
import type { Api } from '../../http/serve';
import { writeHistory } from '../history/write-history';
import { countUndelivered } from '../mails/count-undelivered';
import { lastRun } from './heartbeat';
import { reminderRepository } from './reminder.repository';
import { runReminders } from './run-reminders';

/** Reminders: what was sent to whom, and the run that sends them. */
export function serveReminders(api: Api, deps: Deps): void {
  const { db, clock } = deps;

  api.serve(contract.listReminders, async ({ actor, query }) => {
    const found = await reminderRepository(db).list(actor.siteId, query);
    const { rows, nextCursor } = cutPage(found, query.limit, (row) => [
      row.createdAt.toISOString(),
      row.id,
    ]);
    return {
      rows: rows.map((row) => ({
        ...row,
        createdAt: row.createdAt.toISOString(),
        sentAt: row.sentAt?.toISOString() ?? null,
        acknowledgedAt: row.acknowledgedAt?.toISOString() ?? null,
      })),
      nextCursor,
    };
  });

  api.serve(contract.acknowledgeReminder, ({ actor, params }) =>
    db.transaction(async (tx) => {
      const repository = reminderRepository(tx);
      const reminder = await repository.byId(actor.siteId, params.id);
      if (!reminder) throw notFound('reminder');
      if (reminder.acknowledgedAt) return;
      const now = clock.now();
      await repository.acknowledge(params.id, actor.personId, now);
      await writeHistory(tx, actor, now, {
        action: 'reminder.acknowledged',
        entity: 'reminder',
        entityId: reminder.reinspectionId,
        summary: `Reminder for ${reminder.dueOn} acknowledged`,
      });
    }),
  );

  api.serve(contract.runReminders, async () => {
    if (!deps.mailer)
      throw new Failure('mail.off', 503, 'No mail', 'No mail is set up in this process.');
    return runReminders(deps, deps.mailer);
  });

  api.serve(contract.readHeartbeat, async ({ actor }) => ({
    lastRunAt: lastRun()?.toISOString() ?? null,
    undelivered: await countUndelivered(db, actor.siteId),
  }));
}
