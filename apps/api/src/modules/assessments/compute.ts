import { createHash } from 'node:crypto';
import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentOutcome } from '@ligament/domain/assessment/assessment-outcome';
import type { SiteRules } from '@ligament/domain/contract/site-rules';
import type { Mechanism } from '@ligament/domain/contract/vocabulary';
import { canonicalJson } from '@ligament/domain/records/canonical-json';
import {
  type NoReinspection,
  proposeReinspection,
  type ReinspectionProposal,
} from '@ligament/domain/scheduling/propose-reinspection';

/** What the server computes from an input: the outcome, and the re-inspection the site's rules propose. */
export interface Computed {
  readonly outcome: AssessmentOutcome;
  readonly proposal: ReinspectionProposal | NoReinspection | null;
}

export function compute(
  input: AssessmentInput,
  inspectedOn: string,
  mechanism: Mechanism,
  rules: SiteRules,
): Computed {
  const outcome = assessFlaw(input);
  return {
    outcome,
    proposal:
      outcome.status === 'assessed'
        ? proposeReinspection({ inspectedOn, life: outcome.life, mechanism, policy: rules })
        : null,
  };
}

/** What a signature binds to; any change of it voids the signature. */
export interface SignedContent {
  readonly flawId: string;
  readonly findingId: string;
  readonly revision: number;
  readonly input: AssessmentInput;
  readonly outcome: AssessmentOutcome;
  readonly chosenDueOn: string | null;
  readonly chosenReason: string;
  readonly conclusion: string;
}

/** SHA-256 over the canonical form of everything that is signed. */
export function contentHash(content: SignedContent): string {
  const { flawId, findingId, revision, input, outcome, chosenDueOn, chosenReason, conclusion } =
    content;
  return createHash('sha256')
    .update(
      canonicalJson({
        flawId,
        findingId,
        revision,
        input,
        outcome,
        chosenDueOn,
        chosenReason,
        conclusion,
      }),
    )
    .digest('hex');
}
