import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { RouterLink } from '@angular/router';
import { resetPassword } from '@ligament/domain/contract/session';
import { ApiClient } from '../../core/http/api-client';
import { type Problem, problemOf } from '../../core/http/problem';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { Door } from './door';
import { PasswordForm } from './password-form';

/** Sets a new password with the link of the e-mail. */
@Component({
  selector: 'app-set-password',
  imports: [Door, PasswordForm, ProblemNotice, RouterLink],
  template: `
    <app-door title="New password">
      @if (done()) {
        <p role="status">
          The password is set and every session was ended. <a routerLink="/sign-in">Sign in</a>
        </p>
      } @else {
        <app-problem-notice [problem]="problem()" />
        <app-password-form (chosen)="set($event)" />
      }
    </app-door>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetPassword {
  readonly token = input.required<string>();
  private readonly api = inject(ApiClient);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly done = signal(false);

  protected set(password: string): void {
    this.api
      .call(resetPassword, { params: { token: this.token() }, body: { password } })
      .subscribe({
        next: () => this.done.set(true),
        error: (error: unknown) => this.problem.set(problemOf(error)),
      });
  }
}
