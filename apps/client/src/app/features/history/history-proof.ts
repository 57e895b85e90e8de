import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { type HistoryVerification, verifyHistory } from '@ligament/domain/contract/history';
import { type Problem, problemOf } from '../../core/http/problem';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { numberText } from '../../shared/quantity/quantity-text';
import { FieldError } from '../../shared/validation/field-error';
import { HistoryClient } from './history-client';

/** Has the server recompute the chain of hashes, and says what came out. */
@Component({
  selector: 'app-history-proof',
  imports: [ReactiveFormsModule, MatButtonModule, ProblemNotice, FieldError],
  templateUrl: './history-proof.html',
  styles: `
    .noted {
      max-width: 640px;
    }
    .mono {
      overflow-wrap: anywhere;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HistoryProof {
  private readonly client = inject(HistoryClient);
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly result = signal<HistoryVerification | null>(null);
  protected readonly entries = computed(() => numberText(this.result()?.entries ?? 0, 0));
  protected readonly noted = new FormControl('', {
    nonNullable: true,
    validators: (control) => {
      const text = String(control.value).trim();
      const read = verifyHistory.query.safeParse(text ? { noted: text } : {});
      return read.success ? null : { fits: read.error.issues[0]?.message };
    },
  });

  protected verify(): void {
    this.noted.markAsTouched();
    if (this.noted.invalid) return;
    this.busy.set(true);
    this.client.verify(this.noted.value.trim()).subscribe({
      next: (result) => this.show(result, null),
      error: (error: unknown) => this.show(null, problemOf(error)),
    });
  }

  private show(result: HistoryVerification | null, problem: Problem | null): void {
    this.busy.set(false);
    this.result.set(result);
    this.problem.set(problem);
  }
}
