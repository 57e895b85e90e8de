import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { Router } from '@angular/router';
import { line } from '@ligament/domain/contract/primitives';
import { acceptInvitation } from '@ligament/domain/contract/session';
import { ApiClient } from '../../core/http/api-client';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { Door } from './door';
import { PasswordForm } from './password-form';

/** Accepts an invitation: name as it will stand under signatures, and a password. */
@Component({
  selector: 'app-accept-invitation',
  imports: [ReactiveFormsModule, Door, PasswordForm, ProblemNotice, FieldError],
  template: `
    <app-door title="Welcome to Ligament">
      <app-problem-notice [problem]="problem()" />
      <p>
        <label class="label" for="name"
          >Your full name, as it shall stand under your signature</label
        >
        <input id="name" class="plain" autocomplete="name" [formControl]="name" />
        <app-field-error [control]="name" />
      </p>
      <app-password-form action="Accept the invitation" (chosen)="accept($event)" />
    </app-door>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AcceptInvitation {
  readonly token = input.required<string>();
  private readonly api = inject(ApiClient);
  private readonly session = inject(Session);
  private readonly router = inject(Router);
  protected readonly name = new FormControl('', {
    nonNullable: true,
    validators: [fits(line(120))],
  });
  protected readonly problem = signal<Problem | null>(null);

  protected accept(password: string): void {
    this.name.markAsTouched();
    if (this.name.invalid) return;
    this.api
      .call(acceptInvitation, {
        params: { token: this.token() },
        body: { name: this.name.value, password },
      })
      .subscribe({
        next: (view) => {
          this.session.remember(view);
          void this.router.navigateByUrl('/today');
        },
        error: (error: unknown) => this.problem.set(problemOf(error)),
      });
  }
}
