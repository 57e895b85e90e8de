import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { differenceRows } from './difference-rows';

/** Before and after, value by value with units; what is new or gone has only one of them. */
@Component({
  selector: 'app-difference-table',
  template: `
    @if (rows().length > 0) {
      <div class="scroll-x">
        <table class="values">
          <caption class="visually-hidden">
            {{
              caption()
            }}
          </caption>
          <thead>
            <tr>
              <th scope="col">What</th>
              @if (hasBefore()) {
                <th scope="col">Before</th>
              }
              @if (hasAfter()) {
                <th scope="col">{{ hasBefore() ? 'After' : 'Recorded' }}</th>
              }
              @if (hasUnits()) {
                <th scope="col">Unit</th>
              }
            </tr>
          </thead>
          <tbody>
            @for (row of rows(); track row.label) {
              <tr>
                <th scope="row">{{ row.label }}</th>
                @if (hasBefore()) {
                  <td class="before">{{ row.before }}</td>
                }
                @if (hasAfter()) {
                  <td class="after">{{ row.after }}</td>
                }
                @if (hasUnits()) {
                  <td class="quiet">{{ row.unit }}</td>
                }
              </tr>
            }
          </tbody>
        </table>
      </div>
    }
  `,
  styles: `
    table {
      width: auto;
      min-width: min(100%, 420px);
    }
    th[scope='row'] {
      white-space: normal;
      color: var(--ink-2);
    }
    // stands inside panels whose own tables start further in
    .scroll-x .values td,
    .scroll-x .values th:first-child,
    .scroll-x .values th {
      padding: 3px 20px 3px 0;
    }
    td {
      overflow-wrap: anywhere;
      max-width: 420px;
    }
    .before {
      color: var(--ink-2);
    }
    .after {
      font-weight: 500;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DifferenceTable {
  readonly before = input.required<Readonly<Record<string, unknown>> | null>();
  readonly after = input.required<Readonly<Record<string, unknown>> | null>();
  readonly caption = input('What changed');
  readonly timeZone = input('UTC');
  protected readonly rows = computed(() =>
    differenceRows(this.before(), this.after(), this.timeZone()),
  );
  protected readonly hasUnits = computed(() => this.rows().some(({ unit }) => unit !== ''));
  protected readonly hasBefore = computed(() => this.before() !== null);
  protected readonly hasAfter = computed(() => this.after() !== null);
}
