import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  linkedSignal,
  signal,
} from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { Person } from '@ligament/domain/contract/people';
import type { Observable } from 'rxjs';
import { switchMap } from 'rxjs';
import { type Loadable, loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { PageHeader } from '../../shared/page-header/page-header';
import { ChangedMeanwhile } from '../../shared/problem/changed-meanwhile';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { AccessChip } from './access-chip';
import { PeopleClient } from './people-client';
import { PersonAccess } from './person-access';
import { PersonFields } from './person-fields';
import { personForm, shownOf, valuesOf } from './person-form';

/** One person: what is recorded of them, and their access. */
@Component({
  selector: 'app-person-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    ProblemNotice,
    ChangedMeanwhile,
    FailedState,
    LoadingState,
    AccessChip,
    PersonAccess,
    PersonFields,
  ],
  templateUrl: './person-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PersonPage {
  readonly id = input.required<string>();
  private readonly client = inject(PeopleClient);
  protected readonly session = inject(Session);
  private readonly tries = signal(0);
  private readonly loaded = toSignal(
    toObservable(computed(() => ({ id: this.id(), tries: this.tries() }))).pipe(
      switchMap(({ id }) => loadable(this.client.read(id))),
    ),
    { initialValue: LOADING },
  );
  /** What the server said last: on opening, or in answer to a change. */
  protected readonly person = linkedSignal<Loadable<Person>>(this.loaded);
  protected readonly form = personForm(inject(NonNullableFormBuilder));
  protected readonly problem = signal<Problem | null>(null);
  protected readonly theirs = signal<Person | null>(null);
  protected readonly saved = signal('');
  protected readonly busy = signal(false);
  protected readonly mayWrite = computed(() => this.session.can('people.write'));

  constructor() {
    effect(() => {
      const loaded = this.loaded();
      if (loaded.state === 'ready') this.form.reset(shownOf(loaded.value));
      if (this.mayWrite()) this.form.enable();
      else this.form.disable();
    });
  }

  protected save(person: Person): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    const change = valuesOf(this.form.getRawValue());
    this.run(this.client.change(person.id, person.version, change), 'The record is saved.');
  }

  /** Does what was asked and shows the person as the server answers; a refusal leaves the form as it is. */
  protected run(request: Observable<Person>, said: string): void {
    this.busy.set(true);
    request.subscribe({
      next: (person) => {
        this.settle(null, null, said);
        this.person.set({ state: 'ready', value: person });
        this.form.reset(shownOf(person));
      },
      error: (error: unknown) => {
        const problem = problemOf(error);
        const current = problem.status === 412 ? (problem.current as Person) : null;
        this.settle(current ? null : problem, current, '');
        showProblemOnForm(this.form, problem);
      },
    });
  }

  protected sessionsEnded(ended: number): void {
    this.settle(
      null,
      null,
      ended === 1 ? 'One session was ended.' : `${ended} sessions were ended.`,
    );
    this.again();
  }

  protected takeTheirs(theirs: Person): void {
    this.settle(null, null, '');
    this.person.set({ state: 'ready', value: theirs });
    this.form.reset(shownOf(theirs));
  }

  protected shown(person: Person) {
    return valuesOf(shownOf(person));
  }

  protected mine() {
    return valuesOf(this.form.getRawValue());
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }

  protected settle(problem: Problem | null, theirs: Person | null, said: string): void {
    this.busy.set(false);
    this.problem.set(problem);
    this.theirs.set(theirs);
    this.saved.set(said);
  }
}
