import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessedFlaw } from '@ligament/domain/assessment/assessment-outcome';

/** An assessment with a verdict, and the days it is about: all that its drawings and figures need. */
export interface AssessedCase {
  readonly input: AssessmentInput;
  readonly outcome: AssessedFlaw;
  readonly inspectedOn: string;
  /** Next inspection, chosen or proposed; null when the flaw is not acceptable. */
  readonly dueOn: string | null;
  /** Sizing error the inspection stated; null when it is not known here. */
  readonly sizingError: { readonly heightMm: number; readonly lengthMm: number } | null;
}
