import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router } from '@angular/router';
import type { LoadCaseView } from '@ligament/domain/contract/components';
import type { FlawView } from '@ligament/domain/contract/flaws';
import type { GrowthLawView } from '@ligament/domain/contract/growth-laws';
import { type Problem, problemOf } from '../../core/http/problem';
import { DayPipe } from '../../shared/format/day-pipe';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FlawsClient } from './flaws-client';

/** Starts an assessment from the register's data; other data than the usual can be chosen first. */
@Component({
  selector: 'app-start-assessment',
  imports: [MatButtonModule, ProblemNotice, DayPipe],
  templateUrl: './start-assessment.html',
  styles: `
    :host {
      display: block;
      margin-bottom: 16px;
    }
    details {
      margin: 8px 0 12px;
    }
    summary {
      cursor: pointer;
      color: var(--steel);
    }
    .form-grid {
      margin-top: 8px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StartAssessment {
  readonly flaw = input.required<FlawView>();

  private readonly client = inject(FlawsClient);
  private readonly router = inject(Router);
  protected readonly loadCases = signal<readonly LoadCaseView[]>([]);
  protected readonly laws = signal<readonly GrowthLawView[]>([]);
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  private asked = false;

  /** What can be chosen is fetched when somebody looks. */
  protected look(): void {
    if (this.asked) return;
    this.asked = true;
    const failed = (error: unknown) => this.problem.set(problemOf(error));
    this.client
      .loadCases(this.flaw().componentId)
      .subscribe({ next: (found) => this.loadCases.set(found), error: failed });
    this.client.growthLaws().subscribe({ next: (found) => this.laws.set(found), error: failed });
  }

  protected start(findingId = '', loadCaseId = '', growthLawId = ''): void {
    this.busy.set(true);
    this.problem.set(null);
    const body = {
      ...(findingId ? { findingId } : {}),
      ...(loadCaseId ? { loadCaseId } : {}),
      ...(growthLawId ? { growthLawId } : {}),
    };
    this.client.start(this.flaw().id, body).subscribe({
      next: ({ id }) => void this.router.navigate(['/assessments', id]),
      error: (error: unknown) => {
        this.busy.set(false);
        this.problem.set(problemOf(error));
      },
    });
  }
}
