import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { line } from '@ligament/domain/contract/primitives';
import {
  changePassword,
  endSession,
  listSessions,
  password,
} from '@ligament/domain/contract/session';
import { BehaviorSubject, switchMap } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';

/** One's own password and sessions. */
@Component({
  selector: 'app-account',
  imports: [
    ReactiveFormsModule,
    MatButtonModule,
    PageHeader,
    ProblemNotice,
    FieldError,
    LoadingState,
    FailedState,
    MomentPipe,
  ],
  templateUrl: './account.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Account {
  private readonly api = inject(ApiClient);
  private readonly reload = new BehaviorSubject<void>(undefined);
  protected readonly session = inject(Session);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly saved = signal(false);
  protected readonly form = inject(NonNullableFormBuilder).group({
    current: ['', fits(line(1024))],
    next: ['', fits(password)],
  });
  protected readonly sessions = toSignal(
    this.reload.pipe(switchMap(() => loadable(this.api.call(listSessions)))),
    { initialValue: LOADING },
  );

  protected change(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    this.api.call(changePassword, { body: this.form.getRawValue() }).subscribe({
      next: () => {
        this.problem.set(null);
        this.saved.set(true);
        this.form.reset();
        this.again();
      },
      error: (error: unknown) => {
        const problem = problemOf(error);
        this.saved.set(false);
        this.problem.set(problem);
        showProblemOnForm(this.form, problem);
      },
    });
  }

  protected end(id: string): void {
    this.api.call(endSession, { params: { id } }).subscribe({
      next: () => this.again(),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected again(): void {
    this.reload.next();
  }
}
