import type { Technique } from '@ligament/domain/contract/vocabulary';
import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { writeHistory } from '../history/write-history';
import { reinspectionRepository, type ReinspectionRecord } from './reinspection.repository';

/** A re-inspection that a signed assessment asks for. */
export interface NewReinspection {
  readonly componentId: string;
  readonly flawId: string;
  readonly assessmentId: string;
  readonly flawNumber: string;
  readonly technique: Technique;
  readonly dueOn: string;
  readonly limitOn: string | null;
  readonly basis: string;
  readonly candidates: unknown;
}

/** Opens the re-inspection of a flaw; the one it replaces is cancelled, and its plan is kept where it still fits. */
export async function openReinspection(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  asked: NewReinspection,
): Promise<void> {
  const { flawNumber, ...values } = asked;
  const earlier = await cancelReinspection(
    tx,
    actor,
    now,
    asked.flawId,
    `replaced by the assessment of ${flawNumber}`,
  );
  const plan = planThatStillFits(earlier, asked.dueOn);
  const added = await reinspectionRepository(tx).add({
    ...values,
    ...plan,
    siteId: actor.siteId,
    task: `${asked.technique} of flaw ${flawNumber}`,
    createdAt: now,
    updatedAt: now,
  });
  if (!added) return;
  await writeHistory(tx, actor, now, {
    action: 're-inspection.opened',
    entity: 're-inspection',
    entityId: added.id,
    componentId: added.componentId,
    flawId: added.flawId,
    summary: `Re-inspection of ${flawNumber} due on ${added.dueOn}`,
    after: added,
    reason: added.basis,
  });
}

/** Cancels the open re-inspection of a flaw, if there is one. */
export async function cancelReinspection(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  flawId: string,
  why: string,
): Promise<ReinspectionRecord | undefined> {
  const repository = reinspectionRepository(tx);
  const open = await repository.openOfFlaw(flawId);
  if (!open) return undefined;
  await repository.setState(open.id, 'cancelled', now);
  await repository.cancelQueuedReminders(open.id);
  await writeHistory(tx, actor, now, {
    action: 're-inspection.cancelled',
    entity: 're-inspection',
    entityId: open.id,
    componentId: open.componentId,
    flawId,
    summary: `Re-inspection due on ${open.dueOn} cancelled: ${why}`,
    before: { state: open.state },
    after: { state: 'cancelled' },
    reason: why,
  });
  return open;
}

function planThatStillFits(earlier: ReinspectionRecord | undefined, dueOn: string) {
  if (!earlier?.plannedOn || earlier.plannedOn > dueOn) return {};
  const { windowId, plannedOn, plannedBy, planNote, onStream } = earlier;
  return { windowId, plannedOn, plannedBy, planNote, onStream, state: 'planned' as const };
}
