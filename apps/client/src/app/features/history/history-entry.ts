import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { HistoryEntry as Entry } from '@ligament/domain/contract/history';
import { DifferenceTable } from '../../shared/difference/difference-table';
import { DayPipe } from '../../shared/format/day-pipe';
import { timeOf } from './days-of-entries';
import { recordLink } from './record-link';

/** One entry: when, who, what in a sentence, why, and the values before and after. */
@Component({
  selector: 'app-history-entry',
  imports: [RouterLink, DifferenceTable, DayPipe],
  templateUrl: './history-entry.html',
  styleUrl: './history-entry.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HistoryEntryView {
  readonly entry = input.required<Entry>();
  readonly timeZone = input.required<string>();
  /** Whether the component stands in the page's heading already. */
  readonly ofOneComponent = input(false);
  protected readonly time = computed(() => timeOf(this.entry().at, this.timeZone()));
  protected readonly link = computed(() => recordLink(this.entry()));
  /** A changed record shows its values at once; a new one, which can have many, when asked. */
  protected readonly changed = computed(
    () => this.entry().before !== null && this.entry().after !== null,
  );
  protected readonly hasValues = computed(
    () => this.entry().before !== null || this.entry().after !== null,
  );
}
