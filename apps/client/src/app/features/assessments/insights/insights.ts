import { ChangeDetectionStrategy, Component, input, signal } from '@angular/core';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { LeakView } from './leak-view';
import { LocusView } from './locus-view';
import { SensitivityView } from './sensitivity-view';
import { TipView } from './tip-view';

/** Further questions about an assessed flaw, each computed when it is opened. */
@Component({
  selector: 'app-insights',
  imports: [LeakView, LocusView, SensitivityView, TipView],
  templateUrl: './insights.html',
  styleUrl: './insights.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Insights {
  readonly input = input.required<AssessmentInput>();

  protected readonly open = signal<ReadonlySet<string>>(new Set());

  protected toggle(name: string, isOpen: boolean): void {
    if (isOpen === this.open().has(name)) return;
    this.open.update((open) => {
      const next = new Set(open);
      if (isOpen) next.add(name);
      else next.delete(name);
      return next;
    });
  }
}
