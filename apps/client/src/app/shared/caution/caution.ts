import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** Stands wherever a verdict, a remaining life or a date stands. */
@Component({
  selector: 'app-caution',
  template: `<p class="caption">
    Supports the judgement of a competent person; it is no licence to operate. The code and
    regulations in force at the site and the owner’s procedures decide.
    @if (assumed().length > 0) {
      <strong class="warn">Assumed, not known: {{ assumed().join(', ') }}.</strong>
    }
    @if (defaults().length > 0) {
      Standard defaults: {{ defaults().join(', ') }}.
    }
  </p>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Caution {
  readonly assumed = input<readonly string[]>([]);
  /** Inputs taken from a standard rather than from this plant. */
  readonly defaults = input<readonly string[]>([]);
}
