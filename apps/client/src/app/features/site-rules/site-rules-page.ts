import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { SiteRulesVersion } from '@ligament/domain/contract/rules';
import { BehaviorSubject, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { Session } from '../../core/session/session';
import { DifferenceTable } from '../../shared/difference/difference-table';
import { DayPipe, MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { RulesInForce } from './rules-in-force';
import { SiteRulesClient } from './site-rules-client';

/** Rules in force, and every version with its reason, who recorded it and what it changed. */
@Component({
  selector: 'app-site-rules-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    FailedState,
    LoadingState,
    RulesInForce,
    DifferenceTable,
    DayPipe,
    MomentPipe,
  ],
  templateUrl: './site-rules-page.html',
  styles: `
    .version {
      padding: 10px 0;
      border-top: 1px solid var(--rule);
    }
    .version p {
      max-width: 80ch;
      overflow-wrap: anywhere;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SiteRulesPage {
  private readonly client = inject(SiteRulesClient);
  private readonly tries = new BehaviorSubject<void>(undefined);
  protected readonly session = inject(Session);
  protected readonly timeZone = computed(() => this.session.site()?.timeZone ?? 'UTC');
  protected readonly rules = toSignal(
    this.tries.pipe(switchMap(() => loadable(this.client.read()))),
    { initialValue: LOADING },
  );

  /** The version that one replaced; null for the first. */
  protected replaced(versions: readonly SiteRulesVersion[], number: number) {
    return versions.find((each) => each.number === number - 1)?.rules ?? null;
  }

  protected again(): void {
    this.tries.next();
  }
}
