import type {
  changeWindow as contract,
  WindowView,
} from '@ligament/domain/contract/shutdown-windows';
import type { z } from 'zod';
import type { Transaction } from '../../db/database';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { notFound, staleVersion, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { componentOfSite } from '../components/component-of-site';
import { writeHistory } from '../history/write-history';
import { releaseFromPlan } from '../reinspections/release-from-plan';
import { windowRepository } from './window.repository';

type Change = z.output<typeof contract.body>;
type Answer = z.output<typeof contract.response>;

/** Moves, changes or cancels a window; re-inspections that no longer fit in it are open again, each told in the history. */
export function changeWindow(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  { reason, unitIds, ...change }: Change,
): Promise<Answer> {
  return refuseRepeat(
    'shutdown_windows_code',
    'code',
    `There is already a window ${change.code}.`,
    () =>
      db.transaction(async (tx) => {
        const repository = windowRepository(tx);
        const before = await repository.byId(actor.siteId, id);
        if (!before) throw notFound('shutdown window');
        refuseDisorder({ ...before, ...change });
        const now = clock.now();
        const changed = await repository.change(actor.siteId, id, seen, {
          ...change,
          updatedAt: now,
        });
        if (!changed) throw staleVersion('shutdown window', before);
        if (unitIds) {
          if (!(await repository.unitsAreOurs(actor.siteId, unitIds)))
            throw unacceptable('window.units', 'Choose units of this site.', 'unitIds');
          await repository.setUnits(id, unitIds);
        }
        const after = await repository.byId(actor.siteId, id);
        if (!after) throw notFound('shutdown window');
        await writeHistory(tx, actor, now, {
          action: 'shutdown-window.changed',
          entity: 'shutdown window',
          entityId: id,
          summary: `Shutdown window ${after.code} changed`,
          before,
          after,
          reason,
        });
        return { window: after, released: await release(tx, actor, now, after) };
      }),
  );
}

function refuseDisorder({ startsOn, endsOn }: { startsOn: string; endsOn: string }): void {
  if (startsOn > endsOn)
    throw unacceptable('window.order', 'The window ends before it starts.', 'endsOn');
}

async function release(
  tx: Transaction,
  actor: Actor,
  now: Date,
  window: WindowView,
): Promise<Answer['released']> {
  const released: Answer['released'] = [];
  for (const task of await windowRepository(tx).plannedInto(window.id)) {
    const component = await componentOfSite(tx, actor.siteId, task.componentId);
    const why = whyNot(window, task, component?.unitId);
    if (!why) continue;
    await releaseFromPlan(tx, actor, now, task, why);
    released.push({ id: task.id, task: task.task, tag: component?.tag ?? '', dueOn: task.dueOn });
  }
  return released;
}

/** Why a planned task does not fit its changed window; undefined when it still does. */
function whyNot(
  window: WindowView,
  task: { readonly plannedOn: string | null; readonly dueOn: string },
  unitId: string | undefined,
): string | undefined {
  if (window.state === 'cancelled') return `window ${window.code} was cancelled`;
  if (unitId && !window.unitIds.includes(unitId))
    return `window ${window.code} no longer covers the unit`;
  const day = task.plannedOn ?? window.endsOn;
  if (day < window.startsOn || day > window.endsOn) return `window ${window.code} was moved`;
  return window.startsOn > task.dueOn
    ? `window ${window.code} now starts after the due date`
    : undefined;
}
