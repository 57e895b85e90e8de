import { ChangeDetectionStrategy, Component, input, output, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { password } from '@ligament/domain/contract/session';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';

/** Asks for a new password; long rather than clever, and pasting is welcome. */
@Component({
  selector: 'app-password-form',
  imports: [ReactiveFormsModule, MatButtonModule, FieldError],
  template: `
    <form (submit)="$event.preventDefault(); send()">
      <p>
        <label class="label" for="new-password"
          >New password (at least 15 characters; a sentence is fine)</label
        >
        <input
          id="new-password"
          class="plain"
          [type]="shown() ? 'text' : 'password'"
          autocomplete="new-password"
          [formControl]="control"
        />
        <app-field-error [control]="control" />
      </p>
      <p>
        <label
          ><input type="checkbox" [checked]="shown()" (change)="shown.set(!shown())" /> Show the
          password</label
        >
      </p>
      <button mat-flat-button type="submit">{{ action() }}</button>
    </form>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PasswordForm {
  readonly action = input('Set the password');
  readonly chosen = output<string>();
  protected readonly shown = signal(false);
  protected readonly control = new FormControl('', {
    nonNullable: true,
    validators: [fits(password)],
  });

  protected send(): void {
    this.control.markAsTouched();
    if (this.control.valid) this.chosen.emit(this.control.value);
  }
}
