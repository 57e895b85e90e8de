import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, RouterLink } from '@angular/router';
import { switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProvenanceMark } from '../../shared/provenance/provenance-mark';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ListQuery } from '../../shared/table/list-query';
import { Pager } from '../../shared/table/pager';
import { MaterialsClient } from './materials-client';

const SHOWN = ['yieldMpa', 'tensileMpa', 'toughnessMpaSqrtM'] as const;

/** The materials of the site; what is only assumed stands out. */
@Component({
  selector: 'app-material-list',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    ProvenanceMark,
    QuantityPipe,
    EmptyState,
    FailedState,
    LoadingState,
    Pager,
  ],
  templateUrl: './material-list.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MaterialList {
  readonly search = input<string>();
  readonly cursor = input<string>();
  private readonly client = inject(MaterialsClient);
  private readonly listQuery = inject(ListQuery);
  private readonly route = inject(ActivatedRoute);
  private readonly tries = signal(0);
  protected readonly session = inject(Session);
  protected readonly shownProperties = SHOWN;

  private readonly asked = computed(() => ({
    search: this.search(),
    cursor: this.cursor(),
    tries: this.tries(),
  }));
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
