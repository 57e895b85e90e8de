import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { CalculationStep } from '@ligament/domain/assessment/assessment-outcome';
import { numberText } from '../../shared/quantity/quantity-text';

/** A result with its steps: formula, source, and the values that went in. */
@Component({
  selector: 'app-calculation-sheet',
  templateUrl: './calculation-sheet.html',
  styleUrl: './calculation-sheet.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CalculationSheet {
  readonly steps = input.required<readonly CalculationStep[]>();
  readonly engineVersion = input.required<string>();

  protected readonly groups = computed(() => {
    const groups = new Map<string, CalculationStep[]>();
    for (const step of this.steps()) {
      groups.set(step.group, [...(groups.get(step.group) ?? []), step]);
    }
    return [...groups].map(([title, steps]) => ({ title, steps }));
  });

  protected text({ value }: CalculationStep): string {
    if (typeof value === 'string') return value;
    const size = Math.abs(value);
    return size !== 0 && (size < 1e-3 || size >= 1e7)
      ? value.toExponential(4).replace('-', '−')
      : numberText(Number(value.toPrecision(6)), 6);
  }
}
