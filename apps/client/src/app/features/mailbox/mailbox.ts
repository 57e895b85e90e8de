import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, RouterLink } from '@angular/router';
import { listMails, listUndelivered } from '@ligament/domain/contract/reminders';
import { combineLatest, switchMap } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';

/** What the built-in mailbox received, and mail that could not be delivered. */
@Component({
  selector: 'app-mailbox',
  imports: [RouterLink, Chip, MomentPipe, PageHeader, EmptyState, FailedState, LoadingState, Pager],
  templateUrl: './mailbox.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Mailbox {
  readonly cursor = input<string>();
  private readonly api = inject(ApiClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  private readonly tries = signal(0);
  protected readonly timeZone = inject(Session).site()?.timeZone;
  protected readonly page = toSignal(
    toObservable(computed(() => ({ cursor: this.cursor(), tries: this.tries() }))).pipe(
      switchMap(({ cursor }) =>
        loadable(
          combineLatest({
            mails: this.api.call(listMails, { query: { cursor, limit: 50 } }),
            undelivered: this.api.call(listUndelivered),
          }),
        ),
      ),
    ),
    { initialValue: LOADING },
  );

  protected go(cursor: string | null): void {
    this.listQuery.set(this.route, { cursor });
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
