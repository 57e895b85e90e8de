import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import type { ReinspectionProposalView } from '@ligament/domain/contract/assessments';
import { judgeChosenDate } from '@ligament/domain/scheduling/judge-chosen-date';
import { map, startWith, switchMap } from 'rxjs';
import { DayPipe, DaysPipe } from '../../shared/format/day-pipe';
import { FieldError } from '../../shared/validation/field-error';
import type { ConclusionForm } from './conclusion-form';

/** By when somebody must look again: every candidate, the one that governs, and the engineer's choice. */
@Component({
  selector: 'app-due-date-panel',
  imports: [ReactiveFormsModule, DayPipe, DaysPipe, FieldError],
  templateUrl: './due-date-panel.html',
  styleUrl: './due-date-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DueDatePanel {
  readonly proposal = input.required<ReinspectionProposalView | null>();
  readonly form = input.required<ConclusionForm>();
  readonly readOnly = input(false);

  private readonly written = toSignal(
    toObservable(this.form).pipe(
      switchMap((form) =>
        form.valueChanges.pipe(
          startWith(null),
          map(() => form.getRawValue()),
        ),
      ),
    ),
    { initialValue: { conclusion: '', chosenDueOn: '', chosenReason: '' } },
  );
  protected readonly proposed = computed(() => {
    const proposal = this.proposal();
    return proposal?.status === 'proposed' ? proposal : null;
  });
  protected readonly noDate = computed(() => {
    const proposal = this.proposal();
    return proposal?.status === 'no date' ? proposal : null;
  });
  protected readonly chosen = computed(
    () => this.written().chosenDueOn || this.proposed()?.dueOn || '',
  );
  protected readonly judgement = computed(() => {
    const proposal = this.proposed();
    if (!proposal || !this.written().chosenDueOn) return null;
    return judgeChosenDate({
      proposed: proposal.dueOn,
      limitOn: proposal.limitOn,
      chosen: this.written().chosenDueOn,
      reason: this.written().chosenReason,
    });
  });
  protected readonly reason = computed(() => this.written().chosenReason);

  protected follow(): void {
    this.form().patchValue({ chosenDueOn: '', chosenReason: '' });
    this.form().markAsDirty();
  }
}
