import { judgeChosenDate } from '@ligament/domain/scheduling/judge-chosen-date';
import type {
  NoReinspection,
  ReinspectionProposal,
} from '@ligament/domain/scheduling/propose-reinspection';
import { unacceptable } from '../../http/failure';

/** Refuses a chosen date that the rules do not let stand. */
export function refuseDate(
  proposal: ReinspectionProposal | NoReinspection | null,
  chosen: string | null,
  reason: string,
): void {
  if (proposal?.status !== 'proposed' || chosen === null) return;
  const { dueOn: proposed, limitOn } = proposal;
  const judgement = judgeChosenDate({ proposed, chosen, limitOn, reason });
  if (judgement.allowed) return;
  const field = judgement.problem === 'reason missing' ? 'chosenReason' : 'chosenDueOn';
  throw unacceptable(
    `assessment.date.${judgement.problem.replaceAll(' ', '-')}`,
    judgement.message,
    field,
  );
}
