import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { AbstractControl } from '@angular/forms';

/** The message of a field, once it was touched: the contract's, or the server's. */
@Component({
  selector: 'app-field-error',
  template: `@if (control().touched && control().errors; as errors) {
    <span class="field-error" role="alert">{{ text(errors) }}</span>
  }`,
  // not OnPush: touched and errors of a control are no signals, and the form's own events mark its parents
  changeDetection: ChangeDetectionStrategy.Eager,
})
export class FieldError {
  readonly control = input.required<AbstractControl>();

  protected text(errors: Readonly<Record<string, unknown>>): string {
    if (typeof errors['fits'] === 'string') return errors['fits'];
    if (typeof errors['server'] === 'string') return errors['server'];
    return 'required' in errors ? 'Fill this in.' : 'Check this value.';
  }
}
