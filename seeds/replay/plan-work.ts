import {
  reinspections,
  shutdownWindows,
  shutdownWindowUnits,
} from '@ligament/domain/schema/schedule';
import { and, eq, notInArray } from 'drizzle-orm';
import { changeFlaw } from '../../apps/api/src/modules/flaws/change-flaw';
import { readFlawView } from '../../apps/api/src/modules/flaws/flaw-view';
import { writeHistory } from '../../apps/api/src/modules/history/write-history';
import { planReinspection } from '../../apps/api/src/modules/reinspections/plan-reinspection';
import { PLANS, REFERRED } from '../plant/assessments';
import { WINDOWS } from '../plant/site';
import type { BuiltRegister } from './build-register';
import type { Stage } from './stage';

/** Enters the outage plan. */
export async function enterWindows(
  { deps, siteId, actor, dates }: Stage,
  { unitIds }: BuiltRegister,
): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const { units: codes, ...window } of WINDOWS) {
    await deps.db.transaction(async (tx) => {
      const now = deps.clock.now();
      const [added] = await tx
        .insert(shutdownWindows)
        .values({
          ...window,
          siteId,
          startsOn: dates.move(window.startsOn),
          endsOn: dates.move(window.endsOn),
          scopeFreezeOn: dates.move(window.scopeFreezeOn),
          createdAt: now,
          updatedAt: now,
        })
        .returning();
      if (!added) throw new Error(`window ${window.code} was not added`);
      ids.set(window.code, added.id);
      await tx
        .insert(shutdownWindowUnits)
        .values(codes.map((code) => ({ windowId: added.id, unitId: unitIds.get(code) ?? '' })));
      await writeHistory(tx, actor('joost'), now, {
        action: 'shutdown-window.added',
        entity: 'shutdown window',
        entityId: added.id,
        summary: `Shutdown window ${added.code} of ${codes.join(', ')} added, ${added.startsOn} to ${added.endsOn}`,
        after: added,
      });
    });
  }
  return ids;
}

/** Refers what is out of scope of a crack-like assessment. */
export async function referOutOfScope(
  { deps, siteId, actor }: Stage,
  flaws: ReadonlyMap<string, string>,
): Promise<void> {
  for (const { flaw, reason } of REFERRED) {
    const view = await readFlawView(deps.db, deps.clock, siteId, flaws.get(flaw) ?? '');
    await changeFlaw(deps, actor('tomas'), view.id, view.version, { state: 'referred', reason });
  }
}

/** Puts the work into windows as far as the due dates let it. */
export async function planWork(
  { deps, actor, dates }: Stage,
  flaws: ReadonlyMap<string, string>,
  windows: ReadonlyMap<string, string>,
): Promise<void> {
  for (const { flaw, window, on, note } of PLANS) {
    const [task] = await deps.db
      .select()
      .from(reinspections)
      .where(
        and(
          eq(reinspections.flawId, flaws.get(flaw) ?? ''),
          notInArray(reinspections.state, ['done', 'cancelled']),
        ),
      );
    const plannedOn = dates.move(on);
    if (!task || plannedOn > task.dueOn) continue;
    await planReinspection(deps, actor('joost'), task.id, task.version, {
      windowId: window ? (windows.get(window) ?? null) : null,
      plannedOn,
      note,
    });
  }
}
