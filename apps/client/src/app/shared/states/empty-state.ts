import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** Nothing here: why, and the next step (as content). */
@Component({
  selector: 'app-empty',
  template: `<p class="title">{{ title() }}</p>
    <p class="quiet">{{ hint() }}</p>
    <div class="actions"><ng-content /></div>`,
  styles: `
    :host {
      display: block;
      padding: 24px 16px;
    }
    .title {
      font-weight: 600;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EmptyState {
  readonly title = input.required<string>();
  readonly hint = input('');
}
