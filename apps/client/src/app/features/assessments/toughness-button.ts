import { ChangeDetectionStrategy, Component, inject, input, output } from '@angular/core';
import type { Given } from '@ligament/domain/units/provenance';
import { AskToughness } from '../../shared/toughness/ask-toughness';
import type { KnownOfToughness } from '../../shared/toughness/evidence';

/** Stands beside the fracture toughness and finds it from the evidence there is. */
@Component({
  selector: 'app-toughness-button',
  template: `<button type="button" aria-haspopup="dialog" (click)="ask()">
    By its source…<span class="visually-hidden"> Fracture toughness</span>
  </button>`,
  styles: `
    button {
      padding: 0;
      border: 0;
      background: none;
      color: var(--steel);
      font: inherit;
      font-size: 13px;
      text-decoration: underline;
      cursor: pointer;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ToughnessButton {
  readonly known = input.required<KnownOfToughness>();
  readonly found = output<Given>();
  private readonly dialog = inject(AskToughness);

  protected ask(): void {
    this.dialog.ask(this.known()).subscribe(({ given }) => this.found.emit(given));
  }
}
