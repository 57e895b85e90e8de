import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { BehaviorSubject, combineLatest, switchMap } from 'rxjs';
import { loadable, LOADING, valueOf } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { type Figure, FigureStrip } from '../../shared/figure-strip/figure-strip';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { numberText } from '../../shared/quantity/quantity-text';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ComponentParts } from './component-parts';
import { RegisterClient } from './register-client';

/** One component: what it is, what is wrong with it, when it is looked at again, and what it carries. */
@Component({
  selector: 'app-component-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    FigureStrip,
    Chip,
    DayPipe,
    QuantityPipe,
    FailedState,
    LoadingState,
    ComponentParts,
  ],
  templateUrl: './component-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ComponentPage {
  readonly id = input.required<string>();
  private readonly client = inject(RegisterClient);
  private readonly reload = new BehaviorSubject<null>(null);
  protected readonly session = inject(Session);

  protected readonly shown = toSignal(
    combineLatest([toObservable(this.id), this.reload]).pipe(
      switchMap(([id]) => loadable(this.client.read(id))),
    ),
    { initialValue: LOADING },
  );

  protected readonly figures = computed((): readonly Figure[] => {
    const component = valueOf(this.shown());
    if (!component) return [];
    const { requiredWallMm: least } = component;
    const at = (celsius: number) => `MPa at ${numberText(celsius, 0)} °C`;
    return [
      { label: 'Inside diameter', value: numberText(component.insideDiameterMm), unit: 'mm' },
      {
        label: 'Nominal wall',
        value: numberText(component.wallMm),
        unit: least === null ? 'mm' : `mm, least by code ${numberText(least)}`,
      },
      {
        label: 'Design',
        value: numberText(component.designPressureMpa, 2),
        unit: at(component.designTemperatureC),
      },
      {
        label: 'Operating',
        value: numberText(component.operatingPressureMpa, 2),
        unit: at(component.operatingTemperatureC),
      },
    ];
  });

  protected again(): void {
    this.reload.next(null);
  }
}
