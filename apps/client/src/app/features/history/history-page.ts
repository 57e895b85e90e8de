import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import type { HistoryEntry } from '@ligament/domain/contract/history';
import { catchError, of, switchMap } from 'rxjs';
import { loadable, LOADING, valueOf } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { type Crumb, PageHeader } from '../../shared/page-header/page-header';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { daysOfEntries } from './days-of-entries';
import { HistoryClient, type HistoryFilters } from './history-client';
import { HistoryEntryView } from './history-entry';
import { HistoryFilterBar } from './history-filter-bar';
import { HistoryProof } from './history-proof';

/** Everything that was recorded, newest first: of the site, or of the whole life of one component. */
@Component({
  selector: 'app-history-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
    HistoryEntryView,
    HistoryFilterBar,
    HistoryProof,
  ],
  templateUrl: './history-page.html',
  styleUrl: './history-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HistoryPage {
  /** Component whose life is shown; without one, the whole site. */
  readonly component = input<string>();
  readonly search = input<string>();
  readonly entity = input<string>();
  readonly actor = input<string>();
  readonly from = input<string>();
  readonly to = input<string>();
  readonly flaw = input<string>();
  readonly cursor = input<string>();

  private readonly client = inject(HistoryClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  protected readonly session = inject(Session);
  private readonly tries = signal(0);

  protected readonly filters = computed(
    () =>
      ({
        search: this.search(),
        entity: this.entity() as HistoryEntry['entity'] | undefined,
        actor: this.actor(),
        from: this.from(),
        to: this.to(),
        flaw: this.flaw(),
      }) satisfies HistoryFilters,
  );
  protected readonly isFiltered = computed(() => Object.values(this.filters()).some(Boolean));
  protected readonly timeZone = computed(() => this.session.site()?.timeZone ?? 'UTC');
  private readonly asked = computed(() => ({
    component: this.component(),
    query: { ...this.filters(), cursor: this.cursor() },
    tries: this.tries(),
  }));
  protected readonly entries = toSignal(
    toObservable(this.asked).pipe(
      switchMap(({ component, query }) => loadable(this.client.list(component, query))),
    ),
    { initialValue: LOADING },
  );
  protected readonly days = computed(() =>
    daysOfEntries(valueOf(this.entries())?.rows ?? [], this.timeZone()),
  );
  protected readonly actors = toSignal(
    toObservable(this.component).pipe(
      switchMap((component) => this.client.actors(component).pipe(catchError(() => of([])))),
    ),
    { initialValue: [] },
  );
  private readonly readTag = toSignal(
    toObservable(this.component).pipe(
      switchMap((id) => (id ? this.client.componentTag(id) : of(''))),
      catchError(() => of('')),
    ),
    { initialValue: '' },
  );
  /** From the register, or as the entries name it. */
  protected readonly tag = computed(
    () =>
      this.readTag() ||
      (valueOf(this.entries())?.rows.find((entry) => entry.componentTag)?.componentTag ?? ''),
  );
  protected readonly title = computed(() =>
    this.component() ? `History of ${this.tag() || 'a component'}` : 'History',
  );
  protected readonly crumbs = computed((): readonly Crumb[] => {
    const id = this.component();
    return id
      ? [
          { label: 'Register', link: '/register' },
          { label: this.tag() || 'Component', link: ['/register', id] },
          { label: 'History' },
        ]
      : [];
  });
  protected readonly exportAddress = computed(() =>
    this.client.exportAddress(this.component(), this.filters()),
  );

  protected go(cursor: string | null): void {
    this.listQuery.set(this.route, { cursor });
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }

  protected print(): void {
    window.print();
  }
}
