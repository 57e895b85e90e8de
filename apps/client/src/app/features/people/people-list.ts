import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import { PEOPLE_SORTS } from '@ligament/domain/contract/people';
import { ROLES } from '@ligament/domain/contract/policy';
import { switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { DayPipe, MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { SortHeader } from '../../shared/table/sort-header';
import { AccessChip } from './access-chip';
import { certificateWarning } from './certificate-warning';
import { PeopleClient } from './people-client';

/** Everybody with access to the site, with role, competence and certificate. */
@Component({
  selector: 'app-people-list',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
    SortHeader,
    AccessChip,
    DayPipe,
    MomentPipe,
  ],
  templateUrl: './people-list.html',
  styles: `
    @media (max-width: 700px) {
      .wide-only {
        display: none;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PeopleList {
  readonly search = input<string>();
  readonly role = input<string>();
  readonly sort = input<string>();
  readonly cursor = input<string>();

  private readonly client = inject(PeopleClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  protected readonly session = inject(Session);
  protected readonly roles = ROLES;
  private readonly tries = signal(0);

  /** A word of the address that no list knows is taken as left out. */
  private readonly asked = computed(() => ({
    search: this.search(),
    role: ROLES.find((each) => each === this.role()),
    sort: PEOPLE_SORTS.find((each) => each === this.sort()) ?? 'name',
    cursor: this.cursor(),
    tries: this.tries(),
  }));
  protected readonly sorted = computed(() => this.asked().sort);
  protected readonly people = toSignal(
    toObservable(this.asked).pipe(
      switchMap(({ tries: _tries, ...query }) => loadable(this.client.list(query))),
    ),
    { initialValue: LOADING },
  );
  protected readonly timeZone = computed(() => this.session.site()?.timeZone ?? 'UTC');
  private readonly today = computed(() =>
    new Intl.DateTimeFormat('en-CA', { timeZone: this.timeZone() }).format(new Date()),
  );

  protected warning(validUntil: string | null): string {
    return certificateWarning(validUntil, this.today());
  }

  protected set(change: Readonly<Record<string, string | null>>): void {
    this.listQuery.set(this.route, change);
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
