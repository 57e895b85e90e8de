import type { FormControl, FormGroup, NonNullableFormBuilder } from '@angular/forms';
import { prose } from '@ligament/domain/contract/primitives';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import { fits } from '../../shared/validation/fits';

/** What an engineer writes beside the computed result. */
export type ConclusionForm = FormGroup<{
  conclusion: FormControl<string>;
  /** Empty: the date follows the proposal. */
  chosenDueOn: FormControl<string>;
  chosenReason: FormControl<string>;
}>;

export const conclusionForm = (build: NonNullableFormBuilder): ConclusionForm =>
  build.group({
    conclusion: ['', fits(prose(4000))],
    chosenDueOn: [''],
    chosenReason: ['', fits(prose(2000))],
  });

/** What of an assessment stands in the form; a date that is the proposed one follows it. */
export function conclusionOf({ conclusion, chosenDueOn, chosenReason, proposal }: AssessmentView) {
  const proposed = proposal?.status === 'proposed' ? proposal.dueOn : null;
  return {
    conclusion,
    chosenReason,
    chosenDueOn: chosenDueOn !== null && chosenDueOn !== proposed ? chosenDueOn : '',
  };
}
