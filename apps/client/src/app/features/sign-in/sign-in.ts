import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { Door } from './door';

/** Sign-in with e-mail and password; afterwards the person is where they were going. */
@Component({
  selector: 'app-sign-in',
  imports: [ReactiveFormsModule, MatButtonModule, RouterLink, Door, ProblemNotice],
  template: `
    <app-door title="Sign in">
      <app-problem-notice [problem]="problem()" />
      <form [formGroup]="form" (ngSubmit)="signIn()">
        <p>
          <label class="label" for="email">E-mail</label>
          <input
            id="email"
            class="plain"
            type="email"
            autocomplete="username"
            formControlName="email"
          />
        </p>
        <p>
          <label class="label" for="password">Password</label>
          <input
            id="password"
            class="plain"
            [type]="shown() ? 'text' : 'password'"
            autocomplete="current-password"
            formControlName="password"
          />
        </p>
        <p>
          <label
            ><input type="checkbox" [checked]="shown()" (change)="shown.set(!shown())" /> Show the
            password</label
          >
        </p>
        <div class="actions">
          <button mat-flat-button type="submit" [disabled]="busy()">Sign in</button>
          <a routerLink="/reset-password">Forgotten password</a>
        </div>
      </form>
    </app-door>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignIn {
  /** Address to go to afterwards. */
  readonly next = input<string>();
  private readonly session = inject(Session);
  private readonly router = inject(Router);
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', Validators.required],
    password: ['', Validators.required],
  });
  protected readonly problem = signal<Problem | null>(null);
  protected readonly shown = signal(false);
  protected readonly busy = signal(false);

  protected signIn(): void {
    if (this.form.invalid) {
      this.problem.set({
        status: 0,
        title: 'Something is missing',
        detail: 'Give your e-mail address and your password.',
        code: '',
        errors: [],
      });
      return;
    }
    const { email, password } = this.form.getRawValue();
    this.busy.set(true);
    this.session.signIn(email, password).subscribe({
      next: () => void this.router.navigateByUrl(ownAddress(this.next())),
      error: (error: unknown) => {
        this.busy.set(false);
        this.problem.set(problemOf(error));
      },
    });
  }
}

/** Only an address of this product is followed, never one of another site. */
const ownAddress = (next: string | undefined): string =>
  next?.startsWith('/') && !next.startsWith('//') && !next.startsWith('/sign-in') ? next : '/today';
