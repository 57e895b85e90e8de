import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { FlawView } from '@ligament/domain/contract/flaws';
import { catchError, of, switchMap } from 'rxjs';
import { type Loadable, loadable, LOADING, valueOf } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { DayPipe, DaysPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { AssessmentsTable } from './assessments-table';
import { FindingsTable } from './findings-table';
import { FlawStanding } from './flaw-standing';
import { FlawsClient } from './flaws-client';
import { type ShownAssessment, shownAssessment } from './shown-assessment';
import { StartAssessment } from './start-assessment';

/** One flaw: acceptable or not, until when and why; then its drawings, findings, assessments and record. */
@Component({
  selector: 'app-flaw-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    Chip,
    FailedState,
    LoadingState,
    DayPipe,
    DaysPipe,
    FlawStanding,
    FindingsTable,
    AssessmentsTable,
    StartAssessment,
  ],
  templateUrl: './flaw-page.html',
  styles: `
    .heading {
      margin: 0;
      padding: 12px 16px 6px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FlawPage {
  readonly id = input.required<string>();

  private readonly client = inject(FlawsClient);
  protected readonly session = inject(Session);
  private readonly tries = signal(0);
  protected readonly flaw = toSignal(
    toObservable(computed(() => ({ id: this.id(), tries: this.tries() }))).pipe(
      switchMap(({ id }) => loadable(this.client.read(id))),
    ),
    { initialValue: LOADING },
  );
  private readonly read = computed(() => valueOf(this.flaw()));
  protected readonly shown = toSignal(
    toObservable(this.read).pipe(
      switchMap((flaw) => (flaw ? loadable(this.find(flaw)) : of(LOADING))),
    ),
    { initialValue: LOADING as Loadable<ShownAssessment | null> },
  );
  /** Not every role may see them, and the page stands without them. */
  private readonly windows = toSignal(this.client.windows().pipe(catchError(() => of([]))), {
    initialValue: [],
  });
  protected readonly windowsOfUnit = computed(() => {
    const unitId = this.read()?.unitId;
    return this.windows()
      .filter(({ state, unitIds }) => state !== 'cancelled' && unitId && unitIds.includes(unitId))
      .map(({ code, startsOn, endsOn }) => ({ startsOn, endsOn, label: code }));
  });
  protected readonly today = computed(() =>
    new Intl.DateTimeFormat('en-CA', {
      timeZone: this.session.site()?.timeZone ?? 'UTC',
    }).format(new Date()),
  );

  protected crumbs(flaw: FlawView) {
    return [
      { label: 'Flaws', link: '/flaws' },
      { label: `Unit ${flaw.unitCode}` },
      { label: `${flaw.tag} ${flaw.componentDescription}`, link: `/register/${flaw.componentId}` },
      { label: flaw.location.name },
    ];
  }

  protected title({ number, kind, face, location }: FlawView): string {
    const opens = kind === 'surface' || kind === 'extended surface' || kind === 'corner';
    const where = opens ? `${face} ${kind}` : kind;
    return `${number}, ${where} at ${location.name}`;
  }

  protected open(flaw: FlawView) {
    return flaw.assessments.find(({ state }) => state !== 'approved' && state !== 'superseded');
  }

  protected openWords(state: string): string {
    if (!this.session.can('assessments.write')) return 'Open the assessment';
    return state === 'submitted' ? 'Open the check' : 'Go on with the draft';
  }

  protected mayStart(flaw: FlawView): boolean {
    const settled = flaw.state === 'removed' || flaw.state === 'closed';
    return (
      this.session.can('assessments.write') &&
      flaw.scope === null &&
      !settled &&
      flaw.findings.length > 0 &&
      !this.open(flaw)
    );
  }

  /** Chip of the head: the verdict in force, or what stands in its place. */
  protected word(flaw: FlawView): string {
    const shown = valueOf(this.shown());
    if (flaw.scope !== null) return 'referred';
    if (!shown || shown.standing !== 'approved') return 'not assessed';
    return shown.outcome.status === 'assessed' ? shown.outcome.verdict : 'refused';
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }

  private find(flaw: FlawView) {
    return shownAssessment(this.client, flaw, this.session.can('assessments.preview'));
  }
}
