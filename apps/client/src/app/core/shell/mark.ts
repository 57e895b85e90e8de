import { ChangeDetectionStrategy, Component } from '@angular/core';

/** The mark: a block, a crack from the left edge to a point, and a line on the metal that is left. */
@Component({
  selector: 'app-mark',
  template: `<svg width="22" height="22" viewBox="0 0 32 32" aria-hidden="true">
    <rect width="32" height="32" fill="var(--ink)" />
    <path d="M0 13.4 L19 15.6 L0 18.6 Z" fill="var(--sheet)" />
    <rect x="21" y="15" width="9" height="2" fill="var(--warn-line)" />
  </svg>`,
  styles: ':host { display: inline-flex; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Mark {}
