import type { CandidateFinding } from '@ligament/domain/inspection/import-context';
import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { notFound, unacceptable } from '../../http/failure';
import type { ComponentRecord } from '../components/component.repository';
import { flawOfComponent } from '../flaws/flaws-of-location';
import { continueFlaw, openFlaw } from '../flaws/open-flaw';
import { writeHistory } from '../history/write-history';
import type { InspectionRecord } from '../inspections/inspection.repository';
import { findingRepository } from './finding.repository';

/** A finding to be kept, what it becomes, and where it comes from. */
export interface FindingToRecord {
  readonly finding: CandidateFinding;
  readonly flaw: { readonly kind: 'new' } | { readonly kind: 'continues'; readonly flawId: string };
  readonly importId: string | null;
  readonly rowNo: number | null;
  readonly original: Readonly<Record<string, string>>;
}

export interface RecordedFinding {
  readonly findingId: string;
  readonly flawId: string;
  readonly flawNumber: string;
  readonly isNew: boolean;
}

/** Keeps one finding of an inspection and opens or continues its flaw, inside the caller's transaction. */
export async function recordFinding(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  inspection: InspectionRecord,
  component: ComponentRecord,
  { finding, flaw: target, importId, rowNo, original }: FindingToRecord,
): Promise<RecordedFinding> {
  const inspectedOn = inspection.inspectedOn;
  if (!inspectedOn) {
    throw unacceptable(
      'finding.no-date',
      'Enter the day of the examination at the inspection first.',
      'inspectedOn',
    );
  }
  const earlier =
    target.kind === 'continues'
      ? await flawOfComponent(tx, component.siteId, component.id, target.flawId)
      : undefined;
  if (target.kind === 'continues' && !earlier) throw notFound('flaw');
  if (earlier && earlier.locationId !== finding.locationId) {
    throw unacceptable(
      'finding.other-weld',
      `Flaw ${earlier.number} does not lie in ${finding.locationName}: a finding continues a flaw of its own weld only.`,
      'flaw',
    );
  }
  const flaw = earlier ?? (await openFlaw(tx, actor, now, component, finding));
  const { locationName: _name, ...values } = finding;
  const added = await findingRepository(tx).add({
    ...values,
    inspectionId: inspection.id,
    importId,
    rowNo,
    flawId: flaw.id,
    inspectedOn,
    original,
    createdAt: now,
  });
  if (!added) throw notFound('finding');
  await writeHistory(tx, actor, now, {
    action: 'finding.recorded',
    entity: 'finding',
    entityId: added.id,
    componentId: component.id,
    flawId: flaw.id,
    summary: `Finding ${finding.indicationNo} of report ${inspection.reportNo} recorded as ${flaw.number}: height ${finding.heightMm} mm, length ${finding.lengthMm} mm`,
    after: added,
    eventOn: inspectedOn,
  });
  if (earlier) await continueFlaw(tx, actor, now, earlier, finding);
  return { findingId: added.id, flawId: flaw.id, flawNumber: flaw.number, isNew: !earlier };
}

/** Findings are added only while the report is still being written. */
export function refuseClosedInspection(inspection: InspectionRecord): void {
  if (['submitted', 'accepted', 'void'].includes(inspection.state)) {
    throw unacceptable(
      'inspection.closed',
      `Report ${inspection.reportNo} is ${inspection.state}; findings can no longer be added to it.`,
    );
  }
}
