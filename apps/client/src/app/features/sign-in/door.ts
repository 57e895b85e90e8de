import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Mark } from '../../core/shell/mark';

/** The frame of the pages before the sign-in. */
@Component({
  selector: 'app-door',
  imports: [Mark],
  template: `
    <main class="sheet">
      <p class="brand"><app-mark /> Ligament</p>
      <h1>{{ title() }}</h1>
      <ng-content />
    </main>
    <p class="caption">
      Ligament computes; it does not certify. The code and regulations in force at the site and the
      owner’s procedures decide.
    </p>
  `,
  styles: `
    :host {
      display: flex;
      flex-direction: column;
      align-items: center;
      padding: 8vh 16px 16px;
      min-height: 100vh;
    }
    main {
      width: 100%;
      max-width: 420px;
      padding: 24px;
    }
    .brand {
      display: flex;
      gap: 10px;
      align-items: center;
      font: 600 17px/1 var(--font);
      margin-bottom: 20px;
    }
    h1 {
      margin-bottom: 12px;
    }
    .caption {
      max-width: 420px;
      margin-top: 12px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Door {
  readonly title = input.required<string>();
}
