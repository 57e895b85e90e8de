import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { RefusedFlaw } from '@ligament/domain/assessment/assessment-outcome';
import { numberText } from '../quantity/quantity-text';
import { inputName } from './input-names';

/** Why no verdict is given: the input, the limit, the value it got, and what to do instead. */
@Component({
  selector: 'app-refusal-notice',
  template: `
    <div class="notice bad" role="status">
      <p>
        <strong>No verdict can be given.</strong> The method does not hold for these inputs, so no
        reserve, no remaining life and no date are computed.
      </p>
      <div class="scroll-x">
        <table>
          <caption class="visually-hidden">
            Limits that are not met
          </caption>
          <thead>
            <tr>
              <th scope="col">Input</th>
              <th scope="col">Limit</th>
              <th scope="col" class="number">Value</th>
              <th scope="col">Why, and what to do</th>
            </tr>
          </thead>
          <tbody>
            @for (each of rows(); track $index) {
              <tr>
                <th scope="row">{{ each.name }}</th>
                <td>{{ each.limit }}</td>
                <td class="number">{{ each.value }}</td>
                <td>
                  {{ each.message }}<br /><strong>{{ each.instead }}</strong>
                </td>
              </tr>
            }
          </tbody>
        </table>
      </div>
    </div>
  `,
  styles: `
    th[scope='row'] {
      color: var(--ink);
      white-space: normal;
    }
    tbody tr:hover {
      background: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RefusalNotice {
  readonly outcome = input.required<RefusedFlaw>();
  protected readonly rows = computed(() =>
    this.outcome().refusals.map((each) => ({
      ...each,
      name: inputName(each.input).name,
      value: typeof each.value === 'number' ? numberText(each.value, 4) : (each.value ?? '—'),
    })),
  );
}
