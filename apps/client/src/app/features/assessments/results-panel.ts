import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { AssessedCase } from '../../shared/assessed/assessed-case';
import { numberText } from '../../shared/quantity/quantity-text';
import { CalculationSheet } from './calculation-sheet';
import { resultRows } from './result-rows';
import { ValidityTable } from './validity-table';

/** What the engine answers in numbers: results, limits met, cautions, and the steps that lead there. */
@Component({
  selector: 'app-results-panel',
  imports: [CalculationSheet, ValidityTable],
  templateUrl: './results-panel.html',
  styleUrl: './results-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResultsPanel {
  readonly assessed = input.required<AssessedCase>();

  protected readonly outcome = computed(() => this.assessed().outcome);
  protected readonly rows = computed(() => resultRows(this.outcome()));
  protected readonly numberText = numberText;
}
