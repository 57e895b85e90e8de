import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatProgressBarModule } from '@angular/material/progress-bar';

/** Something is on its way. */
@Component({
  selector: 'app-loading',
  imports: [MatProgressBarModule],
  template: `<p role="status" class="quiet">Loading {{ what() }} …</p>
    <mat-progress-bar mode="indeterminate" aria-hidden="true" />`,
  styles: ':host { display: block; max-width: 420px; padding: 16px 0; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LoadingState {
  readonly what = input('');
}
