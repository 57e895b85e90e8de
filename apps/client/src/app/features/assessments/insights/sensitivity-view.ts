import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import { sensitivity } from '@ligament/domain/assessment/analyses/sensitivity';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { Chart } from '../../../shared/chart/chart';
import { Drawing } from '../../../shared/drawing/drawing';
import { numberText } from '../../../shared/quantity/quantity-text';
import { type Moved, movedRows, sensitivityChart, sensitivityTable } from './sensitivity-chart';

/** Which input moves the verdict or the life most: the case assessed again with one changed at a time. */
@Component({
  selector: 'app-sensitivity-view',
  imports: [Chart, Drawing],
  template: `
    @if (found(); as result) {
      <div class="toolbar" role="group" aria-label="What is moved">
        <button
          type="button"
          [attr.aria-pressed]="moved() === 'reserve'"
          (click)="moved.set('reserve')"
        >
          Reserve on load
        </button>
        <button type="button" [attr.aria-pressed]="moved() === 'life'" (click)="moved.set('life')">
          Remaining life
        </button>
      </div>
      <app-drawing
        heading="What moves it"
        caption="each input changed alone by a plausible amount, all else as given"
        [table]="table()"
        name="sensitivity"
      >
        @if (bars() > 0) {
          <app-chart [options]="options()" [label]="label()" [height]="70 + 26 * bars()" />
        } @else {
          <p class="caption">
            No input moves it: there is no such figure, or growth alone decides.
          </p>
        }
      </app-drawing>
    }
  `,
  styles: `
    .toolbar button[aria-pressed='true'] {
      font-weight: 600;
      text-decoration: underline;
      text-underline-offset: 4px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SensitivityView {
  readonly input = input.required<AssessmentInput>();

  protected readonly moved = signal<Moved>('reserve');
  protected readonly found = computed(() => {
    const result = sensitivity(this.input());
    return result.status === 'found' ? result : null;
  });
  private readonly rows = computed(() => {
    const found = this.found();
    return found ? movedRows(found, this.moved()) : [];
  });
  protected readonly bars = computed(() => this.rows().length);
  protected readonly options = computed(() => {
    const found = this.found();
    return found ? sensitivityChart(found, this.moved()) : {};
  });
  protected readonly table = computed(() => {
    const found = this.found();
    return found ? sensitivityTable(found) : { columns: [], rows: [] };
  });
  protected readonly label = computed(() => {
    const [first] = this.rows();
    if (!first) return 'No input moves it.';
    const of = (shifted: typeof first.low) =>
      numberText(
        this.moved() === 'reserve' ? (shifted.reserveOnLoad ?? 0) : (shifted.years ?? 0),
        2,
      );
    return `Bars of how far each input moves it; most: ${first.name}, ${first.change}, from ${of(first.low)} to ${of(first.high)}.`;
  });
}
