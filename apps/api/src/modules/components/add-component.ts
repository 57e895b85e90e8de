import type { ComponentBody, ComponentView } from '@ligament/domain/contract/components';
import type { Deps } from '../../deps';
import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { notFound, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { writeHistory } from '../history/write-history';
import { componentRepository, type ComponentRecord } from './component.repository';
import { readComponentView } from './component-view';

/** Adds a component to the register. */
export function addComponent(
  { db, clock }: Pick<Deps, 'db' | 'clock'>,
  actor: HistoryActor,
  input: ComponentBody,
): Promise<ComponentView> {
  return refuseRepeat('components_tag', 'tag', `There is already a component ${input.tag}.`, () =>
    db.transaction(async (tx) => {
      const added = await insertComponent(tx, actor, clock.now(), input);
      return readComponentView(tx, clock, actor.siteId, added.id);
    }),
  );
}

/** Writes a component and its history entry inside a transaction that may hold more. */
export async function insertComponent(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  input: ComponentBody,
): Promise<ComponentRecord> {
  const repository = componentRepository(tx);
  if (!(await repository.partsAreOurs(actor.siteId, input.unitId, input.materialId))) {
    throw unacceptable('component.parts', 'Choose a unit and a material of this site.', 'unitId');
  }
  const added = await repository.add({
    ...input,
    siteId: actor.siteId,
    createdAt: now,
    updatedAt: now,
  });
  if (!added) throw notFound('component');
  await writeHistory(tx, actor, now, {
    action: 'component.added',
    entity: 'component',
    entityId: added.id,
    componentId: added.id,
    summary: `Component ${added.tag} ${added.description} added to the register`,
    after: added,
    eventOn: added.commissionedOn,
  });
  return added;
}
