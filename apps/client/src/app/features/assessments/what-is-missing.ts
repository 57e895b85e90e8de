import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentOutcome } from '@ligament/domain/assessment/assessment-outcome';
import type { ReinspectionProposalView } from '@ligament/domain/contract/assessments';
import { judgeChosenDate } from '@ligament/domain/scheduling/judge-chosen-date';
import { inputName, withinSentence } from '../../shared/assessed/input-names';
import { unexplainedPaths } from './overrides';

export interface Unfinished {
  readonly outcome: AssessmentOutcome | null;
  readonly input: AssessmentInput | null;
  readonly register: AssessmentInput | null;
  readonly proposal: ReinspectionProposalView | null;
  readonly conclusion: string;
  /** Empty: as proposed. */
  readonly chosenDueOn: string;
  readonly chosenReason: string;
}

/** What keeps an assessment from being sent for check, in words an engineer can act on. */
export function whatIsMissing(each: Unfinished): readonly string[] {
  const { outcome, input, register, conclusion } = each;
  const unexplained = input ? unexplainedPaths(input, register) : [];
  return [
    outcome === null ? 'Fill in the inputs that are marked.' : null,
    outcome?.status === 'refused' ? 'The method does not hold for these inputs: no verdict.' : null,
    conclusion.trim() === ''
      ? 'Write the conclusion: acceptable until when and under which conditions, or not acceptable.'
      : null,
    unexplained.length > 0
      ? `Say in the note why these differ from the register: ${unexplained
          .map((path) => withinSentence(inputName(path).name))
          .join(', ')}.`
      : null,
    wrongDate(each),
  ].filter((text) => text !== null);
}

function wrongDate({ proposal, chosenDueOn, chosenReason }: Unfinished): string | null {
  if (proposal?.status !== 'proposed' || chosenDueOn === '') return null;
  const { dueOn: proposed, limitOn } = proposal;
  const judgement = judgeChosenDate({
    proposed,
    limitOn,
    chosen: chosenDueOn,
    reason: chosenReason,
  });
  return judgement.allowed ? null : judgement.message;
}
