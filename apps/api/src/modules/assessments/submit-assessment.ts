import type { AssessmentView } from '@ligament/domain/contract/assessments';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import type { Database } from '../../db/database';
import { conflict, forbidden, staleVersion, unacceptable } from '../../http/failure';
import { newestFinding } from '../flaws/read-flaw-record';
import { writeHistory } from '../history/write-history';
import { assessmentRepository, type AssessmentRecord } from './assessment.repository';
import { assessmentView } from './assessment-view';
import { signAssessment } from './sign-assessment';
import { subjectOf } from './subject';

/** Sends an assessment for the independent check, signed by its author. */
export function submitAssessment(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
): Promise<AssessmentView> {
  return db.transaction(async (tx) => {
    const { record, flaw } = await subjectOf(tx, actor.siteId, id);
    if (record.state !== 'draft' && record.state !== 'returned') {
      throw conflict(
        'assessment.not-open',
        `This assessment is ${record.state}; it cannot be sent again.`,
      );
    }
    if (!record.editorIds.includes(actor.personId)) {
      throw forbidden('Only somebody who worked on this assessment signs it as author.');
    }
    await refuseUnfinished(tx, record);
    const now = clock.now();
    const after = await assessmentRepository(tx).change(id, seen, ['draft', 'returned'], {
      state: 'submitted',
      submittedAt: now,
      returnReason: '',
      updatedAt: now,
    });
    if (!after) throw staleVersion('assessment', await assessmentView(tx, record));
    await signAssessment(tx, actor, now, after, 'authored', '');
    await writeHistory(tx, actor, now, {
      action: 'assessment.submitted',
      entity: 'assessment',
      entityId: id,
      componentId: flaw.componentId,
      flawId: flaw.id,
      summary: `Assessment of ${flaw.number}, revision ${record.revision}, sent for check`,
      before: { state: record.state },
      after: { state: 'submitted', contentHash: after.contentHash },
    });
    return assessmentView(tx, after);
  });
}

/** Everything that stops an assessment from being signed. */
export async function refuseUnfinished(db: Database, record: AssessmentRecord): Promise<void> {
  if (record.outcome.status === 'refused') {
    const [first] = record.outcome.refusals;
    throw unacceptable(
      'assessment.refused',
      `No verdict can be given: ${first?.message ?? 'a limit is exceeded'}`,
      first?.input,
    );
  }
  if (record.conclusion.trim() === '') {
    throw unacceptable(
      'assessment.conclusion',
      'Write the conclusion: acceptable until when and under which conditions, or not acceptable.',
      'conclusion',
    );
  }
  const newest = await newestFinding(db, record.flawId);
  if (newest && newest.id !== record.findingId) {
    throw unacceptable(
      'assessment.older-finding',
      `A newer finding of ${newest.inspectedOn} exists (report ${newest.reportNo}): assess that one.`,
      'findingId',
    );
  }
  if (newest && newest.inspectionState !== 'accepted') {
    throw unacceptable(
      'assessment.report-not-accepted',
      `Report ${newest.reportNo} has not been accepted yet: accept it first.`,
      'findingId',
    );
  }
}
