import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { ReinspectionView } from '@ligament/domain/contract/reinspections';
import { switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Caution } from '../../shared/caution/caution';
import { Chip } from '../../shared/chips/chip';
import { Ask } from '../../shared/dialogs/ask';
import { type Figure, FigureStrip } from '../../shared/figure-strip/figure-strip';
import { DayPipe, MomentPipe } from '../../shared/format/day-pipe';
import { dayText } from '../../shared/format/day-text';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ScheduleClient } from './schedule-client';

/** One re-inspection: where its date comes from, which windows fit, its plan and its reminders. */
@Component({
  selector: 'app-reinspection-page',
  imports: [
    ReactiveFormsModule,
    RouterLink,
    MatButtonModule,
    PageHeader,
    Caution,
    Chip,
    FigureStrip,
    DayPipe,
    MomentPipe,
    ProblemNotice,
    FailedState,
    LoadingState,
  ],
  templateUrl: './reinspection-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReinspectionPage {
  readonly id = input.required<string>();

  private readonly client = inject(ScheduleClient);
  private readonly ask = inject(Ask);
  private readonly tries = signal(0);
  protected readonly session = inject(Session);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly form = inject(NonNullableFormBuilder).group({
    windowId: [''],
    plannedOn: [''],
    note: [''],
  });
  protected readonly page = toSignal(
    toObservable(computed(() => ({ id: this.id(), tries: this.tries() }))).pipe(
      switchMap(({ id }) => loadable(this.client.read(id))),
    ),
    { initialValue: LOADING },
  );

  protected figures(task: ReinspectionView): readonly Figure[] {
    const tone = task.urgency === 'overdue' ? 'bad' : task.urgency === 'due soon' ? 'warn' : 'good';
    return [
      { label: 'Due', value: dayText(task.dueOn), beside: task.urgency, tone },
      {
        label: task.daysLeft < 0 ? 'Overdue by' : 'Left',
        value: String(Math.abs(task.daysLeft)),
        unit: 'days',
        tone,
      },
      {
        label: 'Latest finish, so that report and assessment are done',
        value: dayText(task.latestFinishOn),
      },
      {
        label: 'Predicted limit',
        value: task.limitOn ? dayText(task.limitOn) : 'none in 40 years',
      },
      {
        label: 'Plan',
        value: task.plannedOn ? dayText(task.plannedOn) : 'none',
        beside: task.windowCode ?? (task.onStream ? 'on-stream' : ''),
      },
    ];
  }

  protected isPlannable(task: ReinspectionView): boolean {
    return (
      this.session.can('reinspections.plan') && (task.state === 'open' || task.state === 'planned')
    );
  }

  /** Choosing a window proposes its first day. */
  protected propose(task: ReinspectionView): void {
    const window = task.windows.find(({ id }) => id === this.form.controls.windowId.value);
    if (window) this.form.controls.plannedOn.setValue(window.startsOn);
  }

  protected plan(task: ReinspectionView): void {
    const { windowId, plannedOn, note } = this.form.getRawValue();
    if (!plannedOn) {
      this.problem.set({
        status: 0,
        title: 'Something is missing',
        detail: 'Choose a window or enter a day.',
        code: '',
        errors: [],
      });
      return;
    }
    this.client
      .plan(task.id, task.version, { windowId: windowId || null, plannedOn, note })
      .subscribe({
        next: () => this.again(),
        error: (error: unknown) => this.problem.set(problemOf(error)),
      });
  }

  protected unplan(task: ReinspectionView): void {
    this.ask
      .reason({
        title: 'Take out of the plan',
        text: 'The re-inspection is open again and has to be planned anew.',
        label: 'Reason',
        action: 'Take out',
      })
      .subscribe(({ reason }) =>
        this.client.unplan(task.id, task.version, reason).subscribe({
          next: () => this.again(),
          error: (error: unknown) => this.problem.set(problemOf(error)),
        }),
      );
  }

  protected acknowledge(id: string): void {
    this.client.acknowledge(id).subscribe({
      next: () => this.again(),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected again(): void {
    this.problem.set(null);
    this.tries.update((each) => each + 1);
  }
}
