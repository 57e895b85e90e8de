import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { AccessState } from '@ligament/domain/contract/people';
import { Chip } from '../../shared/chips/chip';

/** Words of the shared chip that look the way each state should. */
const LOOKS_LIKE: Readonly<Record<AccessState, string>> = {
  active: 'accepted',
  invited: 'in progress',
  'access ended': 'retired',
  disabled: 'out of service',
};

/** Where a person stands with their access. */
@Component({
  selector: 'app-access-chip',
  imports: [Chip],
  template: `<app-chip [word]="look()" [label]="state()" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccessChip {
  readonly state = input.required<AccessState>();
  protected readonly look = computed(() => LOOKS_LIKE[this.state()]);
}
