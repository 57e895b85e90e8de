import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentOutcome } from '@ligament/domain/assessment/assessment-outcome';
import { assessmentInput } from '@ligament/domain/contract/assessment-input';
import type { ReinspectionProposalView } from '@ligament/domain/contract/assessments';
import type { SiteRules } from '@ligament/domain/contract/site-rules';
import { proposeReinspection } from '@ligament/domain/scheduling/propose-reinspection';

/** What the browser computes while an engineer thinks: the very engine that the server records with. */
export interface LiveAssessment {
  /** What it was computed from; what is typed may already be further. */
  readonly input: AssessmentInput;
  /** Null while an input is missing or cannot be a value at all. */
  readonly outcome: AssessmentOutcome | null;
  readonly proposal: ReinspectionProposalView | null;
  /** What is wrong, by the path of the input: the contract's words, or the engine's limit. */
  readonly messages: ReadonlyMap<string, string>;
}

export interface LiveSubject {
  readonly input: AssessmentInput;
  readonly inspectedOn: string;
  readonly mechanism: string;
  /** Null until the site's rules are here; no date is proposed before. */
  readonly rules: SiteRules | null;
}

export function assessLive({ input, inspectedOn, mechanism, rules }: LiveSubject): LiveAssessment {
  const read = assessmentInput.safeParse(input);
  if (!read.success) {
    const messages = read.error.issues.map(
      ({ path, message }) => [fieldOf(path.join('.')), message] as const,
    );
    return { input, outcome: null, proposal: null, messages: new Map([...messages].reverse()) };
  }
  const outcome = assessFlaw(read.data);
  if (outcome.status === 'refused') {
    const messages = outcome.refusals.map(
      ({ input: path, limit, message }) => [fieldOf(path), `${message} (limit: ${limit})`] as const,
    );
    return { input, outcome, proposal: null, messages: new Map(messages) };
  }
  const proposal = rules
    ? proposeReinspection({ inspectedOn, life: outcome.life, mechanism, policy: rules })
    : null;
  return { input, outcome, proposal: proposal && copyOf(proposal), messages: new Map() };
}

/** The field on screen that holds the member at fault: a value and all its places are one field. */
const fieldOf = (path: string): string => path.replace(/\.(value|note|provenance)(\..*)?$/, '');

/** The proposal as it travels. */
function copyOf(proposal: ReturnType<typeof proposeReinspection>): ReinspectionProposalView {
  return proposal.status === 'no date'
    ? { ...proposal }
    : { ...proposal, candidates: proposal.candidates.map((each) => ({ ...each })) };
}
