import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { ReinspectionRow } from '@ligament/domain/contract/reinspections';
import type { WindowView } from '@ligament/domain/contract/shutdown-windows';
import { dayText } from '../../shared/format/day-text';
import { boardScale } from './board-scale';

/** Re-inspections on a time axis: the bar ends at the due date, the pale one at the predicted limit. */
@Component({
  selector: 'app-schedule-board',
  imports: [RouterLink],
  templateUrl: './schedule-board.html',
  styleUrl: './schedule-board.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ScheduleBoard {
  readonly rows = input.required<readonly ReinspectionRow[]>();
  readonly windows = input.required<readonly WindowView[]>();

  /** The day it is: every row says how many days are left to its date. */
  protected readonly today = computed(() => {
    const row = this.rows()[0];
    return row ? shifted(row.dueOn, -row.daysLeft) : new Date().toISOString().slice(0, 10);
  });
  protected readonly scale = computed(() =>
    boardScale(
      this.today(),
      this.rows().flatMap(({ dueOn }) => [dueOn]),
    ),
  );
  protected readonly bands = computed(() => {
    const { place, from, to } = this.scale();
    return this.windows()
      .filter(
        ({ state, startsOn, endsOn }) => state !== 'cancelled' && endsOn >= from && startsOn <= to,
      )
      .map(({ code, startsOn, endsOn, unitCodes }) => ({
        code,
        unitCodes,
        left: place(startsOn),
        width: Math.max(0.35, place(endsOn) - place(startsOn)),
        words: `${code}, ${unitCodes.join(', ')}, ${dayText(startsOn)} to ${dayText(endsOn)}`,
      }));
  });
  protected readonly lines = computed(() => {
    const { place } = this.scale();
    const now = place(this.today());
    return this.rows().map((row) => {
      const due = place(row.dueOn);
      const limit = row.limitOn ? place(row.limitOn) : due;
      return {
        row,
        due,
        left: Math.min(now, due),
        width: Math.abs(due - now),
        limitLeft: due,
        limitWidth: Math.max(0, limit - due),
        planned: row.plannedOn ? place(row.plannedOn) : null,
        tone: row.urgency === 'overdue' ? 'bad' : row.urgency === 'due soon' ? 'warn' : 'good',
        // words stand beside the bar, on the side where there is room
        wordsLeft:
          Math.max(due, limit) < 62
            ? Math.max(due, limit, row.plannedOn ? place(row.plannedOn) : 0) + 1
            : null,
        words: `${row.tag} ${row.task}: due ${dayText(row.dueOn)}, ${row.fit}`,
      };
    });
  });
  protected readonly day = dayText;
}

/** A calendar date some days later or earlier. */
const shifted = (date: string, days: number): string =>
  new Date(Date.parse(`${date}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10);
