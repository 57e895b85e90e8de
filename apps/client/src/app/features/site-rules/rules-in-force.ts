import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { SiteRulesVersion } from '@ligament/domain/contract/rules';
import { MECHANISMS, TECHNIQUES } from '@ligament/domain/contract/vocabulary';
import { Caution } from '../../shared/caution/caution';
import { DayPipe } from '../../shared/format/day-pipe';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';

/** One version of the rules to be read: intervals, reminders, and the allowances by technique. */
@Component({
  selector: 'app-rules-in-force',
  imports: [Caution, DayPipe, QuantityPipe],
  templateUrl: './rules-in-force.html',
  styles: `
    app-caution {
      display: block;
      margin-top: 16px;
    }
    .tables {
      margin: 16px 0;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RulesInForce {
  readonly version = input.required<SiteRulesVersion>();
  protected readonly rules = computed(() => this.version().rules);
  protected readonly mechanisms = MECHANISMS;
  protected readonly techniques = TECHNIQUES;
}
