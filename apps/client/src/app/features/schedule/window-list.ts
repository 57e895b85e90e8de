import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { DayPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { ScheduleClient } from './schedule-client';

/** Shutdown windows in order of time. */
@Component({
  selector: 'app-window-list',
  imports: [
    RouterLink,
    MatButtonModule,
    Chip,
    DayPipe,
    PageHeader,
    EmptyState,
    FailedState,
    LoadingState,
  ],
  template: `
    <app-page-header title="Shutdown windows" [crumbs]="[{ label: 'Schedule', link: '/schedule' }]">
      @if (session.can('windows.write')) {
        <a mat-flat-button routerLink="/schedule/windows/new">New window</a>
      }
    </app-page-header>
    @let shown = windows();
    @switch (shown.state) {
      @case ('loading') {
        <app-loading what="the windows" />
      }
      @case ('failed') {
        <app-failed [problem]="shown.problem" (again)="tries.set(tries() + 1)" />
      }
      @case ('ready') {
        <div class="sheet flush">
          @if (shown.value.length > 0) {
            <div class="scroll-x">
              <table>
                <caption class="visually-hidden">
                  Shutdown windows
                </caption>
                <thead>
                  <tr>
                    <th scope="col">Window</th>
                    <th scope="col">Kind</th>
                    <th scope="col">Units</th>
                    <th scope="col">From – to</th>
                    <th scope="col">Scope freeze</th>
                    <th scope="col" class="number">Planned into it</th>
                    <th scope="col">State</th>
                  </tr>
                </thead>
                <tbody>
                  @for (window of shown.value; track window.id) {
                    <tr>
                      <td>
                        <a [routerLink]="['/schedule/windows', window.id]">{{ window.code }}</a>
                        <span class="caption">{{ window.name }}</span>
                      </td>
                      <td>{{ window.kind }}</td>
                      <td>{{ window.unitCodes.join(', ') }}</td>
                      <td class="nowrap">
                        {{ window.startsOn | day }} – {{ window.endsOn | day }}
                      </td>
                      <td class="nowrap">{{ window.scopeFreezeOn | day }}</td>
                      <td class="number">
                        <a [routerLink]="['/schedule']" [queryParams]="{ window: window.id }">{{
                          window.planned
                        }}</a>
                      </td>
                      <td><app-chip [word]="window.state" /></td>
                    </tr>
                  }
                </tbody>
              </table>
            </div>
          } @else {
            <app-empty
              title="No window is planned"
              hint="Re-inspections that need a shutdown are planned into windows."
            />
          }
        </div>
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WindowList {
  private readonly client = inject(ScheduleClient);
  protected readonly session = inject(Session);
  protected readonly tries = signal(0);
  protected readonly windows = toSignal(
    toObservable(this.tries).pipe(switchMap(() => loadable(this.client.windows()))),
    { initialValue: LOADING },
  );
}
