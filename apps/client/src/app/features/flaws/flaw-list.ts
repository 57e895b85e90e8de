import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import { VERDICTS } from '@ligament/domain/assessment/assessment-outcome';
import type { FlawRow } from '@ligament/domain/contract/flaws';
import { FLAW_STATES, URGENCIES } from '@ligament/domain/contract/vocabulary';
import { catchError, of, switchMap } from 'rxjs';
import { loadable, LOADING, valueOf } from '../../core/http/loadable';
import { Chip } from '../../shared/chips/chip';
import { Caution } from '../../shared/caution/caution';
import { saveText } from '../../shared/files/save-text';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { numberText } from '../../shared/quantity/quantity-text';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { SortHeader } from '../../shared/table/sort-header';
import { flawRowsCsv } from './flaw-rows-csv';
import { FlawsClient } from './flaws-client';

export const FLAW_SORTS = [
  'number',
  '-number',
  'due',
  '-due',
  'height',
  '-height',
  'verdict',
  '-verdict',
] as const;

/** Every flaw of the site with its newest size, its verdict and its next date; the most pressing first. */
@Component({
  selector: 'app-flaw-list',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    Chip,
    Caution,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
    SortHeader,
    DayPipe,
  ],
  templateUrl: './flaw-list.html',
  styleUrl: './flaw-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FlawList {
  readonly search = input<string>();
  readonly state = input<string>();
  readonly unit = input<string>();
  readonly component = input<string>();
  readonly verdict = input<string>();
  readonly urgency = input<string>();
  readonly sort = input<string>();
  readonly cursor = input<string>();

  private readonly client = inject(FlawsClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  private readonly tries = signal(0);
  protected readonly states = FLAW_STATES;
  protected readonly verdicts = VERDICTS;
  protected readonly urgencies = URGENCIES;
  protected readonly units = toSignal(this.client.units().pipe(catchError(() => of([]))), {
    initialValue: [],
  });

  /** A word of the address that no list knows is taken as left out. */
  private readonly asked = computed(() => ({
    search: this.search(),
    state: FLAW_STATES.find((each) => each === this.state()),
    unit: this.unit(),
    component: this.component(),
    verdict: VERDICTS.find((each) => each === this.verdict()),
    urgency: URGENCIES.find((each) => each === this.urgency()),
    sort: FLAW_SORTS.find((each) => each === this.sort()) ?? 'verdict',
    cursor: this.cursor(),
    tries: this.tries(),
  }));
  protected readonly sorted = computed(() => this.asked().sort);
  protected readonly filtered = computed(() => {
    const { search, state, unit, component, verdict, urgency } = this.asked();
    return [search, state, unit, component, verdict, urgency].some((each) => Boolean(each));
  });
  protected readonly flaws = toSignal(
    toObservable(this.asked).pipe(
      switchMap(({ tries: _tries, ...query }) => loadable(this.client.list(query))),
    ),
    { initialValue: LOADING },
  );

  protected size({ heightMm, lengthMm }: FlawRow): string {
    if (heightMm === null || lengthMm === null) return '—';
    return `${numberText(heightMm)} × ${numberText(lengthMm)}`;
  }

  protected life({ lifeYears, verdict }: FlawRow): string {
    if (verdict === null) return '—';
    if (lifeYears === null) return 'none';
    return lifeYears >= 40 ? 'over 40' : numberText(lifeYears, 2);
  }

  protected set(change: Readonly<Record<string, string | null>>): void {
    this.listQuery.set(this.route, change);
  }

  protected clear(): void {
    this.set({
      search: null,
      state: null,
      unit: null,
      component: null,
      verdict: null,
      urgency: null,
    });
  }

  protected save(): void {
    const rows = valueOf(this.flaws())?.rows ?? [];
    saveText('flaws.csv', 'text/csv;charset=utf-8', flawRowsCsv(rows));
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
