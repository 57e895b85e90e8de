import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { DifferenceTable } from '../difference/difference-table';

/** Somebody else saved first: what theirs is and what yours would be, and the two ways on. Nothing typed is lost. */
@Component({
  selector: 'app-changed-meanwhile',
  imports: [MatButtonModule, DifferenceTable],
  template: `
    <div class="notice warn" role="alert">
      <p>
        <strong>Somebody else changed this {{ what() }} after you opened it.</strong> “Before” is
        what is recorded now, “After” is what you are about to save.
      </p>
      <app-difference-table [before]="theirs()" [after]="mine()" caption="Theirs and yours" />
      <div class="actions">
        <button mat-flat-button type="button" (click)="keepMine.emit()">Save mine over it</button>
        <button mat-stroked-button type="button" (click)="takeTheirs.emit()">
          Take over what is recorded
        </button>
      </div>
    </div>
  `,
  styles: '.actions { margin-top: 8px; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChangedMeanwhile {
  readonly what = input.required<string>();
  readonly theirs = input.required<Readonly<Record<string, unknown>>>();
  readonly mine = input.required<Readonly<Record<string, unknown>>>();
  readonly keepMine = output();
  readonly takeTheirs = output();
}
