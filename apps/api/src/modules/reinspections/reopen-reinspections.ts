import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { writeHistory } from '../history/write-history';
import { reinspectionRepository } from './reinspection.repository';

/** A report that no longer counts. */
export interface VoidedInspection {
  readonly inspectionId: string;
  readonly reportNo: string;
}

/**
 * Opens the re-inspections again that a report had fulfilled, with the reminders it had stopped. Where a later decision
 * already gave the flaw another open re-inspection, that one stands.
 */
export async function reopenReinspections(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  { inspectionId, reportNo }: VoidedInspection,
): Promise<void> {
  const repository = reinspectionRepository(tx);
  for (const task of await repository.doneBy(inspectionId)) {
    if (task.flawId && (await repository.openOfFlaw(task.flawId))) continue;
    const state = task.windowId || task.plannedOn || task.onStream ? 'planned' : 'open';
    await repository.setState(task.id, state, now);
    await repository.queueCancelledReminders(task.id, task.dueOn, now);
    await writeHistory(tx, actor, now, {
      action: 're-inspection.reopened',
      entity: 're-inspection',
      entityId: task.id,
      componentId: task.componentId,
      flawId: task.flawId,
      summary: `Re-inspection due on ${task.dueOn} open again: inspection ${reportNo} was declared void`,
      before: { state: 'done', doneInspectionId: inspectionId },
      after: { state, doneInspectionId: null },
    });
  }
}
