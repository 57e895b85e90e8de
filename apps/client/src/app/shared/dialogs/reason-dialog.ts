import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { FormControl, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';

export interface ReasonQuestion {
  readonly title: string;
  readonly text: string;
  readonly label: string;
  readonly action: string;
  /** Whether an empty answer is accepted. */
  readonly optional?: boolean;
  /** Asks for the password as well; the dialog then closes with both. */
  readonly password?: boolean;
}

export interface ReasonAnswer {
  readonly reason: string;
  readonly password: string;
}

/** Asks for a reason in words (and the password, for a sign-off); closes with a ReasonAnswer. */
@Component({
  selector: 'app-reason-dialog',
  imports: [MatDialogModule, MatButtonModule, ReactiveFormsModule],
  template: `
    <h2 mat-dialog-title>{{ question.title }}</h2>
    <form (submit)="$event.preventDefault(); answer()">
      <mat-dialog-content>
        <p>{{ question.text }}</p>
        <label class="label" for="reason">{{ question.label }}</label>
        <textarea
          id="reason"
          class="plain"
          rows="4"
          [formControl]="reason"
          cdkFocusInitial
        ></textarea>
        @if (reason.touched && reason.invalid) {
          <p class="field-error" role="alert">Give a reason in words.</p>
        }
        @if (question.password) {
          <label class="label" for="proof">Your password, again, as your signature</label>
          <input
            id="proof"
            class="plain"
            type="password"
            autocomplete="current-password"
            [formControl]="password"
          />
          @if (password.touched && password.invalid) {
            <p class="field-error" role="alert">Give your password.</p>
          }
        }
      </mat-dialog-content>
      <mat-dialog-actions align="end">
        <button mat-button type="button" mat-dialog-close>Cancel</button>
        <button mat-flat-button type="submit">{{ question.action }}</button>
      </mat-dialog-actions>
    </form>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReasonDialog {
  protected readonly question = inject<ReasonQuestion>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<ReasonDialog, ReasonAnswer>>(MatDialogRef);
  protected readonly reason = new FormControl('', {
    nonNullable: true,
    validators: this.question.optional ? [] : [Validators.required, Validators.minLength(3)],
  });
  protected readonly password = new FormControl('', {
    nonNullable: true,
    validators: this.question.password ? [Validators.required] : [],
  });

  protected answer(): void {
    this.reason.markAsTouched();
    this.password.markAsTouched();
    if (this.reason.invalid || this.password.invalid) return;
    this.dialog.close({ reason: this.reason.value.trim(), password: this.password.value });
  }
}
