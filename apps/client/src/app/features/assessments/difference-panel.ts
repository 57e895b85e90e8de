import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import type { AssessmentOutcome } from '@ligament/domain/assessment/assessment-outcome';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import { lifeWords } from '../../shared/assessed/life-words';
import { numberText } from '../../shared/quantity/quantity-text';
import { inputDifferences } from './input-differences';

/** What changed since the approved assessment before this one: inputs and main results. */
@Component({
  selector: 'app-difference-panel',
  imports: [RouterLink],
  template: `
    <section class="sheet flush" aria-labelledby="differences">
      <h2 id="differences" class="heading">
        Against
        <a [routerLink]="['/assessments', previous().id]">revision {{ previous().revision }}</a
        >, approved before
      </h2>
      <div class="scroll-x">
        <table>
          <caption class="visually-hidden">
            What differs from the previous approved assessment
          </caption>
          <thead>
            <tr>
              <th scope="col">What</th>
              <th scope="col">Unit</th>
              <th scope="col">Revision {{ previous().revision }}</th>
              <th scope="col">This one</th>
            </tr>
          </thead>
          <tbody>
            @for (row of results(); track row.name) {
              <tr>
                <th scope="row">{{ row.name }}</th>
                <td>{{ row.unit }}</td>
                <td>{{ row.before }}</td>
                <td>
                  <strong>{{ row.after }}</strong>
                </td>
              </tr>
            }
            @for (row of rows(); track row.name) {
              <tr>
                <th scope="row">{{ row.name }}</th>
                <td>{{ row.unit }}</td>
                <td>{{ row.before }}</td>
                <td>{{ row.after }}</td>
              </tr>
            } @empty {
              <tr>
                <td colspan="4" class="quiet">No input differs.</td>
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
    }
    .heading {
      margin: 0;
      padding: 12px 16px 6px;
    }
    th[scope='row'] {
      color: var(--ink);
      white-space: normal;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DifferencePanel {
  readonly previous = input.required<NonNullable<AssessmentView['previous']>>();
  readonly input = input.required<AssessmentInput>();
  readonly outcome = input.required<AssessmentOutcome>();
  protected readonly rows = computed(() => inputDifferences(this.previous().input, this.input()));
  protected readonly results = computed(() => {
    const [old, now] = [told(this.previous().outcome), told(this.outcome())];
    return old.map((row, i) => ({ ...row, before: row.value, after: now[i]?.value ?? '—' }));
  });
}

/** The results that a reader compares. */
function told(outcome: AssessmentOutcome) {
  const assessed = outcome.status === 'assessed' ? outcome : null;
  const number = (value: number | undefined) => (value === undefined ? '—' : numberText(value, 3));
  return [
    { name: 'Verdict', unit: '', value: assessed?.verdict ?? 'no verdict' },
    { name: 'Kr', unit: '', value: number(assessed?.kr) },
    { name: 'Lr', unit: '', value: number(assessed?.lr) },
    { name: 'Reserve on load', unit: '×', value: number(assessed?.reserveOnLoad) },
    {
      name: 'Remaining life',
      unit: 'years',
      value: assessed ? lifeWords(assessed.life).value : '—',
    },
  ];
}
