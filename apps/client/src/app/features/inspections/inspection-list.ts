import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import { INSPECTION_STATES, TECHNIQUES } from '@ligament/domain/contract/vocabulary';
import { switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { SortHeader } from '../../shared/table/sort-header';
import { InspectionsClient } from './inspections-client';

const SORTS = ['date', '-date', 'report', '-report'] as const;

/** Inspections of the site, planned and reported. */
@Component({
  selector: 'app-inspection-list',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    Chip,
    DayPipe,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
    SortHeader,
  ],
  templateUrl: './inspection-list.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InspectionList {
  readonly search = input<string>();
  readonly state = input<string>();
  readonly technique = input<string>();
  readonly component = input<string>();
  readonly sort = input<string>();
  readonly cursor = input<string>();

  private readonly client = inject(InspectionsClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  private readonly tries = signal(0);
  protected readonly session = inject(Session);
  protected readonly states = INSPECTION_STATES;
  protected readonly techniques = TECHNIQUES;

  private readonly asked = computed(() => ({
    search: this.search(),
    state: INSPECTION_STATES.find((each) => each === this.state()),
    technique: TECHNIQUES.find((each) => each === this.technique()),
    component: this.component(),
    sort: SORTS.find((each) => each === this.sort()) ?? ('-date' as const),
    cursor: this.cursor(),
    tries: this.tries(),
  }));
  protected readonly sorted = computed(() => this.asked().sort);
  protected readonly list = toSignal(
    toObservable(this.asked).pipe(
      switchMap(({ tries: _tries, ...query }) => loadable(this.client.list(query))),
    ),
    { initialValue: LOADING },
  );

  protected set(change: Readonly<Record<string, string | null>>): void {
    this.listQuery.set(this.route, change);
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
