import type { componentChange, ComponentView } from '@ligament/domain/contract/components';
import type { z } from 'zod';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { notFound, staleVersion, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { writeHistory } from '../history/write-history';
import { componentRepository } from './component.repository';
import { readComponentView } from './component-view';

/** Changes a component, with a reason; what was assessed before keeps the values it used. */
export function changeComponent(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  { reason, ...change }: z.output<typeof componentChange>,
): Promise<ComponentView> {
  return refuseRepeat('components_tag', 'tag', `There is already a component ${change.tag}.`, () =>
    db.transaction(async (tx) => {
      const repository = componentRepository(tx);
      const before = await repository.byId(actor.siteId, id);
      if (!before) throw notFound('component');
      const merged = { ...before.component, ...change };
      if (merged.wallMm >= merged.insideDiameterMm / 2) {
        throw unacceptable(
          'component.wall',
          'The wall is thicker than the inside radius: check diameter and wall.',
          'wallMm',
        );
      }
      if (!(await repository.partsAreOurs(actor.siteId, merged.unitId, merged.materialId))) {
        throw unacceptable(
          'component.parts',
          'Choose a unit and a material of this site.',
          'unitId',
        );
      }
      const now = clock.now();
      const after = await repository.change(actor.siteId, id, seen, { ...change, updatedAt: now });
      if (!after)
        throw staleVersion('component', await readComponentView(tx, clock, actor.siteId, id));
      await writeHistory(tx, actor, now, {
        action: 'component.changed',
        entity: 'component',
        entityId: id,
        componentId: id,
        summary: `Component ${after.tag} changed`,
        before: before.component,
        after,
        reason,
      });
      return readComponentView(tx, clock, actor.siteId, id);
    }),
  );
}
