import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { ActivatedRoute, Router } from '@angular/router';
import { line } from '@ligament/domain/contract/primitives';
import { email, setUp } from '@ligament/domain/contract/session';
import { ApiClient } from '../../core/http/api-client';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { Door } from './door';
import { PasswordForm } from './password-form';

/** Creates the site and its first administrator with the one-time link printed at the first start. */
@Component({
  selector: 'app-set-up',
  imports: [ReactiveFormsModule, Door, PasswordForm, ProblemNotice, FieldError],
  templateUrl: './set-up.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetUp {
  private readonly api = inject(ApiClient);
  private readonly session = inject(Session);
  private readonly router = inject(Router);
  private readonly token = inject(ActivatedRoute).snapshot.fragment ?? '';
  protected readonly hasToken = this.token.length > 0;
  protected readonly problem = signal<Problem | null>(null);
  protected readonly timeZones = Intl.supportedValuesOf('timeZone');
  protected readonly form = inject(NonNullableFormBuilder).group({
    siteName: ['', fits(line(120))],
    siteCode: ['', fits(line(20))],
    timeZone: [Intl.DateTimeFormat().resolvedOptions().timeZone, fits(line(60))],
    name: ['', fits(line(120))],
    email: ['', fits(email)],
  });

  protected create(password: string): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    this.api
      .call(setUp, { body: { token: this.token, ...this.form.getRawValue(), password } })
      .subscribe({
        next: (view) => {
          this.session.remember(view);
          void this.router.navigateByUrl('/today');
        },
        error: (error: unknown) => {
          const problem = problemOf(error);
          this.problem.set(problem);
          showProblemOnForm(this.form, problem);
        },
      });
  }
}
