import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  ElementRef,
  inject,
  input,
} from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import type { AbstractControl } from '@angular/forms';
import { map, startWith, switchMap } from 'rxjs';

let messages = 0;

/**
 * The message of a field, once it was touched: the contract's, or the server's. It stands beside the field, under the
 * same parent, and ties itself to it for a screen reader.
 */
@Component({
  selector: 'app-field-error',
  template: `@if (message(); as text) {
    <span class="field-error" role="alert" [id]="id">{{ text }}</span>
  }`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FieldError {
  readonly control = input.required<AbstractControl>();

  protected readonly id = `field-error-${++messages}`;
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  private readonly state = toSignal(
    toObservable(this.control).pipe(
      switchMap((control) =>
        control.events.pipe(
          startWith(null),
          map(() => ({ touched: control.touched, errors: control.errors })),
        ),
      ),
    ),
  );

  protected readonly message = computed(() => {
    const state = this.state();
    return state?.touched && state.errors ? textOf(state.errors) : '';
  });

  constructor() {
    effect(() => this.tieToField(this.message() !== ''));
  }

  private tieToField(wrong: boolean): void {
    const field = this.host.nativeElement.parentElement?.querySelector('input, select, textarea');
    field?.setAttribute('aria-invalid', String(wrong));
    if (wrong) field?.setAttribute('aria-describedby', this.id);
    else field?.removeAttribute('aria-describedby');
  }
}

function textOf(errors: Readonly<Record<string, unknown>>): string {
  if (typeof errors['fits'] === 'string') return errors['fits'];
  if (typeof errors['server'] === 'string') return errors['server'];
  return 'required' in errors ? 'Fill this in.' : 'Check this value.';
}
