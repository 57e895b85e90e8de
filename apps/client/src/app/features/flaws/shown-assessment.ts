import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentOutcome } from '@ligament/domain/assessment/assessment-outcome';
import type {
  AssessmentView,
  ReinspectionProposalView,
} from '@ligament/domain/contract/assessments';
import type { FlawView } from '@ligament/domain/contract/flaws';
import { map, type Observable, of, switchMap } from 'rxjs';
import type { AssessedCase } from '../../shared/assessed/assessed-case';
import type { FlawsClient } from './flaws-client';

/** What a flaw's page stands on: the approved assessment, else the open one, else one computed just now. */
export interface ShownAssessment {
  readonly standing: 'approved' | 'open' | 'provisional';
  /** Null when it is recorded nowhere. */
  readonly id: string | null;
  readonly revision: number | null;
  readonly state: string;
  readonly input: AssessmentInput;
  readonly outcome: AssessmentOutcome;
  readonly inspectedOn: string;
  readonly findingId: string;
  readonly proposal: ReinspectionProposalView | null;
  readonly chosenDueOn: string | null;
  readonly conclusion: string;
  readonly signedBy: string;
}

/** Finds what to show for a flaw; null when it has neither an assessment nor the means for one. */
export function shownAssessment(
  client: FlawsClient,
  flaw: FlawView,
  mayPreview: boolean,
): Observable<ShownAssessment | null> {
  const row =
    flaw.assessments.find(({ state }) => state === 'approved') ??
    flaw.assessments.find(({ state }) => state !== 'superseded');
  if (row) return client.assessment(row.id).pipe(map(fromView));
  if (!mayPreview || flaw.scope !== null || flaw.findings.length === 0) return of(null);
  return client.inputs(flaw.id).pipe(
    switchMap(({ input, inspectedOn, mechanism, findingId }) =>
      client.preview({ input, inspectedOn, mechanism }).pipe(
        map(({ outcome, proposal }) => ({
          standing: 'provisional' as const,
          id: null,
          revision: null,
          state: 'provisional',
          chosenDueOn: null,
          conclusion: '',
          signedBy: '',
          input,
          outcome,
          inspectedOn,
          findingId,
          proposal,
        })),
      ),
    ),
  );
}

function fromView(view: AssessmentView): ShownAssessment {
  const names = [view.authorName, view.reviewerName].filter((name) => name !== null);
  return {
    standing: view.state === 'approved' ? 'approved' : 'open',
    id: view.id,
    revision: view.revision,
    state: view.state,
    input: view.input,
    outcome: view.outcome,
    inspectedOn: view.inspectedOn,
    findingId: view.finding.id,
    proposal: view.proposal,
    chosenDueOn: view.chosenDueOn,
    conclusion: view.conclusion,
    signedBy: view.state === 'approved' ? names.join(' and ') : '',
  };
}

/** The shown assessment with the flaw's own dates and sizing errors; null when the engine refused. */
export function caseOf(flaw: FlawView, shown: ShownAssessment): AssessedCase | null {
  const { outcome, input, inspectedOn } = shown;
  if (outcome.status === 'refused') return null;
  const finding = flaw.findings.find(({ id }) => id === shown.findingId);
  return {
    input,
    outcome,
    inspectedOn,
    dueOn: dueOf(flaw, shown),
    sizingError: finding
      ? { heightMm: finding.heightErrorMm, lengthMm: finding.lengthErrorMm }
      : null,
  };
}

function dueOf({ reinspection }: FlawView, { standing, proposal, chosenDueOn }: ShownAssessment) {
  if (standing === 'approved' && reinspection) return reinspection.dueOn;
  return chosenDueOn ?? (proposal?.status === 'proposed' ? proposal.dueOn : null);
}

/** Where the date comes from, in a few words. */
export function basisOf({ standing, proposal, chosenDueOn }: ShownAssessment): string {
  if (proposal?.status !== 'proposed') return '';
  const rule = proposal.candidates.find(({ governs }) => governs)?.rule ?? '';
  const chosen = chosenDueOn !== null && chosenDueOn !== proposal.dueOn;
  const basis = chosen
    ? 'chosen by the engineer'
    : rule === 'fraction of life'
      ? 'share of the remaining life'
      : rule;
  return standing === 'approved' ? basis : `proposed, not signed: ${basis}`;
}
