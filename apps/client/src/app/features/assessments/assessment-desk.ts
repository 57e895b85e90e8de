import { computed, effect, inject, Injectable, linkedSignal, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder } from '@angular/forms';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import {
  catchError,
  debounceTime,
  distinctUntilChanged,
  map,
  of,
  startWith,
  switchMap,
} from 'rxjs';
import { type Loadable, loadable, LOADING, valueOf } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import type { AssessedCase } from '../../shared/assessed/assessed-case';
import { AssessmentsClient } from './assessments-client';
import { conclusionForm, conclusionOf } from './conclusion-form';
import { assessLive } from './live-assessment';
import { whatIsMissing } from './what-is-missing';

/** Long enough to finish a number, short enough to feel live [ms]. */
const PAUSE = 160;

/** One assessment on the engineer's desk: as it is recorded, as it is being changed, and what that computes to. */
@Injectable()
export class AssessmentDesk {
  private readonly client = inject(AssessmentsClient);
  private readonly session = inject(Session);
  readonly id = signal('');
  private readonly tries = signal(0);
  private readonly asked = computed(() => ({ id: this.id(), tries: this.tries() }));

  private readonly loaded = toSignal(
    toObservable(this.asked).pipe(
      switchMap(({ id }) => (id ? loadable(this.client.read(id)) : of(LOADING))),
    ),
    { initialValue: LOADING as Loadable<AssessmentView> },
  );
  /** What the server said last. */
  readonly view = linkedSignal<Loadable<AssessmentView>>(this.loaded);
  readonly recorded = computed(() => valueOf(this.view()));
  readonly editable = computed(() => {
    const state = this.recorded()?.state;
    return (state === 'draft' || state === 'returned') && this.session.can('assessments.write');
  });
  readonly ownWork = computed(() => {
    const [view, user] = [this.recorded(), this.session.user()];
    return !!view && !!user && (view.authorId === user.id || view.editorIds.includes(user.id));
  });
  readonly reviewable = computed(
    () =>
      this.recorded()?.state === 'submitted' &&
      this.session.can('assessments.review') &&
      !this.ownWork(),
  );

  readonly input = linkedSignal<AssessmentInput | null>(() => this.recorded()?.input ?? null);
  readonly form = conclusionForm(inject(NonNullableFormBuilder));
  readonly inputChanged = signal(false);
  private readonly written = toSignal(
    this.form.valueChanges.pipe(
      startWith(null),
      map(() => this.form.getRawValue()),
    ),
    { initialValue: this.form.getRawValue() },
  );

  readonly rules = toSignal(this.client.rules().pipe(catchError(() => of(null))), {
    initialValue: null,
  });
  readonly laws = toSignal(this.client.growthLaws().pipe(catchError(() => of([]))), {
    initialValue: [],
  });
  private readonly basis = computed(() => {
    const view = this.recorded();
    return view && this.editable() ? { flawId: view.flawId, findingId: view.finding.id } : null;
  });
  /** What the register says now; known only while somebody edits. */
  readonly register = toSignal(
    toObservable(this.basis).pipe(
      distinctUntilChanged((a, b) => a?.findingId === b?.findingId),
      switchMap((basis) =>
        basis
          ? this.client
              .register(basis.flawId, basis.findingId)
              .pipe(catchError(() => of<AssessmentInput | null>(null)))
          : of(null),
      ),
    ),
    { initialValue: null },
  );

  private readonly subject = computed(() => {
    const [view, input] = [this.recorded(), this.input()];
    if (!view || !input || !this.editable()) return null;
    return {
      input,
      inspectedOn: view.inspectedOn,
      mechanism: view.mechanism,
      rules: this.rules(),
    };
  });
  /** The same engine as the server's, on every change. */
  readonly live = toSignal(
    toObservable(this.subject).pipe(
      debounceTime(PAUSE),
      map((subject) => (subject ? assessLive(subject) : null)),
    ),
    { initialValue: null },
  );
  readonly outcome = computed(() => {
    const live = this.editable() ? this.live() : null;
    return live ? live.outcome : (this.recorded()?.outcome ?? null);
  });
  readonly proposal = computed(() => {
    const live = this.editable() ? this.live() : null;
    return live && this.rules() ? live.proposal : (this.recorded()?.proposal ?? null);
  });
  readonly messages = computed(
    (): ReadonlyMap<string, string> => this.live()?.messages ?? new Map(),
  );
  readonly dueOn = computed(() => {
    const proposal = this.proposal();
    if (proposal?.status !== 'proposed') return null;
    if (!this.editable()) return this.recorded()?.chosenDueOn ?? proposal.dueOn;
    return this.written().chosenDueOn || proposal.dueOn;
  });
  readonly assessed = computed((): AssessedCase | null => {
    const [view, outcome] = [this.recorded(), this.outcome()];
    const input = (this.editable() ? this.live()?.input : null) ?? view?.input;
    if (!view || !input || outcome?.status !== 'assessed') return null;
    const { heightErrorMm: heightMm, lengthErrorMm: lengthMm } = view.finding;
    return {
      input,
      outcome,
      inspectedOn: view.inspectedOn,
      dueOn: this.dueOn(),
      sizingError: { heightMm, lengthMm },
    };
  });
  /** What still has to be done before it can be sent for check. */
  readonly missing = computed(() =>
    whatIsMissing({
      outcome: this.outcome(),
      input: this.input(),
      register: this.register(),
      proposal: this.proposal(),
      ...this.written(),
    }),
  );

  constructor() {
    effect(() => {
      const view = this.recorded();
      if (view) this.lay(view);
    });
  }

  change(input: AssessmentInput): void {
    this.input.set(input);
    this.inputChanged.set(true);
  }

  hasUnsaved(): boolean {
    return this.editable() && (this.inputChanged() || this.form.dirty);
  }

  /** What a save sends. */
  body() {
    const { conclusion, chosenReason } = this.form.getRawValue();
    const input = this.input();
    return {
      conclusion,
      chosenReason,
      chosenDueOn: this.dueOn(),
      ...(input && this.inputChanged() ? { input: input as AssessmentView['input'] } : {}),
    };
  }

  show(view: AssessmentView): void {
    this.view.set({ state: 'ready', value: view });
  }

  again(): void {
    this.tries.update((each) => each + 1);
  }

  private lay(view: AssessmentView): void {
    this.form.reset(conclusionOf(view));
    this.inputChanged.set(false);
  }
}
