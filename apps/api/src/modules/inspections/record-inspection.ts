import type { InspectionBody, InspectionView } from '@ligament/domain/contract/inspections';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, notFound, staleVersion, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import { componentOfSite } from '../components/component-of-site';
import { writeHistory } from '../history/write-history';
import { todayAt } from '../site/site-clock';
import { inspectionRepository } from './inspection.repository';
import { readInspectionView } from './inspection-view';

const REPEATED =
  'An inspection with this report number and revision is already recorded for the component.';

/** Plans an inspection, or records one that was made. */
export function addInspection(
  { db, clock }: Deps,
  actor: Actor,
  componentId: string,
  input: InspectionBody,
): Promise<InspectionView> {
  return refuseRepeat('inspections_report', 'reportNo', REPEATED, () =>
    db.transaction(async (tx) => {
      const component = await componentOfSite(tx, actor.siteId, componentId);
      if (!component) throw notFound('component');
      refuseDates(input, component.commissionedOn, await todayAt(tx, clock, actor.siteId));
      const now = clock.now();
      const added = await inspectionRepository(tx).add({
        ...input,
        siteId: actor.siteId,
        componentId,
        inspectorId: actor.role === 'inspector' ? actor.personId : null,
        state: input.inspectedOn ? 'in progress' : 'planned',
        createdAt: now,
        updatedAt: now,
      });
      if (!added) throw notFound('inspection');
      await writeHistory(tx, actor, now, {
        action: 'inspection.added',
        entity: 'inspection',
        entityId: added.id,
        componentId,
        summary: `Inspection ${added.reportNo} of ${component.tag} by ${added.technique} ${added.state === 'planned' ? 'planned' : 'recorded'}`,
        after: added,
        eventOn: added.inspectedOn,
      });
      return readInspectionView(tx, actor.siteId, added.id);
    }),
  );
}

/** Changes an inspection that is not accepted yet. */
export function changeInspection(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  change: Partial<InspectionBody>,
): Promise<InspectionView> {
  return refuseRepeat('inspections_report', 'reportNo', REPEATED, () =>
    db.transaction(async (tx) => {
      const repository = inspectionRepository(tx);
      const before = await repository.byId(actor.siteId, id);
      if (!before) throw notFound('inspection');
      const { state } = before.inspection;
      if (state === 'accepted' || state === 'void' || state === 'submitted') {
        throw conflict(
          'inspection.closed',
          `This inspection is ${state}; it can no longer be changed.`,
        );
      }
      refuseDates(change, before.component.commissionedOn, await todayAt(tx, clock, actor.siteId));
      const inspectedOn =
        change.inspectedOn === undefined ? before.inspection.inspectedOn : change.inspectedOn;
      if (before.findings > 0 && inspectedOn !== before.inspection.inspectedOn) {
        throw conflict(
          'inspection.date-used',
          'Findings are recorded under this date; it cannot change any more.',
          'inspectedOn',
        );
      }
      const now = clock.now();
      const after = await repository.change(actor.siteId, id, seen, {
        ...change,
        state: inspectedOn ? 'in progress' : 'planned',
        updatedAt: now,
      });
      if (!after) throw staleVersion('inspection', await readInspectionView(tx, actor.siteId, id));
      await writeHistory(tx, actor, now, {
        action: 'inspection.changed',
        entity: 'inspection',
        entityId: id,
        componentId: after.componentId,
        summary: `Inspection ${after.reportNo} changed`,
        before: before.inspection,
        after,
      });
      return readInspectionView(tx, actor.siteId, id);
    }),
  );
}

/** An examination lies neither in the future nor before the component existed. */
function refuseDates(
  input: Partial<InspectionBody>,
  commissionedOn: string | null,
  today: string,
): void {
  const day = input.inspectedOn;
  if (!day) return;
  if (day > today) {
    throw unacceptable(
      'inspection.future',
      `The examination cannot lie in the future (today is ${today}).`,
      'inspectedOn',
    );
  }
  if (commissionedOn && day < commissionedOn) {
    throw unacceptable(
      'inspection.too-early',
      `The component was commissioned on ${commissionedOn}; the examination cannot be earlier.`,
      'inspectedOn',
    );
  }
}
