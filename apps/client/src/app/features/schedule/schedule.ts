import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import { exportReinspections, type ReinspectionRow } from '@ligament/domain/contract/reinspections';
import { REINSPECTION_STATES, TECHNIQUES, URGENCIES } from '@ligament/domain/contract/vocabulary';
import { combineLatest, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Caution } from '../../shared/caution/caution';
import { Chip } from '../../shared/chips/chip';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { SortHeader } from '../../shared/table/sort-header';
import { ScheduleBoard } from './schedule-board';
import { ScheduleClient } from './schedule-client';

const SORTS = ['due', '-due', 'tag', '-tag'] as const;
const STATES = [...REINSPECTION_STATES, 'unplanned', 'all'] as const;

/** The planner's due list, on a time axis and as a table. */
@Component({
  selector: 'app-schedule',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    Caution,
    Chip,
    DayPipe,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
    SortHeader,
    ScheduleBoard,
  ],
  templateUrl: './schedule.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Schedule {
  readonly search = input<string>();
  readonly urgency = input<string>();
  readonly unit = input<string>();
  readonly state = input<string>();
  readonly technique = input<string>();
  readonly window = input<string>();
  readonly component = input<string>();
  readonly sort = input<string>();
  readonly cursor = input<string>();
  /** `table` or `board`. */
  readonly show = input<string>();

  private readonly client = inject(ScheduleClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  private readonly tries = signal(0);
  protected readonly session = inject(Session);
  protected readonly urgencies = URGENCIES;
  protected readonly techniques = TECHNIQUES;
  protected readonly csv = exportReinspections.path;
  protected readonly units = toSignal(this.client.units(), { initialValue: [] });
  protected readonly asTable = computed(() => this.show() === 'table');

  private readonly asked = computed(() => ({
    search: this.search(),
    urgency: URGENCIES.find((each) => each === this.urgency()),
    unit: this.unit(),
    state: STATES.find((each) => each === this.state()),
    technique: TECHNIQUES.find((each) => each === this.technique()),
    window: this.window(),
    component: this.component(),
    sort: SORTS.find((each) => each === this.sort()) ?? ('due' as const),
    cursor: this.cursor(),
    tries: this.tries(),
  }));
  protected readonly sorted = computed(() => this.asked().sort);
  protected readonly page = toSignal(
    toObservable(this.asked).pipe(
      switchMap(({ tries: _tries, ...query }) =>
        loadable(
          combineLatest({
            tasks: this.client.list({ ...query, limit: 100 }),
            windows: this.client.windows(),
          }),
        ),
      ),
    ),
    { initialValue: LOADING },
  );
  protected readonly summary = computed(() => {
    const page = this.page();
    if (page.state !== 'ready') return '';
    const rows = page.value.tasks.rows;
    const count = (test: (row: ReinspectionRow) => boolean) => rows.filter(test).length;
    const more = page.value.tasks.nextCursor ? ' on this page' : '';
    return `${rows.length} re-inspections${more}, ${count((row) => row.urgency === 'overdue')} overdue, ${count((row) => row.plannedOn === null)} not planned`;
  });

  protected set(change: Readonly<Record<string, string | null>>): void {
    this.listQuery.set(this.route, change);
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
