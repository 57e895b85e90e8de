import type { AssessedFlaw } from '@ligament/domain/assessment/assessment-outcome';
import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import { canonicalJson } from '@ligament/domain/records/canonical-json';
import type {
  NoReinspection,
  ReinspectionProposal,
} from '@ligament/domain/scheduling/propose-reinspection';
import type { Transaction } from '../../db/database';
import type { Deps } from '../../deps';
import type { Actor } from '../../http/actor';
import { conflict, staleVersion } from '../../http/failure';
import type { FlawRecord } from '../flaws/flaw.repository';
import { newestFinding } from '../flaws/read-flaw-record';
import { setFlawState } from '../flaws/set-flaw-state';
import { writeHistory } from '../history/write-history';
import { cancelReinspection, openReinspection } from '../reinspections/open-reinspection';
import { assessmentRepository, type AssessmentRecord } from './assessment.repository';
import { assessmentView } from './assessment-view';
import { refuseDate } from './refuse-date';
import { refuseOwnWork } from './refuse-own-work';
import { signAssessment } from './sign-assessment';
import { subjectOf } from './subject';
import { refuseUnfinished } from './submit-assessment';

/**
 * Approves a submitted assessment: the server computes it again and must agree with what was signed, the one in force is
 * superseded, the flaw takes its state from the verdict, and the re-inspection date is set.
 */
export function approveAssessment(
  { db, clock }: Deps,
  actor: Actor,
  id: string,
  seen: number,
  comment: string,
): Promise<AssessmentView> {
  return db.transaction(async (tx) => {
    const { record, flaw } = await subjectOf(tx, actor.siteId, id);
    refuseOwnWork(actor, record);
    await refuseUnfinished(tx, record);
    refuseDisagreement(record);
    refuseDate(record.proposal as Proposal, record.chosenDueOn, record.chosenReason);
    const now = clock.now();
    await supersede(tx, actor, now, flaw, record.revision);
    const after = await assessmentRepository(tx).change(id, seen, ['submitted'], {
      state: 'approved',
      reviewerId: actor.personId,
      approvedAt: now,
      updatedAt: now,
    });
    if (!after) throw staleVersion('assessment', await assessmentView(tx, record));
    await signAssessment(tx, actor, now, after, 'reviewed and approved', comment);
    await writeHistory(tx, actor, now, {
      action: 'assessment.approved',
      entity: 'assessment',
      entityId: id,
      componentId: flaw.componentId,
      flawId: flaw.id,
      summary: `Assessment of ${flaw.number}, revision ${record.revision}, approved: ${verdictOf(after)}`,
      before: { state: 'submitted' },
      after: { state: 'approved', contentHash: after.contentHash, chosenDueOn: after.chosenDueOn },
      reason: comment,
    });
    await applyConsequences(tx, actor, now, after, flaw);
    return assessmentView(tx, after);
  });
}

type Proposal = ReinspectionProposal | NoReinspection | null;

const verdictOf = ({ outcome }: AssessmentRecord): string =>
  outcome.status === 'assessed' ? outcome.verdict : 'no verdict';

/** What was signed must be what the engine says now, bit for bit. */
function refuseDisagreement(record: AssessmentRecord): void {
  if (canonicalJson(assessFlaw(record.input)) !== canonicalJson(record.outcome)) {
    throw conflict(
      'assessment.engine-changed',
      `This assessment was computed with engine ${record.engineVersion}, and this server computes it differently. Return it so that its author can compute it again.`,
    );
  }
}

async function supersede(
  tx: Transaction,
  actor: Actor,
  now: Date,
  flaw: FlawRecord,
  by: number,
): Promise<void> {
  const repository = assessmentRepository(tx);
  const inForce = await repository.approvedOf(flaw.id);
  if (!inForce) return;
  await repository.change(inForce.id, inForce.version, ['approved'], {
    state: 'superseded',
    updatedAt: now,
  });
  await writeHistory(tx, actor, now, {
    action: 'assessment.superseded',
    entity: 'assessment',
    entityId: inForce.id,
    componentId: flaw.componentId,
    flawId: flaw.id,
    summary: `Assessment of ${flaw.number}, revision ${inForce.revision}, superseded by revision ${by}`,
    before: { state: 'approved' },
    after: { state: 'superseded' },
  });
}

async function applyConsequences(
  tx: Transaction,
  actor: Actor,
  now: Date,
  record: AssessmentRecord,
  flaw: FlawRecord,
): Promise<void> {
  const outcome = record.outcome as AssessedFlaw;
  const proposal = record.proposal as Proposal;
  if (outcome.verdict === 'not acceptable' || proposal?.status !== 'proposed') {
    await setFlawState(tx, actor, now, flaw.id, 'not acceptable');
    await cancelReinspection(
      tx,
      actor,
      now,
      flaw.id,
      'the flaw is not acceptable; repair or re-assess before service',
    );
    return;
  }
  await setFlawState(tx, actor, now, flaw.id, 'accepted with conditions');
  const finding = await newestFinding(tx, flaw.id);
  const dueOn = record.chosenDueOn ?? proposal.dueOn;
  await openReinspection(tx, actor, now, {
    componentId: flaw.componentId,
    flawId: flaw.id,
    assessmentId: record.id,
    flawNumber: flaw.number,
    technique: finding?.technique ?? 'other',
    dueOn,
    limitOn: proposal.limitOn,
    basis:
      dueOn === proposal.dueOn
        ? proposal.basis
        : `Chosen by the engineer: ${record.chosenReason || 'earlier than the rules ask'}. The rules propose ${proposal.dueOn}.`,
    candidates: proposal.candidates,
  });
}
