import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { Router, RouterLink } from '@angular/router';
import { readToday, type TodayItem } from '@ligament/domain/contract/today';
import { switchMap } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Caution } from '../../shared/caution/caution';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';

/** A person's work on landing: what needs them, the most pressing first, and why. */
@Component({
  selector: 'app-today',
  imports: [RouterLink, PageHeader, DayPipe, Caution, EmptyState, FailedState, LoadingState],
  templateUrl: './today.html',
  styleUrl: './today.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Today {
  private readonly api = inject(ApiClient);
  private readonly router = inject(Router);
  private readonly tries = signal(0);
  protected readonly session = inject(Session);
  protected readonly page = toSignal(
    toObservable(this.tries).pipe(switchMap(() => loadable(this.api.call(readToday)))),
    { initialValue: LOADING },
  );

  /** Links carry their filters in the address. */
  protected link(address: string) {
    return this.router.parseUrl(address);
  }

  protected mark({ tone }: TodayItem): string {
    return { bad: '■', warn: '▲', plain: '○' }[tone];
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
