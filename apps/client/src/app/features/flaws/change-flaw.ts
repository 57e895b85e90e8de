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
import type { FlawView } from '@ligament/domain/contract/flaws';
import { prose, reason } from '@ligament/domain/contract/primitives';
import { MECHANISMS, ORIGINS } from '@ligament/domain/contract/vocabulary';
import { switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { PageHeader } from '../../shared/page-header/page-header';
import { ChangedMeanwhile } from '../../shared/problem/changed-meanwhile';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { FlawsClient } from './flaws-client';

/** States a person sets by hand; the others follow from assessments. */
const SETTABLE = ['', 'referred', 'under assessment', 'removed', 'closed'] as const;
const STATE_WORDS: Readonly<Record<(typeof SETTABLE)[number], string>> = {
  '': 'as it is',
  referred: 'referred to a specialist',
  'under assessment': 'under assessment again',
  removed: 'removed (repaired, ground out or replaced)',
  closed: 'closed (shown not to be a flaw)',
};

/** Changes what is known of a flaw, with a reason that stands in its history. */
@Component({
  selector: 'app-change-flaw',
  imports: [
    ReactiveFormsModule,
    RouterLink,
    MatButtonModule,
    PageHeader,
    FieldError,
    ProblemNotice,
    ChangedMeanwhile,
    FailedState,
    LoadingState,
  ],
  templateUrl: './change-flaw.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChangeFlaw {
  readonly id = input.required<string>();

  private readonly client = inject(FlawsClient);
  private readonly router = inject(Router);
  private readonly tries = signal(0);
  protected readonly mechanisms = MECHANISMS;
  protected readonly origins = ORIGINS;
  protected readonly states = SETTABLE.map((value) => ({ value, words: STATE_WORDS[value] }));
  protected readonly form = inject(NonNullableFormBuilder).group({
    mechanism: ['unknown' as FlawView['mechanism']],
    origin: ['unknown' as FlawView['origin']],
    state: ['' as (typeof SETTABLE)[number]],
    note: ['', fits(prose(2000))],
    reason: ['', fits(reason)],
  });
  protected readonly flaw = toSignal(
    toObservable(computed(() => ({ id: this.id(), tries: this.tries() }))).pipe(
      switchMap(({ id }) => loadable(this.client.read(id))),
    ),
    { initialValue: LOADING },
  );
  protected readonly problem = signal<Problem | null>(null);
  protected readonly theirs = signal<FlawView | null>(null);
  protected readonly busy = signal(false);

  constructor() {
    effect(() => {
      const loaded = this.flaw();
      if (loaded.state === 'ready') this.fill(loaded.value);
    });
  }

  protected save({ id, version }: FlawView): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    this.busy.set(true);
    const { state, ...change } = this.form.getRawValue();
    this.client.change(id, version, { ...change, ...(state ? { state } : {}) }).subscribe({
      next: () => void this.router.navigate(['/flaws', id]),
      error: (error: unknown) => this.refused(problemOf(error)),
    });
  }

  protected takeTheirs(theirs: FlawView): void {
    this.theirs.set(null);
    this.fill(theirs);
    this.again();
  }

  protected known({ mechanism, origin, note, state }: FlawView) {
    return { mechanism, origin, note, state };
  }

  protected mine(theirs: FlawView) {
    const { mechanism, origin, note, state } = this.form.getRawValue();
    return { mechanism, origin, note, state: state || theirs.state };
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }

  private fill({ mechanism, origin, note }: FlawView): void {
    this.form.reset({ mechanism, origin, note, state: '', reason: '' });
  }

  private refused(problem: Problem): void {
    this.busy.set(false);
    const current = problem.status === 412 ? (problem.current as FlawView) : null;
    this.theirs.set(current);
    this.problem.set(current ? null : problem);
    showProblemOnForm(this.form, problem);
  }
}
