import {
  ApplicationRef,
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import { canonicalJson } from '@ligament/domain/records/canonical-json';
import { catchError, distinctUntilChanged, map, of, switchMap } from 'rxjs';
import { Session } from '../../core/session/session';
import { AssessedDrawings } from '../../shared/assessed/assessed-drawings';
import { figuresOf } from '../../shared/assessed/figures-of';
import { weakInputs } from '../../shared/assessed/input-names';
import type { LifeSurroundings } from '../../shared/assessed/life-of';
import { RefusalNotice } from '../../shared/assessed/refusal-notice';
import { verdictSentence } from '../../shared/assessed/verdict-words';
import { Caution } from '../../shared/caution/caution';
import { Chip } from '../../shared/chips/chip';
import { FigureStrip } from '../../shared/figure-strip/figure-strip';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { ChangedMeanwhile } from '../../shared/problem/changed-meanwhile';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { FieldError } from '../../shared/validation/field-error';
import { AssessmentDesk } from './assessment-desk';
import { AssessmentsClient } from './assessments-client';
import { DeskActions } from './desk-actions';
import { DifferencePanel } from './difference-panel';
import { DueDatePanel } from './due-date-panel';
import { InputsPanel } from './inputs-panel';
import { Insights } from './insights/insights';
import type { HasUnsaved } from './keep-unsaved';
import { ResultsPanel } from './results-panel';
import { ReviewPanel } from './review-panel';
import { SignaturesPanel } from './signatures-panel';

/** The engineer's workbench for one assessment, and the checker's reading of it. */
@Component({
  selector: 'app-assessment-page',
  imports: [
    ReactiveFormsModule,
    RouterLink,
    MatButtonModule,
    PageHeader,
    Chip,
    Caution,
    DayPipe,
    FailedState,
    LoadingState,
    ProblemNotice,
    ChangedMeanwhile,
    FieldError,
    RefusalNotice,
    FigureStrip,
    AssessedDrawings,
    InputsPanel,
    Insights,
    ResultsPanel,
    DueDatePanel,
    DifferencePanel,
    ReviewPanel,
    SignaturesPanel,
  ],
  providers: [AssessmentDesk, DeskActions],
  templateUrl: './assessment-page.html',
  styleUrl: './assessment-page.scss',
  host: {
    '(window:beforeunload)': 'warnBeforeClosing($event)',
    // on paper inputs stand as text, and none is folded away
    '(window:beforeprint)': 'layOutForPrint(true)',
    '(window:afterprint)': 'layOutForPrint(false)',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AssessmentPage implements HasUnsaved {
  readonly id = input.required<string>();

  protected readonly desk = inject(AssessmentDesk);
  protected readonly actions = inject(DeskActions);
  private readonly client = inject(AssessmentsClient);
  private readonly session = inject(Session);
  private readonly application = inject(ApplicationRef);

  private readonly flaw = toSignal(
    toObservable(computed(() => this.desk.recorded()?.flawId)).pipe(
      distinctUntilChanged(),
      switchMap((id) => (id ? this.client.flaw(id).pipe(catchError(() => of(null))) : of(null))),
    ),
    { initialValue: null },
  );
  private readonly windows = toSignal(
    this.client.windows().pipe(
      catchError(() => of([])),
      map((rows) => rows.filter(({ state }) => state !== 'cancelled')),
    ),
    { initialValue: [] },
  );
  protected readonly around = computed((): LifeSurroundings => {
    const [flaw, view] = [this.flaw(), this.desk.recorded()];
    const findings = flaw?.findings ?? (view ? [view.finding] : []);
    const proposal = this.desk.proposal();
    const rule =
      proposal?.status === 'proposed' ? proposal.candidates.find(({ governs }) => governs) : null;
    const asProposed = proposal?.status === 'proposed' && proposal.dueOn === this.desk.dueOn();
    return {
      measured: findings.map((finding) => ({
        on: finding.inspectedOn,
        heightMm: finding.heightMm,
        errorMm: finding.heightErrorMm,
        label: `report ${finding.reportNo}, ${finding.technique}`,
      })),
      windows: this.windows()
        .filter(({ unitIds }) => flaw !== null && unitIds.includes(flaw.unitId))
        .map(({ code, startsOn, endsOn }) => ({ startsOn, endsOn, label: code })),
      basis: asProposed ? (rule?.rule ?? '') : 'chosen by the engineer',
      today: new Intl.DateTimeFormat('en-CA', {
        timeZone: this.session.site()?.timeZone ?? 'UTC',
      }).format(new Date()),
    };
  });
  protected readonly verdict = computed(() => {
    const each = this.desk.assessed();
    return each ? verdictSentence(each.outcome.verdict, each.dueOn) : '';
  });
  protected readonly figures = computed(() => {
    const each = this.desk.assessed();
    return each ? figuresOf(each) : [];
  });
  protected readonly weak = computed(() => {
    const each = this.desk.assessed();
    return each ? weakInputs(each.input, each.outcome.assumed) : { assumed: [], defaults: [] };
  });
  protected readonly refused = computed(() => {
    const outcome = this.desk.outcome();
    return outcome?.status === 'refused' ? outcome : null;
  });
  /** Where inputs and results do not stand side by side, the result comes first and the inputs fold away. */
  protected readonly inputsOpen = signal(
    typeof matchMedia === 'undefined' || matchMedia('(min-width: 1180px)').matches,
  );

  protected readonly printing = signal(false);

  constructor() {
    effect(() => this.desk.id.set(this.id()));
  }

  hasUnsaved(): boolean {
    return this.desk.hasUnsaved();
  }

  protected crumbs(view: AssessmentView) {
    return [
      { label: 'Flaws', link: '/flaws' },
      { label: view.tag, link: `/register/${view.componentId}` },
      { label: view.flawNumber, link: `/flaws/${view.flawId}` },
      { label: `Revision ${view.revision}` },
    ];
  }

  protected told({ input, conclusion, chosenDueOn, chosenReason }: AssessmentView) {
    return { ...ordered(input), conclusion, chosenDueOn, chosenReason };
  }

  protected mine() {
    const { conclusion, chosenDueOn, chosenReason } = this.desk.body();
    return { ...ordered(this.desk.input()), conclusion, chosenDueOn, chosenReason };
  }

  protected layOutForPrint(printing: boolean): void {
    this.printing.set(printing);
    if (printing) this.inputsOpen.set(true);
    // the browser takes its picture as soon as this returns
    this.application.tick();
  }

  protected print(): void {
    window.print();
  }

  protected warnBeforeClosing(event: BeforeUnloadEvent): void {
    if (this.hasUnsaved()) event.preventDefault();
  }
}

/** The same members in one order, so that only values differ. */
const ordered = (input: unknown) =>
  JSON.parse(canonicalJson(input)) as Readonly<Record<string, unknown>>;
