import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { BehaviorSubject, combineLatest, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProvenanceMark } from '../../shared/provenance/provenance-mark';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { PROPERTIES } from './material-properties';
import { MaterialsClient } from './materials-client';

/** One material: each property with its unit and where it comes from. */
@Component({
  selector: 'app-material-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    ProvenanceMark,
    QuantityPipe,
    MomentPipe,
    FailedState,
    LoadingState,
  ],
  templateUrl: './material-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MaterialPage {
  readonly id = input.required<string>();
  private readonly client = inject(MaterialsClient);
  private readonly reload = new BehaviorSubject<null>(null);
  protected readonly session = inject(Session);
  protected readonly properties = PROPERTIES;
  protected readonly shown = toSignal(
    combineLatest([toObservable(this.id), this.reload]).pipe(
      switchMap(([id]) => loadable(this.client.read(id))),
    ),
    { initialValue: LOADING },
  );

  protected again(): void {
    this.reload.next(null);
  }
}
