import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { FlawFinding } from '@ligament/domain/contract/flaws';
import { Chip } from '../../shared/chips/chip';
import { DayPipe } from '../../shared/format/day-pipe';
import { numberText } from '../../shared/quantity/quantity-text';
import { EmptyState } from '../../shared/states/empty-state';

/** What each inspection recorded of a flaw, newest first, with its sizing error. */
@Component({
  selector: 'app-findings-table',
  imports: [RouterLink, Chip, DayPipe, EmptyState],
  template: `
    @if (rows().length > 0) {
      <div class="scroll-x">
        <table>
          <caption class="visually-hidden">
            Findings of this flaw, newest first
          </caption>
          <thead>
            <tr>
              <th scope="col">Inspected</th>
              <th scope="col">Report</th>
              <th scope="col">Technique, inspector</th>
              <th scope="col">Indication</th>
              <th scope="col" class="number">Height, mm</th>
              <th scope="col" class="number">Length, mm</th>
              <th scope="col" class="number">Ligament, mm</th>
              <th scope="col" class="number">Wall, mm</th>
              <th scope="col">Remarks</th>
            </tr>
          </thead>
          <tbody>
            @for (row of rows(); track row.id) {
              <tr>
                <td class="nowrap">{{ row.inspectedOn | day }}</td>
                <td>
                  <a [routerLink]="['/inspections', row.inspectionId]">{{ row.reportNo }}</a>
                  @if (row.inspectionState !== 'accepted') {
                    <br /><app-chip [word]="row.inspectionState" />
                  }
                </td>
                <td>
                  {{ row.technique }}<br /><span class="caption">{{ row.inspectorName }}</span>
                </td>
                <td>
                  {{ row.indicationType }}<br /><span class="caption"
                    >{{ row.kind }}, {{ row.face }}</span
                  >
                </td>
                <td class="number">
                  {{ size(row.heightQualifier, row.heightMm, row.heightErrorMm) }}
                </td>
                <td class="number">
                  {{ size(row.lengthQualifier, row.lengthMm, row.lengthErrorMm) }}
                </td>
                <td class="number">{{ number(row.ligamentMm) }}</td>
                <td class="number">{{ number(row.wallMm) }}</td>
                <td>{{ row.remarks || '—' }}</td>
              </tr>
            }
          </tbody>
        </table>
      </div>
    } @else {
      <app-empty title="No finding" hint="No inspection has recorded this flaw." />
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FindingsTable {
  /** Oldest first. */
  readonly findings = input.required<readonly FlawFinding[]>();
  protected readonly rows = computed(() => [...this.findings()].reverse());

  protected size(qualifier: string, value: number, error: number): string {
    const sign = qualifier === '=' ? '' : `${qualifier} `;
    return `${sign}${numberText(value)} ± ${numberText(error)}`;
  }

  protected number(value: number | null): string {
    return value === null ? '—' : numberText(value);
  }
}
