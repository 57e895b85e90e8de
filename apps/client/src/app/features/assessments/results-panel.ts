import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { AssessedCase } from '../../shared/assessed/assessed-case';
import { AssessedDrawings } from '../../shared/assessed/assessed-drawings';
import { figuresOf } from '../../shared/assessed/figures-of';
import { assumedNames } from '../../shared/assessed/input-names';
import type { LifeSurroundings } from '../../shared/assessed/life-of';
import { Caution } from '../../shared/caution/caution';
import { FigureStrip } from '../../shared/figure-strip/figure-strip';
import { numberText } from '../../shared/quantity/quantity-text';
import { CalculationSheet } from './calculation-sheet';
import { resultRows } from './result-rows';
import { ValidityTable } from './validity-table';

/** What the engine answers: drawings, numbers, limits met, cautions, and the steps that lead there. */
@Component({
  selector: 'app-results-panel',
  imports: [AssessedDrawings, FigureStrip, Caution, CalculationSheet, ValidityTable],
  templateUrl: './results-panel.html',
  styleUrl: './results-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResultsPanel {
  readonly assessed = input.required<AssessedCase>();
  readonly around = input.required<LifeSurroundings>();
  /** Name of exported files. */
  readonly name = input.required<string>();

  protected readonly outcome = computed(() => this.assessed().outcome);
  protected readonly figures = computed(() => figuresOf(this.assessed()));
  protected readonly rows = computed(() => resultRows(this.outcome()));
  protected readonly assumed = computed(() => assumedNames(this.outcome().assumed));
  protected readonly numberText = numberText;
}
