import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { locusOfFlaw } from '@ligament/domain/assessment/analyses/locus-of-flaw';
import { whatItTakes } from '@ligament/domain/assessment/analyses/what-it-takes';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { Chart } from '../../../shared/chart/chart';
import { Drawing } from '../../../shared/drawing/drawing';
import { numberText } from '../../../shared/quantity/quantity-text';
import { locusChart, locusTable } from './locus-chart';

/** Which sizes this wall could bear, and which load and toughness this flaw could. */
@Component({
  selector: 'app-locus-view',
  imports: [Chart, Drawing],
  template: `
    @if (takes(); as words) {
      <p>{{ words }}</p>
    }
    @if (locus(); as found) {
      <app-drawing
        heading="Limiting sizes"
        caption="height against length of the flaws that are just acceptable; the box is the sizing allowance"
        [table]="table()"
        name="limiting-sizes"
      >
        <app-chart [options]="options()" [label]="label()" [height]="320" />
      </app-drawing>
    } @else {
      <p class="caption">{{ refusal() }}</p>
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LocusView {
  readonly input = input.required<AssessmentInput>();

  private readonly result = computed(() => locusOfFlaw(this.input()));
  protected readonly locus = computed(() => {
    const result = this.result();
    return result.status === 'found' ? result : null;
  });
  protected readonly refusal = computed(() => {
    const result = this.result();
    return result.status === 'refused' ? (result.refusals[0]?.message ?? '') : '';
  });
  protected readonly options = computed(() => {
    const locus = this.locus();
    return locus ? locusChart(locus) : {};
  });
  protected readonly table = computed(() => {
    const locus = this.locus();
    return locus ? locusTable(locus) : { columns: [], rows: [] };
  });
  protected readonly label = computed(() => {
    const locus = this.locus();
    if (!locus) return '';
    const { assessed } = locus;
    return `Curve of the limiting height over the length; the assessed flaw lies at ${numberText(assessed.lengthMm, 1)} mm long and ${numberText(assessed.heightMm, 1)} mm high.`;
  });
  /** The inverse questions, in a sentence. */
  protected readonly takes = computed(() => {
    const takes = whatItTakes(this.input());
    if (takes.status === 'refused') return '';
    const { leastToughness, loadFactor } = takes;
    const toughness =
      leastToughness.status === 'found'
        ? `It needs a toughness of ${numberText(leastToughness.value, 1)} MPa√m.`
        : leastToughness.status === 'refused'
          ? ''
          : leastToughness.because;
    return `The flaw bears ${numberText(loadFactor, 2)} times the given primary load. ${toughness}`;
  });
}
