import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { isoDate, line, optionalLine } from '@ligament/domain/contract/primitives';
import type { WindowBody } from '@ligament/domain/contract/shutdown-windows';
import { WINDOW_KINDS, WINDOW_STATES } from '@ligament/domain/contract/vocabulary';
import { of, switchMap } from 'rxjs';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Ask } from '../../shared/dialogs/ask';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { ScheduleClient } from './schedule-client';

/** A shutdown window: new, or changed with a reason; what no longer fits in it is told. */
@Component({
  selector: 'app-window-form',
  imports: [
    ReactiveFormsModule,
    RouterLink,
    MatButtonModule,
    PageHeader,
    ProblemNotice,
    FieldError,
  ],
  templateUrl: './window-form.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WindowForm {
  readonly id = input<string>();

  private readonly client = inject(ScheduleClient);
  private readonly router = inject(Router);
  private readonly ask = inject(Ask);
  protected readonly mayWrite = inject(Session).can('windows.write');
  protected readonly kinds = WINDOW_KINDS;
  protected readonly states = WINDOW_STATES;
  protected readonly problem = signal<Problem | null>(null);
  protected readonly released = signal<
    readonly { readonly id: string; readonly tag: string; readonly task: string }[]
  >([]);
  protected readonly units = toSignal(this.client.units(), { initialValue: [] });
  protected readonly form = inject(NonNullableFormBuilder).group({
    code: ['', fits(line(20))],
    name: ['', fits(optionalLine(120))],
    kind: ['turnaround' as WindowBody['kind']],
    startsOn: ['', fits(isoDate)],
    endsOn: ['', fits(isoDate)],
    scopeFreezeOn: [null as string | null],
    state: ['planned' as WindowBody['state']],
    unitIds: [[] as string[]],
  });
  private readonly existing = toSignal(
    toObservable(this.id).pipe(switchMap((id) => (id ? this.client.window(id) : of(null)))),
    { initialValue: null },
  );
  private readonly version = signal(0);
  protected readonly title = computed(() =>
    this.id() ? `Window ${this.existing()?.code ?? ''}` : 'New window',
  );

  constructor() {
    effect(() => {
      const window = this.existing();
      if (!window) return;
      this.form.patchValue(window);
      this.version.set(window.version);
      if (!this.mayWrite) this.form.disable();
    });
  }

  protected toggle(unitId: string): void {
    const { unitIds } = this.form.controls;
    const chosen = unitIds.value;
    unitIds.setValue(
      chosen.includes(unitId) ? chosen.filter((each) => each !== unitId) : [...chosen, unitId],
    );
  }

  protected save(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    const value = this.form.getRawValue();
    const body = { ...value, scopeFreezeOn: value.scopeFreezeOn || null };
    const id = this.id();
    if (!id) {
      this.client.addWindow(body).subscribe({
        next: () => void this.router.navigate(['/schedule/windows']),
        error: (error: unknown) => this.fail(error),
      });
      return;
    }
    const text =
      'Re-inspections that no longer fit in the window are open again, and their planner has to act.';
    this.ask
      .reason({ title: 'Change the window', text, label: 'Reason', action: 'Change' })
      .subscribe(({ reason }) =>
        this.client.changeWindow(id, this.version(), { ...body, reason }).subscribe({
          next: ({ window, released }) => {
            this.problem.set(null);
            this.version.set(window.version);
            this.released.set(released);
            if (released.length === 0) void this.router.navigate(['/schedule/windows']);
          },
          error: (error: unknown) => this.fail(error),
        }),
      );
  }

  private fail(error: unknown): void {
    const problem = problemOf(error);
    this.problem.set(problem);
    showProblemOnForm(this.form, problem);
  }
}
