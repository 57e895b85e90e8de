import type { AssessmentView } from '@ligament/domain/contract/assessments';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { staleVersion } from '../../http/failure';
import { writeHistory } from '../history/write-history';
import { assessmentRepository } from './assessment.repository';
import { assessmentView } from './assessment-view';
import { refuseOwnWork } from './refuse-own-work';
import { signAssessment } from './sign-assessment';
import { subjectOf } from './subject';

/** Returns a submitted assessment to its author with a reason. */
export function returnAssessment(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  reason: string,
): Promise<AssessmentView> {
  return db.transaction(async (tx) => {
    const { record, flaw } = await subjectOf(tx, actor.siteId, id);
    refuseOwnWork(actor, record);
    const now = clock.now();
    const after = await assessmentRepository(tx).change(id, seen, ['submitted'], {
      state: 'returned',
      returnReason: reason,
      reviewerId: actor.personId,
      updatedAt: now,
    });
    if (!after) throw staleVersion('assessment', await assessmentView(tx, record));
    await signAssessment(tx, actor, now, after, 'returned', reason);
    await writeHistory(tx, actor, now, {
      action: 'assessment.returned',
      entity: 'assessment',
      entityId: id,
      componentId: flaw.componentId,
      flawId: flaw.id,
      summary: `Assessment of ${flaw.number}, revision ${record.revision}, returned to its author`,
      before: { state: 'submitted' },
      after: { state: 'returned' },
      reason,
    });
    return assessmentView(tx, after);
  });
}
