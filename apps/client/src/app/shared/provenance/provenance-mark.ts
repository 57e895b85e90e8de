import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Provenance } from '@ligament/domain/units/provenance';

/** Where a value comes from; what is only assumed stands out. */
@Component({
  selector: 'app-provenance',
  template: `<span [class]="tone()" [title]="note()">{{ provenance() }}</span>`,
  styles: `
    span {
      font-size: 11px;
      padding: 0 5px;
      border: 1px solid var(--rule);
      border-radius: var(--radius);
      color: var(--ink-2);
      white-space: nowrap;
    }
    .assumed {
      border-color: var(--warn-line);
      border-style: dashed;
      color: var(--warn);
      font-weight: 600;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProvenanceMark {
  readonly provenance = input.required<Provenance>();
  readonly note = input('');
  protected readonly tone = computed(() => (this.provenance() === 'assumed' ? 'assumed' : ''));
}
