import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { writeHistory } from '../history/write-history';
import { reinspectionRepository } from './reinspection.repository';

/** An accepted inspection, and the flaws it looked for and found. */
export interface AcceptedInspection {
  readonly componentId: string;
  readonly inspectionId: string;
  readonly reportNo: string;
  readonly flawIds: readonly string[];
}

/** Marks the re-inspections that an accepted inspection fulfils as done, and stops their reminders. */
export async function completeReinspections(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  { componentId, inspectionId, reportNo, flawIds }: AcceptedInspection,
): Promise<void> {
  const repository = reinspectionRepository(tx);
  for (const task of await repository.openOfComponent(componentId, flawIds)) {
    await repository.setState(task.id, 'done', now, inspectionId);
    await repository.cancelQueuedReminders(task.id);
    await writeHistory(tx, actor, now, {
      action: 're-inspection.done',
      entity: 're-inspection',
      entityId: task.id,
      componentId,
      flawId: task.flawId,
      summary: `Re-inspection due on ${task.dueOn} done by inspection ${reportNo}`,
      before: { state: task.state },
      after: { state: 'done', doneInspectionId: inspectionId },
    });
  }
}
