import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { AssessmentRow } from '@ligament/domain/contract/flaws';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { DayPipe, MomentPipe } from '../../shared/format/day-pipe';
import { numberText } from '../../shared/quantity/quantity-text';
import { EmptyState } from '../../shared/states/empty-state';

/** Every assessment of a flaw with its state and signatures, newest first. */
@Component({
  selector: 'app-assessments-table',
  imports: [RouterLink, Chip, DayPipe, MomentPipe, EmptyState],
  template: `
    @if (rows().length > 0) {
      <div class="scroll-x">
        <table>
          <caption class="visually-hidden">
            Assessments of this flaw, newest first
          </caption>
          <thead>
            <tr>
              <th scope="col">Revision</th>
              <th scope="col">State</th>
              <th scope="col">Verdict</th>
              <th scope="col" class="number">Life, years</th>
              <th scope="col">Inspect by</th>
              <th scope="col">Finding of</th>
              <th scope="col">Author</th>
              <th scope="col">Checked and approved by</th>
            </tr>
          </thead>
          <tbody>
            @for (row of rows(); track row.id) {
              <tr>
                <td>
                  <a [routerLink]="['/assessments', row.id]">Revision {{ row.revision }}</a>
                </td>
                <td><app-chip [word]="row.state" /></td>
                <td><app-chip [word]="row.verdict ?? 'refused'" /></td>
                <td class="number">{{ life(row) }}</td>
                <td class="nowrap">{{ row.chosenDueOn | day }}</td>
                <td class="nowrap">{{ row.inspectedOn | day }}</td>
                <td>{{ row.authorName }}</td>
                <td>
                  {{ row.reviewerName ?? '—' }}
                  @if (row.approvedAt; as at) {
                    <br /><span class="caption">{{ at | moment: timeZone }}</span>
                  }
                </td>
              </tr>
            }
          </tbody>
        </table>
      </div>
    } @else {
      <app-empty
        title="No assessment"
        hint="Until one is approved this flaw has no verdict and no date."
      />
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AssessmentsTable {
  readonly rows = input.required<readonly AssessmentRow[]>();
  protected readonly timeZone = inject(Session).site()?.timeZone ?? 'UTC';

  protected life({ lifeYears, verdict }: AssessmentRow): string {
    if (lifeYears === null) return verdict === null ? '—' : 'none';
    return lifeYears >= 40 ? 'over 40' : numberText(lifeYears, 2);
  }
}
