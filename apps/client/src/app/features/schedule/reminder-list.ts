import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import { REMINDER_STATES } from '@ligament/domain/contract/vocabulary';
import { combineLatest, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { DayPipe, MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { ScheduleClient } from './schedule-client';

/** Reminders that were sent, wait, or could not be delivered, and when they were last looked for. */
@Component({
  selector: 'app-reminder-list',
  imports: [
    RouterLink,
    MatButtonModule,
    Chip,
    DayPipe,
    MomentPipe,
    PageHeader,
    ProblemNotice,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
  ],
  templateUrl: './reminder-list.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReminderList {
  readonly state = input<string>();
  readonly cursor = input<string>();
  private readonly client = inject(ScheduleClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  private readonly tries = signal(0);
  protected readonly session = inject(Session);
  protected readonly states = REMINDER_STATES;
  protected readonly problem = signal<Problem | null>(null);
  protected readonly ran = signal('');
  protected readonly page = toSignal(
    toObservable(
      computed(() => ({
        state: REMINDER_STATES.find((each) => each === this.state()),
        cursor: this.cursor(),
        tries: this.tries(),
      })),
    ).pipe(
      switchMap(({ state, cursor }) =>
        loadable(
          combineLatest({
            list: this.client.reminders({ state, cursor }),
            heartbeat: this.client.heartbeat(),
          }),
        ),
      ),
    ),
    { initialValue: LOADING },
  );

  protected set(change: Readonly<Record<string, string | null>>): void {
    this.listQuery.set(this.route, change);
  }

  protected run(): void {
    this.client.runReminders().subscribe({
      next: ({ queued, sent, failed }) => {
        this.ran.set(`${queued} new reminders, ${sent} mails sent, ${failed} not delivered.`);
        this.again();
      },
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected again(): void {
    this.problem.set(null);
    this.tries.update((each) => each + 1);
  }
}
