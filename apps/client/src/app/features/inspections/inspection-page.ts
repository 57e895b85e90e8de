import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { InspectionView } from '@ligament/domain/contract/inspections';
import { combineLatest, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Chip } from '../../shared/chips/chip';
import { Ask } from '../../shared/dialogs/ask';
import { FileDrop } from '../../shared/files/file-drop';
import { DayPipe, MomentPipe } from '../../shared/format/day-pipe';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { InspectionsClient, type Step } from './inspections-client';

/** One inspection: what it says, what is still missing, its findings and files, and the next step of each role. */
@Component({
  selector: 'app-inspection-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    Chip,
    FileDrop,
    DayPipe,
    MomentPipe,
    QuantityPipe,
    DecimalPipe,
    ProblemNotice,
    FailedState,
    LoadingState,
  ],
  templateUrl: './inspection-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InspectionPage {
  readonly id = input.required<string>();

  private readonly client = inject(InspectionsClient);
  private readonly router = inject(Router);
  private readonly ask = inject(Ask);
  protected readonly session = inject(Session);
  private readonly tries = signal(0);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly page = toSignal(
    toObservable(computed(() => ({ id: this.id(), tries: this.tries() }))).pipe(
      switchMap(({ id }) =>
        loadable(
          combineLatest({ inspection: this.client.read(id), findings: this.client.findings(id) }),
        ),
      ),
    ),
    { initialValue: LOADING },
  );

  protected isOpen({ state }: InspectionView): boolean {
    return state === 'planned' || state === 'in progress' || state === 'rejected';
  }

  protected mayAccept(inspection: InspectionView): boolean {
    const own = inspection.submittedById === this.session.user()?.id;
    return inspection.state === 'submitted' && this.session.can('inspections.accept') && !own;
  }

  protected address(documentId: string): string {
    return this.client.documentAddress(documentId);
  }

  protected move(step: Step, inspection: InspectionView): void {
    const go = (reason: string) =>
      this.client.move(step, inspection.id, inspection.version, reason).subscribe({
        next: () => this.again(),
        error: (error: unknown) => this.problem.set(problemOf(error)),
      });
    if (step === 'submit' || step === 'accept') {
      go('');
      return;
    }
    const title = step === 'reject' ? 'Send the report back' : 'Declare the inspection void';
    const text =
      step === 'reject'
        ? 'The inspector sees the reason and can change the report.'
        : 'Its findings no longer count; the record of it stays.';
    this.ask
      .reason({ title, text, label: 'Reason', action: title })
      .subscribe(({ reason }) => go(reason));
  }

  protected importFile(file: File): void {
    this.client.startImport(this.id(), file).subscribe({
      next: (started) => void this.router.navigate(['/inspections/imports', started.id]),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected attach(file: File): void {
    this.client.attach(this.id(), file).subscribe({
      next: () => this.again(),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected again(): void {
    this.problem.set(null);
    this.tries.update((each) => each + 1);
  }
}
