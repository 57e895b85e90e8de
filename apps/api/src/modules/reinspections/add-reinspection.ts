import type {
  addReinspection as contract,
  ReinspectionView,
} from '@ligament/domain/contract/reinspections';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound, unacceptable } from '../../http/failure';
import { brokenUnique } from '../../db/unique-violation';
import { componentOfSite } from '../components/component-of-site';
import { flawOfComponent } from '../flaws/flaws-of-location';
import { writeHistory } from '../history/write-history';
import { todayAt } from '../site/site-clock';
import { reinspectionRepository } from './reinspection.repository';
import { readReinspectionView } from './reinspection-view';

/** Sets a re-inspection by a rule of the site, for a component or a flaw that has no assessment of its own. */
export async function addReinspection(
  { db, clock }: Deps,
  actor: Actor,
  { reason, ...input }: z.output<typeof contract.body>,
): Promise<ReinspectionView> {
  try {
    return await db.transaction(async (tx) => {
      const component = await componentOfSite(tx, actor.siteId, input.componentId);
      if (!component) throw notFound('component');
      if (input.flawId && !(await flawOfComponent(tx, actor.siteId, component.id, input.flawId)))
        throw notFound('flaw');
      const today = await todayAt(tx, clock, actor.siteId);
      if (input.dueOn < today)
        throw unacceptable(
          're-inspection.past',
          `The date lies in the past (today is ${today}).`,
          'dueOn',
        );
      const now = clock.now();
      const added = await reinspectionRepository(tx).add({
        ...input,
        siteId: actor.siteId,
        candidates: [
          {
            rule: 'set by the engineer',
            dueOn: input.dueOn,
            explanation: input.basis,
            governs: true,
          },
        ],
        createdAt: now,
        updatedAt: now,
      });
      if (!added) throw notFound('re-inspection');
      await writeHistory(tx, actor, now, {
        action: 're-inspection.opened',
        entity: 're-inspection',
        entityId: added.id,
        componentId: component.id,
        flawId: added.flawId,
        summary: `${added.task} of ${component.tag} due on ${added.dueOn}`,
        after: added,
        reason,
      });
      return readReinspectionView(tx, clock, actor.siteId, added.id);
    });
  } catch (error) {
    if (brokenUnique(error) === 'reinspections_one_open_per_flaw') {
      throw conflict(
        're-inspection.open',
        'This flaw already has an open re-inspection.',
        'flawId',
      );
    }
    throw error;
  }
}
