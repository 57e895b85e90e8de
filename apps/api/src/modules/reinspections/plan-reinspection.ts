import type {
  planReinspection as contract,
  ReinspectionView,
} from '@ligament/domain/contract/reinspections';
import type { z } from 'zod';
import type { Transaction } from '../../db/database';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound, staleVersion, unacceptable } from '../../http/failure';
import { writeHistory } from '../history/write-history';
import { windowOfSite } from '../shutdown-windows/windows-of-unit';
import { todayAt } from '../site/site-clock';
import {
  reinspectionListRepository,
  type ReinspectionListRow,
} from './reinspection-list.repository';
import { reinspectionRepository } from './reinspection.repository';
import { readReinspectionView } from './reinspection-view';
import { releaseFromPlan } from './release-from-plan';

type Plan = z.output<typeof contract.body>;

/** Plans a re-inspection into a window or on-stream. The due date itself is never the planner's to move. */
export function planReinspection(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  plan: Plan,
): Promise<ReinspectionView> {
  return db.transaction(async (tx) => {
    const row = await reinspectionListRepository(tx).byId(actor.siteId, id);
    if (!row) throw notFound('re-inspection');
    refuseClosed(row);
    const today = await todayAt(tx, clock, actor.siteId);
    refuseDay(row, plan, today);
    const windowCode = plan.windowId ? await refuseWindow(tx, actor.siteId, row, plan) : null;
    const now = clock.now();
    const planned = await reinspectionRepository(tx).plan(id, seen, {
      state: 'planned',
      windowId: plan.windowId,
      onStream: plan.windowId === null,
      plannedOn: plan.plannedOn,
      plannedBy: actor.personId,
      planNote: plan.note,
      updatedAt: now,
    });
    if (!planned)
      throw staleVersion('re-inspection', await readReinspectionView(tx, clock, actor.siteId, id));
    await writeHistory(tx, actor, now, {
      action: 're-inspection.planned',
      entity: 're-inspection',
      entityId: id,
      componentId: row.componentId,
      flawId: row.flawId,
      summary: `${row.task}, due on ${row.dueOn}, planned ${windowCode ? `in ${windowCode}` : 'on-stream'} on ${plan.plannedOn}`,
      before: { state: row.state, window: row.windowCode, plannedOn: row.plannedOn },
      after: { state: 'planned', window: windowCode, plannedOn: plan.plannedOn },
      reason: plan.note,
    });
    return readReinspectionView(tx, clock, actor.siteId, id);
  });
}

function refuseClosed(row: ReinspectionListRow): void {
  if (row.state !== 'open' && row.state !== 'planned') {
    throw conflict(
      're-inspection.closed',
      `This re-inspection is ${row.state}; it can no longer be planned.`,
    );
  }
}

function refuseDay(row: ReinspectionListRow, plan: Plan, today: string): void {
  if (plan.plannedOn < today) {
    throw unacceptable('plan.past', `The day lies in the past (today is ${today}).`, 'plannedOn');
  }
  // once overdue the earliest day is the best there is; until then the due date holds
  if (plan.plannedOn > row.dueOn && row.dueOn >= today) {
    throw unacceptable(
      'plan.after-due',
      `${plan.plannedOn} lies after the due date ${row.dueOn}: acceptance of ${row.flawNumber ?? row.tag} ends on that day. A later date needs a deferral by the integrity engineer.`,
      'plannedOn',
    );
  }
}

async function refuseWindow(
  tx: Transaction,
  siteId: string,
  row: ReinspectionListRow,
  plan: Plan,
): Promise<string> {
  const window = plan.windowId ? await windowOfSite(tx, siteId, plan.windowId) : undefined;
  if (!window)
    throw unacceptable('plan.window', 'Choose a shutdown window of this site.', 'windowId');
  if (window.state === 'cancelled')
    throw unacceptable('plan.window-cancelled', `Window ${window.code} is cancelled.`, 'windowId');
  if (!window.unitIds.includes(row.unitId)) {
    throw unacceptable(
      'plan.window-unit',
      `Window ${window.code} covers ${window.unitCodes.join(', ')}, not ${row.unitCode}.`,
      'windowId',
    );
  }
  if (plan.plannedOn < window.startsOn || plan.plannedOn > window.endsOn) {
    throw unacceptable(
      'plan.outside-window',
      `Window ${window.code} lasts from ${window.startsOn} to ${window.endsOn}.`,
      'plannedOn',
    );
  }
  return window.code;
}

/** Takes a re-inspection out of its plan, with a reason. */
export function unplanReinspection(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  reason: string,
): Promise<ReinspectionView> {
  return db.transaction(async (tx) => {
    const task = await reinspectionRepository(tx).byId(actor.siteId, id);
    if (!task) throw notFound('re-inspection');
    if (task.state !== 'planned')
      throw conflict('re-inspection.not-planned', 'This re-inspection is not planned.');
    const released = await releaseFromPlan(
      tx,
      actor,
      clock.now(),
      { ...task, version: seen },
      reason,
    );
    if (!released)
      throw staleVersion('re-inspection', await readReinspectionView(tx, clock, actor.siteId, id));
    return readReinspectionView(tx, clock, actor.siteId, id);
  });
}
