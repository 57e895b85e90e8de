import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { ValidityCheck } from '@ligament/domain/assessment/assessment-outcome';
import { numberText } from '../../shared/quantity/quantity-text';

/** Limits of the solutions that were used, each with the value of this case. */
@Component({
  selector: 'app-validity-table',
  template: `
    <section class="sheet flush" aria-labelledby="validity">
      <h2 id="validity" class="heading">Limits of the method</h2>
      <div class="scroll-x">
        <table>
          <caption class="visually-hidden">
            Validity limits, and whether this case meets them
          </caption>
          <thead>
            <tr>
              <th scope="col">What</th>
              <th scope="col">Limit</th>
              <th scope="col" class="number">Here</th>
              <th scope="col">Met</th>
              <th scope="col">Source</th>
            </tr>
          </thead>
          <tbody>
            @for (check of checks(); track $index) {
              <tr>
                <td>{{ check.name }}</td>
                <td>{{ check.limit }}</td>
                <td class="number">{{ numberText(check.value, 3) }}</td>
                <td [class]="check.met ? (check.near ? 'warn' : 'good') : 'bad'">
                  {{ check.met ? (check.near ? '▲ met, close to it' : '● met') : '■ not met' }}
                </td>
                <td class="quiet">{{ check.source }}</td>
              </tr>
            }
          </tbody>
        </table>
      </div>
    </section>
  `,
  styles: `
    :host {
      display: block;
      margin-top: 16px;
    }
    .heading {
      margin: 0;
      padding: 12px 16px 6px;
    }
    td.good,
    td.warn,
    td.bad {
      white-space: nowrap;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ValidityTable {
  readonly checks = input.required<readonly ValidityCheck[]>();
  protected readonly numberText = numberText;
}
