import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import {
  COMPONENT_KINDS,
  COMPONENT_STATES,
  MECHANISMS,
} from '@ligament/domain/contract/vocabulary';
import { switchMap } from 'rxjs';
import { loadable, LOADING, valueOf } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { SortHeader } from '../../shared/table/sort-header';
import { RegisterClient } from './register-client';

const SORTS = ['tag', '-tag', 'description', '-description', 'due', '-due'] as const;

/** The components of the site, with their flaws and their next due date. */
@Component({
  selector: 'app-component-list',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    Chip,
    DayPipe,
    QuantityPipe,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
    SortHeader,
  ],
  templateUrl: './component-list.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ComponentList {
  readonly search = input<string>();
  readonly unit = input<string>();
  readonly kind = input<string>();
  readonly state = input<string>();
  readonly mechanism = input<string>();
  readonly sort = input<string>();
  readonly cursor = input<string>();

  private readonly client = inject(RegisterClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  private readonly tries = signal(0);
  protected readonly session = inject(Session);
  protected readonly csvAddress = this.client.csvAddress;
  protected readonly filters = [
    { name: 'kind', label: 'Kind', every: 'every kind', words: COMPONENT_KINDS, chosen: this.kind },
    {
      name: 'mechanism',
      label: 'Mechanism',
      every: 'every mechanism',
      words: MECHANISMS,
      chosen: this.mechanism,
    },
    {
      name: 'state',
      label: 'State',
      every: 'every state',
      words: COMPONENT_STATES,
      chosen: this.state,
    },
  ] as const;

  private readonly unitsAsked = toSignal(loadable(this.client.units()), { initialValue: LOADING });
  protected readonly units = computed(() => valueOf(this.unitsAsked()) ?? []);

  private readonly asked = computed(() => ({
    search: this.search(),
    unit: this.unit(),
    kind: COMPONENT_KINDS.find((each) => each === this.kind()),
    state: COMPONENT_STATES.find((each) => each === this.state()),
    mechanism: MECHANISMS.find((each) => each === this.mechanism()),
    sort: SORTS.find((each) => each === this.sort()) ?? ('tag' as const),
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

  protected filterBy(name: string, value: string): void {
    this.set({ [name]: value });
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
