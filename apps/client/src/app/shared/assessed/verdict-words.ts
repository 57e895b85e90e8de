import type { AssessedFlaw } from '@ligament/domain/assessment/assessment-outcome';
import { dayText } from '../format/day-text';

/** The answer to a reader's first question in one sentence: acceptable or not, and until when. */
export function verdictSentence(verdict: AssessedFlaw['verdict'], dueOn: string | null): string {
  if (verdict === 'not acceptable') {
    return 'Not acceptable: repair it, or assess it again with better data, before service.';
  }
  const until = dueOn ? `, to be inspected again by ${dayText(dueOn)}` : '';
  return verdict === 'acceptable'
    ? `Acceptable${until}.`
    : `Acceptable but near the limit${until}.`;
}
