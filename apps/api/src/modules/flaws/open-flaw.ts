import type { CandidateFinding } from '@ligament/domain/inspection/import-context';
import type { Transaction } from '../../db/database';
import type { HistoryActor } from '../../http/actor';
import { notFound } from '../../http/failure';
import type { ComponentRecord } from '../components/component.repository';
import { writeHistory } from '../history/write-history';
import { flawRepository, type FlawRecord } from './flaw.repository';

/** Opens a new flaw of a component for a finding; its number follows the highest ever given and is never used again. */
export async function openFlaw(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  component: ComponentRecord,
  finding: CandidateFinding,
): Promise<FlawRecord> {
  const repository = flawRepository(tx);
  const number = `${component.tag}-F${String((await repository.highestNumber(component.id)) + 1).padStart(2, '0')}`;
  const added = await repository.add({
    siteId: component.siteId,
    componentId: component.id,
    locationId: finding.locationId,
    number,
    kind: finding.kind,
    face: finding.face,
    orientation: finding.orientation,
    mechanism: component.mechanism,
    state: 'new',
    axialMm: finding.axialMm,
    circumferentialMm: finding.circumferentialMm,
    createdAt: now,
    updatedAt: now,
  });
  if (!added) throw notFound('flaw');
  await writeHistory(tx, actor, now, {
    action: 'flaw.opened',
    entity: 'flaw',
    entityId: added.id,
    componentId: component.id,
    flawId: added.id,
    summary: `Flaw ${number} opened at ${finding.locationName}`,
    after: added,
  });
  return added;
}

/** Takes over into a flaw what a newer finding says of its kind, side and place. */
export async function continueFlaw(
  tx: Transaction,
  actor: HistoryActor,
  now: Date,
  flaw: FlawRecord,
  finding: CandidateFinding,
): Promise<void> {
  const { kind, face, orientation } = finding;
  const after = await flawRepository(tx).change(flaw.siteId, flaw.id, flaw.version, {
    kind,
    face,
    orientation,
    axialMm: finding.axialMm ?? flaw.axialMm,
    circumferentialMm: finding.circumferentialMm ?? flaw.circumferentialMm,
    updatedAt: now,
  });
  if (!after) throw notFound('flaw');
  await writeHistory(tx, actor, now, {
    action: 'flaw.continued',
    entity: 'flaw',
    entityId: flaw.id,
    componentId: flaw.componentId,
    flawId: flaw.id,
    summary: `Flaw ${flaw.number} found again: height ${finding.heightMm} mm, length ${finding.lengthMm} mm`,
    after: { heightMm: finding.heightMm, lengthMm: finding.lengthMm },
  });
}
