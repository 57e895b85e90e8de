import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import type { Person } from '@ligament/domain/contract/people';
import { type Observable, switchMap } from 'rxjs';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Ask } from '../../shared/dialogs/ask';
import { DayPipe, MomentPipe } from '../../shared/format/day-pipe';
import { PeopleClient } from './people-client';

/** A person's access: where it stands, and what an administrator can do about it. */
@Component({
  selector: 'app-person-access',
  imports: [MatButtonModule, DayPipe, MomentPipe],
  templateUrl: './person-access.html',
  styles: `
    :host {
      display: block;
      margin-top: 16px;
    }
    .choices {
      margin-top: 12px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PersonAccess {
  readonly person = input.required<Person>();
  readonly mayWrite = input(false);
  readonly asked = output<{ readonly request: Observable<Person>; readonly said: string }>();
  readonly sessionsEnded = output<number>();
  readonly refused = output<Problem>();

  private readonly client = inject(PeopleClient);
  private readonly ask = inject(Ask);
  private readonly session = inject(Session);
  protected readonly timeZone = computed(() => this.session.site()?.timeZone ?? 'UTC');
  /** Nobody ends their own access. */
  protected readonly isOneself = computed(() => this.session.user()?.id === this.person().id);

  protected resend(): void {
    this.asked.emit({
      request: this.client.resend(this.person()),
      said: `The invitation is on its way to ${this.person().email} again; the earlier link no longer works.`,
    });
  }

  protected endSessions(): void {
    const person = this.person();
    this.ask
      .confirm({
        title: `End the sessions of ${person.name}?`,
        text: 'Every browser they are signed in with is signed out at once. They can sign in again.',
        action: 'End the sessions',
      })
      .pipe(switchMap(() => this.client.endSessions(person)))
      .subscribe({
        next: ({ ended }) => this.sessionsEnded.emit(ended),
        error: (error: unknown) => this.refused.emit(problemOf(error)),
      });
  }

  protected disable(): void {
    const { id, version, name } = this.person();
    this.ask
      .confirm({
        title: `End the access of ${name}?`,
        text: 'They are signed out at once and cannot sign in again. What they did stays in the history under their name.',
        action: 'End the access',
      })
      .subscribe(() =>
        this.asked.emit({
          request: this.client.change(id, version, { active: false }),
          said: `${name} has no access any more.`,
        }),
      );
  }

  protected enable(): void {
    const { id, version, name } = this.person();
    this.asked.emit({
      request: this.client.change(id, version, { active: true }),
      said: `${name} has access again.`,
    });
  }
}
