import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { ProblemNotice } from '../problem/problem-notice';

/** Something could not be loaded: why, and a way to try again. */
@Component({
  selector: 'app-failed',
  imports: [MatButtonModule, ProblemNotice],
  template: `<app-problem-notice [problem]="problem()">
    <p><button mat-stroked-button type="button" (click)="again.emit()">Try again</button></p>
  </app-problem-notice>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FailedState {
  readonly problem = input.required<{
    readonly title: string;
    readonly detail: string;
    readonly errors: readonly { readonly field: string; readonly message: string }[];
  }>();
  readonly again = output();
}
