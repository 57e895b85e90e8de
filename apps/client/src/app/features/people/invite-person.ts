import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { email } from '@ligament/domain/contract/session';
import { type Problem, problemOf } from '../../core/http/problem';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { PeopleClient } from './people-client';
import { PersonFields } from './person-fields';
import { personForm, valuesOf } from './person-form';

/** Gives somebody access; they choose their own password with a link sent by mail. */
@Component({
  selector: 'app-invite-person',
  imports: [
    ReactiveFormsModule,
    RouterLink,
    MatButtonModule,
    PageHeader,
    ProblemNotice,
    FieldError,
    PersonFields,
  ],
  template: `
    <app-page-header title="Invite a person" [crumbs]="crumbs" />
    <app-problem-notice [problem]="problem()" />
    <form class="sheet" (submit)="$event.preventDefault(); invite()">
      <p>
        <label class="label" for="person-email">E-mail address the invitation goes to</label>
        <input
          id="person-email"
          class="plain email"
          type="email"
          autocomplete="off"
          [formControl]="email"
        />
        <app-field-error [control]="email" />
      </p>
      <app-person-fields [form]="form" />
      <p class="caption">
        The person gets a mail with a link that works once, for 72 hours, and chooses a password.
        Nobody else ever knows it.
      </p>
      <div class="actions">
        <button mat-flat-button type="submit" [disabled]="busy()">Send the invitation</button>
        <a mat-button routerLink="/people">Cancel</a>
      </div>
    </form>
  `,
  styles: '.email { max-width: 460px; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InvitePerson {
  private readonly client = inject(PeopleClient);
  private readonly router = inject(Router);
  private readonly builder = inject(NonNullableFormBuilder);
  protected readonly crumbs = [{ label: 'People', link: '/people' }, { label: 'Invite' }];
  protected readonly form = personForm(this.builder);
  protected readonly email = this.builder.control('', fits(email));
  private readonly withEmail = this.builder.group({ email: this.email });
  protected readonly problem = signal<Problem | null>(null);
  protected readonly busy = signal(false);
  /** One key a form, so that a second click invites nobody twice. */
  private key: string = crypto.randomUUID();

  protected invite(): void {
    this.form.markAllAsTouched();
    this.email.markAsTouched();
    if (this.form.invalid || this.email.invalid) return;
    this.busy.set(true);
    const body = { email: this.email.value, ...valuesOf(this.form.getRawValue()) };
    this.client.invite(body, this.key).subscribe({
      next: ({ id }) => void this.router.navigate(['/people', id]),
      error: (error: unknown) => this.refused(problemOf(error)),
    });
  }

  private refused(problem: Problem): void {
    this.busy.set(false);
    this.key = crypto.randomUUID();
    this.problem.set(problem);
    showProblemOnForm(this.form, problem);
    showProblemOnForm(this.withEmail, problem);
  }
}
