import type { CalculationStep, RemainingLife } from './assessment-outcome';
import type { AssessmentInput } from './assessment-input';
import type { CharacterisedFlaw } from './characterise';
import type { LimitingSize } from './limiting-size';
import type { Section } from './section';
import { diagramSteps } from './sheet/diagram-steps';
import { lifeSteps } from './sheet/life-steps';
import { sizeSteps } from './sheet/size-steps';
import { stressSteps } from './sheet/stress-steps';
import type { Standing } from './standing';

/** Everything the sheet speaks of: results already computed, never computed again. */
export interface SheetSubject {
  readonly input: AssessmentInput;
  readonly flaw: CharacterisedFlaw;
  readonly section: Section;
  readonly point: Standing;
  readonly limiting: LimitingSize;
  readonly life: RemainingLife;
}

/** The steps of the assessment in the order they were taken. */
export const calculationSheet = (subject: SheetSubject): readonly CalculationStep[] => [
  ...sizeSteps(subject),
  ...stressSteps(subject),
  ...diagramSteps(subject),
  ...lifeSteps(subject),
];
