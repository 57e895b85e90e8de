import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { writeHistory } from '../history/write-history';
import { reinspectionRepository, type ReinspectionRecord } from './reinspection.repository';

/** Takes a re-inspection out of its plan: it is open again, and somebody has to plan it anew. */
export async function releaseFromPlan(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  task: ReinspectionRecord,
  why: string,
): Promise<ReinspectionRecord | undefined> {
  const released = await reinspectionRepository(tx).plan(task.id, task.version, {
    state: 'open',
    windowId: null,
    plannedOn: null,
    plannedBy: null,
    onStream: false,
    planNote: '',
    updatedAt: now,
  });
  if (!released) return undefined;
  await writeHistory(tx, actor, now, {
    action: 're-inspection.unplanned',
    entity: 're-inspection',
    entityId: task.id,
    componentId: task.componentId,
    flawId: task.flawId,
    summary: `${task.task}, due on ${task.dueOn}, is open again: ${why}`,
    before: { state: task.state, windowId: task.windowId, plannedOn: task.plannedOn },
    after: { state: 'open', windowId: null, plannedOn: null },
    reason: why,
  });
  return released;
}
