import { assessFlaw } from '../assess-flaw';
import type { AssessedFlaw, RefusedFlaw } from '../assessment-outcome';
import { sampleInput, type Variation } from './sample-input';

/** Assesses a variation of the sample and expects a verdict. */
export function assess(variation: Variation = {}): AssessedFlaw {
  const outcome = assessFlaw(sampleInput(variation));
  if (outcome.status === 'refused') throw new Error(JSON.stringify(outcome.refusals));
  return outcome;
}

/** Assesses a variation of the sample and expects a refusal. */
export function refuse(variation: Variation): RefusedFlaw {
  const outcome = assessFlaw(sampleInput(variation));
  if (outcome.status === 'assessed') throw new Error(`assessed: ${outcome.verdict}`);
  return outcome;
}
