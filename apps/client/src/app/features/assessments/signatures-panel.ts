import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import type { AssessmentView, recomputeAssessment } from '@ligament/domain/contract/assessments';
import type { ResponseOf } from '@ligament/domain/contract/route';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { MomentPipe } from '../../shared/format/day-pipe';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { AssessmentsClient } from './assessments-client';

/** Who signed what, when and with which meaning; and the proof that it still computes to the same. */
@Component({
  selector: 'app-signatures-panel',
  imports: [MatButtonModule, MomentPipe, ProblemNotice],
  templateUrl: './signatures-panel.html',
  styles: `
    :host {
      display: block;
    }
    .hash {
      overflow-wrap: anywhere;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignaturesPanel {
  readonly view = input.required<AssessmentView>();

  private readonly client = inject(AssessmentsClient);
  protected readonly timeZone = inject(Session).site()?.timeZone ?? 'UTC';
  protected readonly again = signal<ResponseOf<typeof recomputeAssessment> | null>(null);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly busy = signal(false);

  protected recompute(): void {
    this.busy.set(true);
    this.problem.set(null);
    this.client.recompute(this.view().id).subscribe({
      next: (answer) => {
        this.busy.set(false);
        this.again.set(answer);
      },
      error: (error: unknown) => {
        this.busy.set(false);
        this.problem.set(problemOf(error));
      },
    });
  }
}
