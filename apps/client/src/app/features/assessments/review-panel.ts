import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

const POINTS = [
  'Every input was compared with the document its note names.',
  'Assumed inputs, and values put over the register’s, are right to assume here.',
  'Limits of the method, cautions and steps of the calculation were read.',
  'Conclusion and date follow from the result.',
] as const;

/** The independent check: points to go through, then approval or return. */
@Component({
  selector: 'app-review-panel',
  imports: [MatButtonModule],
  template: `
    <section class="sheet no-print" aria-labelledby="check">
      <h2 id="check">Independent check</h2>
      <p class="quiet">
        {{ author() }} sent this for check. Inputs cannot be changed here: return it with a reason
        if something is wrong.
      </p>
      @for (point of points; track $index; let i = $index) {
        <label class="tick"
          ><input
            #ticked
            type="checkbox"
            [checked]="done().has(i)"
            (change)="tick(i, ticked.checked)"
          />{{ point }}</label
        >
      }
      <div class="actions">
        <button
          mat-flat-button
          type="button"
          [disabled]="busy() || !complete()"
          (click)="approved.emit()"
        >
          Approve
        </button>
        <button mat-stroked-button type="button" [disabled]="busy()" (click)="returned.emit()">
          Return with a reason
        </button>
        @if (!complete()) {
          <span class="caption">Approval opens once all points are ticked.</span>
        }
      </div>
    </section>
  `,
  styles: `
    :host {
      display: block;
      margin-bottom: 16px;
    }
    .tick {
      display: block;
      padding: 4px 0;
      font-size: 13px;
    }
    .actions {
      margin-top: 10px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReviewPanel {
  readonly author = input.required<string>();
  readonly busy = input(false);
  readonly approved = output();
  readonly returned = output();
  protected readonly points = POINTS;
  protected readonly done = signal<ReadonlySet<number>>(new Set());
  protected readonly complete = computed(() => this.done().size === POINTS.length);

  protected tick(point: number, on: boolean): void {
    this.done.update((before) => {
      const after = new Set(before);
      if (on) after.add(point);
      else after.delete(point);
      return after;
    });
  }
}
