import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import { leakOfFlaw } from '@ligament/domain/assessment/analyses/leak-of-flaw';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { LEAK_STATEMENTS, type LeakStatement } from '@ligament/domain/growth/leak-before-break';
import { numberText } from '../../../shared/quantity/quantity-text';

/** Leak before break, asked and answered by its conditions; what a person has to state stands unticked. */
@Component({
  selector: 'app-leak-view',
  templateUrl: './leak-view.html',
  styleUrl: './leak-view.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LeakView {
  readonly input = input.required<AssessmentInput>();

  protected readonly statements = LEAK_STATEMENTS;
  protected readonly numberText = numberText;
  protected readonly stated = signal<Readonly<Partial<Record<LeakStatement, boolean>>>>({});
  protected readonly leakingLength = signal<number | null>(null);
  protected readonly factor = signal(2);
  private readonly result = computed(() =>
    leakOfFlaw(this.input(), {
      leakingLengthMm: this.leakingLength(),
      factorOnLength: this.factor(),
      statements: this.stated(),
    }),
  );
  protected readonly answer = computed(() => {
    const result = this.result();
    return result.status === 'answered' ? result : null;
  });
  protected readonly refusals = computed(() => {
    const result = this.result();
    return result.status === 'refused' ? result.refusals : [];
  });

  protected state(key: LeakStatement, met: boolean): void {
    this.stated.update((before) => ({ ...before, [key]: met }));
  }

  protected setLeakingLength(typed: number): void {
    this.leakingLength.set(Number.isFinite(typed) ? typed : null);
  }

  protected setFactor(typed: number): void {
    if (Number.isFinite(typed)) this.factor.set(typed);
  }
}
