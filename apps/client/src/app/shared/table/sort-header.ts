import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';

/** A column heading that sorts: first upwards, then downwards. The host is a `th`. */
@Component({
  // eslint-disable-next-line @angular-eslint/component-selector -- a heading cell has to stay a th
  selector: 'th[app-sort]',
  template: `<button type="button" (click)="sorted.emit(next())">
    <ng-content /> <span aria-hidden="true">{{ arrow() }}</span>
  </button>`,
  styles: `
    button {
      padding: 0;
      border: 0;
      background: none;
      color: inherit;
      font: inherit;
      cursor: pointer;
    }
    button:hover {
      color: var(--ink);
      text-decoration: underline;
    }
    span {
      position: absolute;
      margin-left: 3px;
    }
  `,
  host: { '[attr.aria-sort]': 'direction()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SortHeader {
  /** Name of this column's sort. */
  readonly by = input.required<string>();
  /** The list's current sort: a name, with a minus sign in front when downwards. */
  readonly current = input.required<string | undefined>();
  readonly sorted = output<string>();
  protected readonly direction = computed(() =>
    this.current() === this.by()
      ? 'ascending'
      : this.current() === `-${this.by()}`
        ? 'descending'
        : 'none',
  );
  protected readonly arrow = computed(
    () => ({ ascending: '↑', descending: '↓', none: '' })[this.direction()],
  );
  protected readonly next = computed(() =>
    this.current() === this.by() ? `-${this.by()}` : this.by(),
  );
}
