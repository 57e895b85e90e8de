import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import { approveAssessment } from '../../apps/api/src/modules/assessments/approve-assessment';
import { changeAssessment } from '../../apps/api/src/modules/assessments/change-assessment';
import { returnAssessment } from '../../apps/api/src/modules/assessments/return-assessment';
import { startAssessment } from '../../apps/api/src/modules/assessments/start-assessment';
import { submitAssessment } from '../../apps/api/src/modules/assessments/submit-assessment';
import type { DemoAssessment } from '../plant/assessments';
import type { Flow } from './play';
import type { Stage } from './stage';

type Told = Omit<DemoAssessment, 'key'>;
type Input = AssessmentView['input'];

/** Plays one assessment from draft as far as the scenario says: written by one engineer, checked by another. */
export async function* assessAsTold(
  stage: Stage,
  flawId: string,
  on: string,
  told: Told,
  delay = 0,
): Flow {
  const { deps, actor, dates } = stage;
  const author = actor('tomas');
  yield dates.after(on, 4 + delay);
  const draft = await startAssessment(deps, author, flawId, {});
  const changed = await write(stage, draft, told.change, told.conclusion);
  if (told.until === 'draft' || changed.outcome.status === 'refused') return;
  yield dates.after(on, 5 + delay);
  let sent = await submitAssessment(deps, author, draft.id, changed.version);
  if (told.returned) {
    yield dates.after(on, 7 + delay);
    const back = await returnAssessment(
      deps,
      actor('amara'),
      draft.id,
      sent.version,
      told.returned.reason,
    );
    yield dates.after(on, 8 + delay);
    const again = await write(stage, back, told.returned.change, told.conclusion);
    sent = await submitAssessment(deps, author, draft.id, again.version);
  }
  if (told.until === 'submitted') return;
  yield dates.after(on, 9 + delay);
  await approveAssessment(
    deps,
    actor('amara'),
    draft.id,
    sent.version,
    'Inputs and steps checked against the documents named.',
  );
  if (told.then) yield* assessAsTold(stage, flawId, on, told.then, delay + 7);
}

function write(
  { deps, actor }: Stage,
  view: AssessmentView,
  change: ((input: AssessmentInput) => AssessmentInput) | undefined,
  conclusion: string | undefined,
): Promise<AssessmentView> {
  const input = change ? (change(view.input) as Input) : view.input;
  return changeAssessment(deps, actor('tomas'), view.id, view.version, {
    input,
    conclusion: conclusion ?? usualConclusion(view),
  });
}

function usualConclusion({ outcome }: AssessmentView): string {
  if (outcome.status === 'refused') return 'No verdict: see the refusal.';
  return outcome.verdict === 'not acceptable'
    ? 'Not acceptable at the assessed size.'
    : 'Acceptable until the re-inspection at the present operating conditions.';
}
