import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { situationOf } from '@ligament/domain/assessment/flaw-case';
import { solutionsFor } from '@ligament/domain/fracture/select-solutions';

type ChoiceField = 'stressIntensityChoice' | 'referenceStressChoice';

/** One of the two solutions: what governs, what else there is, and what was chosen why. */
interface Offer {
  readonly field: ChoiceField;
  readonly name: string;
  readonly solutions: readonly {
    readonly key: string;
    readonly title: string;
    readonly source: string;
  }[];
  readonly key: string;
  readonly source: string;
  readonly reason: string;
  /** Whether another than the governing one was chosen. */
  readonly changed: boolean;
}

const NAMES: Readonly<Record<ChoiceField, string>> = {
  stressIntensityChoice: 'Stress intensity',
  referenceStressChoice: 'Reference stress',
};

/** Which published solutions the flaw is assessed with; another of the catalogue needs a reason. */
@Component({
  selector: 'app-solution-choice',
  templateUrl: './solution-choice.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SolutionChoice {
  readonly input = input.required<AssessmentInput>();
  readonly readOnly = input(false);
  readonly messages = input<ReadonlyMap<string, string>>(new Map());
  readonly changed = output<AssessmentInput>();

  protected readonly offers = computed<readonly Offer[]>(() => {
    const entry = solutionsFor(situationOf(this.input()));
    if (!entry) return [];
    return [
      this.offer('stressIntensityChoice', entry.stressIntensity),
      this.offer('referenceStressChoice', entry.referenceStress),
    ];
  });

  protected choose(field: ChoiceField, key: string): void {
    const [governing] = this.offers().find((each) => each.field === field)?.solutions ?? [];
    const reason = this.input()[field]?.reason ?? '';
    this.emit(field, key === governing?.key ? null : { key, reason });
  }

  protected explain({ field, key }: Offer, reason: string): void {
    this.emit(field, { key, reason });
  }

  private offer(field: ChoiceField, solutions: Offer['solutions']): Offer {
    const choice = this.input()[field] ?? null;
    const own = solutions.find(({ key }) => key === choice?.key) ?? solutions[0];
    return {
      field,
      name: NAMES[field],
      solutions,
      key: own?.key ?? '',
      source: own?.source ?? '',
      reason: choice?.reason ?? '',
      changed: choice !== null,
    };
  }

  private emit(field: ChoiceField, choice: AssessmentInput[ChoiceField]): void {
    this.changed.emit({ ...this.input(), [field]: choice });
  }
}
