import type { SignatureMeaning } from '@ligament/domain/contract/vocabulary';
import type { Transaction } from '../../db/database';
import type { Actor } from '../../http/actor';
import { assessmentRepository, type AssessmentRecord } from './assessment.repository';

/** Adds a signature bound to the content as it stands. */
export function signAssessment(
  tx: Transaction,
  actor: Actor,
  now: Date,
  record: AssessmentRecord,
  meaning: SignatureMeaning,
  comment: string,
): Promise<void> {
  return assessmentRepository(tx).sign({
    siteId: record.siteId,
    entity: 'assessment',
    entityId: record.id,
    contentHash: record.contentHash,
    personId: actor.personId,
    personName: actor.name,
    role: actor.role,
    competence: actor.competence,
    meaning,
    comment,
    signedAt: now,
  });
}
