import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { PartialFactorsInput } from '@ligament/domain/assessment/assessment-input-options';

const NONE: PartialFactorsInput = { stress: 1, size: 1, toughness: 1, yield: 1, note: '' };
const FACTORS = [
  ['stress', 'on primary stress'],
  ['size', 'on the size of the flaw'],
  ['toughness', 'toughness is divided by'],
  ['yield', 'strength is divided by'],
] as const;

/** Partial factors for a wanted reliability; left out, they are all 1. */
@Component({
  selector: 'app-factor-fields',
  templateUrl: './factor-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FactorFields {
  readonly input = input.required<AssessmentInput>();
  readonly readOnly = input(false);
  readonly messages = input<ReadonlyMap<string, string>>(new Map());
  readonly changed = output<AssessmentInput>();

  protected readonly factors = FACTORS;

  protected include(on: boolean): void {
    this.changed.emit({ ...this.input(), partialFactors: on ? NONE : null });
  }

  protected setFactor(which: (typeof FACTORS)[number][0], value: number): void {
    this.set({ [which]: value });
  }

  protected set(change: Partial<PartialFactorsInput>): void {
    const { partialFactors } = this.input();
    if (partialFactors) {
      this.changed.emit({ ...this.input(), partialFactors: { ...partialFactors, ...change } });
    }
  }
}
