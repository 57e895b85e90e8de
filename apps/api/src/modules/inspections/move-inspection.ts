import type { InspectionView } from '@ligament/domain/contract/inspections';
import type { InspectionState } from '@ligament/domain/contract/vocabulary';
import type { Transaction } from '../../db/database';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, Failure, forbidden, notFound, staleVersion } from '../../http/failure';
import { signerOf } from '../history/signer-of';
import { writeHistory } from '../history/write-history';
import { completeReinspections } from '../reinspections/complete-reinspections';
import { reopenReinspections } from '../reinspections/reopen-reinspections';
import { inspectionRepository, type InspectionRecord } from './inspection.repository';
import { readInspectionView } from './inspection-view';
import { missingForSubmission } from './missing-for-submission';

interface Move {
  readonly to: InspectionState;
  readonly from: readonly InspectionState[];
  readonly action: string;
  readonly words: string;
}

export const MOVES = {
  submit: {
    to: 'submitted',
    from: ['planned', 'in progress', 'rejected'],
    action: 'inspection.submitted',
    words: 'handed over',
  },
  accept: { to: 'accepted', from: ['submitted'], action: 'inspection.accepted', words: 'accepted' },
  reject: {
    to: 'rejected',
    from: ['submitted'],
    action: 'inspection.rejected',
    words: 'sent back',
  },
  void: {
    to: 'void',
    from: ['planned', 'in progress', 'submitted', 'rejected', 'accepted'],
    action: 'inspection.voided',
    words: 'declared void',
  },
} as const satisfies Record<string, Move>;

/** Moves an inspection to its next state; each step checks what must be true first. */
export function moveInspection(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  move: keyof typeof MOVES,
  reason = '',
): Promise<InspectionView> {
  const { to, from, action, words }: Move = MOVES[move];
  return db.transaction(async (tx) => {
    const repository = inspectionRepository(tx);
    const found = await repository.byId(actor.siteId, id);
    if (!found) throw notFound('inspection');
    const { inspection } = found;
    if (!from.includes(inspection.state)) {
      throw conflict(
        'inspection.state',
        `This inspection is ${inspection.state}; it cannot be ${words} now.`,
      );
    }
    if (move === 'submit') refuseIncomplete(inspection, found.findings);
    if (move === 'accept') await refuseOwnReport(tx, actor, inspection);
    const now = clock.now();
    const after = await repository.change(actor.siteId, id, seen, { state: to, updatedAt: now });
    if (!after) throw staleVersion('inspection', await readInspectionView(tx, actor.siteId, id));
    await writeHistory(tx, actor, now, {
      action,
      entity: 'inspection',
      entityId: id,
      componentId: after.componentId,
      summary: `Inspection report ${after.reportNo} ${words}`,
      before: { state: inspection.state },
      after: { state: to },
      reason,
      eventOn: after.inspectedOn,
    });
    if (move === 'void') {
      await reopenReinspections(tx, actor, now, { inspectionId: id, reportNo: after.reportNo });
    }
    if (move === 'accept') {
      const flawIds = (await repository.flawsFound(id)).map(({ flawId }) => flawId);
      await completeReinspections(tx, actor, now, {
        componentId: after.componentId,
        inspectionId: id,
        reportNo: after.reportNo,
        flawIds,
      });
    }
    return readInspectionView(tx, actor.siteId, id);
  });
}

function refuseIncomplete(inspection: InspectionRecord, findings: number): void {
  const missing = missingForSubmission(inspection, findings);
  if (missing.length === 0) return;
  throw new Failure(
    'inspection.incomplete',
    422,
    'Something is missing',
    'The report cannot be handed over yet.',
    {
      errors: missing,
    },
  );
}

async function refuseOwnReport(
  tx: Transaction,
  actor: Actor,
  inspection: InspectionRecord,
): Promise<void> {
  if ((await signerOf(tx, inspection.id, 'inspection.submitted')) === actor.personId) {
    throw forbidden('You handed this report over yourself; somebody else has to accept it.');
  }
}
