import type { AssessmentView } from '@ligament/domain/contract/assessments';
import type { Database } from '../../db/database';
import { notFound } from '../../http/failure';
import { readFlawForAssessment } from '../flaws/read-flaw-for-assessment';
import { assessmentRepository, type AssessmentRecord } from './assessment.repository';

/** One assessment as it leaves the server. */
export async function assessmentView(
  db: Database,
  record: AssessmentRecord,
): Promise<AssessmentView> {
  const repository = assessmentRepository(db);
  const around = await repository.surroundings(record.id);
  const flaw = await readFlawForAssessment(db, record.siteId, record.flawId, record.findingId);
  if (!around || !flaw) throw notFound('assessment');
  const previous = record.supersedesId
    ? await repository.byId(record.siteId, record.supersedesId)
    : undefined;
  const input = record.input as AssessmentView['input'];
  return {
    ...record,
    ...around,
    ...flaw,
    input,
    proposal: record.proposal as AssessmentView['proposal'],
    editorIds: [...record.editorIds],
    submittedAt: record.submittedAt?.toISOString() ?? null,
    approvedAt: record.approvedAt?.toISOString() ?? null,
    previous: previous
      ? {
          id: previous.id,
          revision: previous.revision,
          input: previous.input as AssessmentView['input'],
          outcome: previous.outcome,
        }
      : null,
    signatures: (await repository.signatures(record.id)).map((signature) => ({
      ...signature,
      signedAt: signature.signedAt.toISOString(),
    })),
  };
}
