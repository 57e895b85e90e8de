import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { unitBody, type UnitView } from '@ligament/domain/contract/units';
import { BehaviorSubject, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { PageHeader } from '../../shared/page-header/page-header';
import { text } from '../../shared/record-form/record-field';
import { RecordForm, type SavedRecord } from '../../shared/record-form/record-form';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { RegisterClient } from './register-client';

/** The units of the site. */
@Component({
  selector: 'app-unit-list',
  imports: [RouterLink, MatButtonModule, PageHeader, RecordForm, FailedState, LoadingState],
  templateUrl: './unit-list.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class UnitList {
  private readonly client = inject(RegisterClient);
  private readonly reload = new BehaviorSubject<null>(null);
  protected readonly session = inject(Session);
  protected readonly fields = [text('code', 'Code'), text('name', 'Name')];
  protected readonly checks = unitBody.shape;
  protected readonly problem = signal<Problem | null>(null);
  /** The unit whose form is open; null for a new one. */
  protected readonly open = signal<UnitView | null | undefined>(undefined);
  protected readonly list = toSignal(
    this.reload.pipe(switchMap(() => loadable(this.client.units()))),
    { initialValue: LOADING },
  );

  protected edit(unit: UnitView | null | undefined): void {
    this.problem.set(null);
    this.open.set(unit);
  }

  protected save({ value, version }: SavedRecord): void {
    // every field has passed the contract's check in the form
    const body = value as { code: string; name: string; reason: string };
    const unit = this.open();
    const saved = unit ? this.client.changeUnit(unit.id, version, body) : this.client.addUnit(body);
    saved.subscribe({
      next: () => {
        this.edit(undefined);
        this.again();
      },
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected again(): void {
    this.reload.next(null);
  }
}
