import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { email, requestPasswordReset } from '@ligament/domain/contract/session';
import { ApiClient } from '../../core/http/api-client';
import { type Problem, problemOf } from '../../core/http/problem';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { Door } from './door';

/** Asks for a password reset by e-mail. */
@Component({
  selector: 'app-request-reset',
  imports: [ReactiveFormsModule, MatButtonModule, RouterLink, Door, ProblemNotice, FieldError],
  template: `
    <app-door title="Forgotten password">
      @if (answer(); as text) {
        <p role="status">{{ text }}</p>
      } @else {
        <app-problem-notice [problem]="problem()" />
        <form (submit)="$event.preventDefault(); send()">
          <p>
            <label class="label" for="email">Your e-mail address</label>
            <input
              id="email"
              class="plain"
              type="email"
              autocomplete="username"
              [formControl]="address"
            />
            <app-field-error [control]="address" />
          </p>
          <button mat-flat-button type="submit">Send me a link</button>
        </form>
      }
      <p><a routerLink="/sign-in">Back to sign-in</a></p>
    </app-door>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RequestReset {
  private readonly api = inject(ApiClient);
  protected readonly address = new FormControl('', {
    nonNullable: true,
    validators: [fits(email)],
  });
  protected readonly problem = signal<Problem | null>(null);
  protected readonly answer = signal('');

  protected send(): void {
    this.address.markAsTouched();
    if (this.address.invalid) return;
    this.api.call(requestPasswordReset, { body: { email: this.address.value } }).subscribe({
      next: ({ detail }) => this.answer.set(detail),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }
}
