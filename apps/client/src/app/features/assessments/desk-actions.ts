import { inject, Injectable, signal } from '@angular/core';
import type { AssessmentView } from '@ligament/domain/contract/assessments';
import { type Observable, of, switchMap } from 'rxjs';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Ask } from '../../shared/dialogs/ask';
import { dayText } from '../../shared/format/day-text';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { AssessmentDesk } from './assessment-desk';
import { AssessmentsClient } from './assessments-client';

/** What is done with the assessment on the desk: saved, sent, returned, approved. */
@Injectable()
export class DeskActions {
  private readonly desk = inject(AssessmentDesk);
  private readonly client = inject(AssessmentsClient);
  private readonly session = inject(Session);
  private readonly ask = inject(Ask);

  readonly busy = signal(false);
  readonly problem = signal<Problem | null>(null);
  readonly said = signal('');
  /** What is recorded, when somebody else saved first. */
  readonly theirs = signal<AssessmentView | null>(null);

  save(over: AssessmentView): void {
    this.desk.form.markAllAsTouched();
    if (this.desk.form.invalid) return;
    this.run(this.saved(over), 'The draft is saved.');
  }

  send(view: AssessmentView): void {
    this.desk.form.markAllAsTouched();
    if (this.desk.form.invalid) return;
    this.ask
      .confirm({
        title: 'Send for the independent check?',
        text: 'You sign it as its author. Inputs, results, date and conclusion are fixed until it is approved or returned to you.',
        action: 'Sign and send',
      })
      .subscribe(() => {
        const ready = this.desk.hasUnsaved() ? this.saved(view) : of(view);
        this.run(
          ready.pipe(switchMap(({ id, version }) => this.client.submit(id, version))),
          'Sent for check, signed by you as author.',
        );
      });
  }

  giveBack({ id, version }: AssessmentView): void {
    this.ask
      .reason({
        title: 'Return it to its author',
        text: 'The author sees your reason and can change and send it again.',
        label: 'What is wrong, and what to do about it',
        action: 'Return',
      })
      .subscribe(({ reason }) =>
        this.run(this.client.giveBack(id, version, reason), 'Returned to its author.'),
      );
  }

  approve({ id, version, chosenDueOn }: AssessmentView): void {
    this.ask
      .reason({
        title: 'Approve',
        text: `You sign that you checked and approved this assessment. It is in force from now on${
          chosenDueOn ? `, and its re-inspection is due by ${dayText(chosenDueOn)}` : ''
        }. An approved assessment never changes.`,
        label: 'Comment (may be left empty)',
        action: 'Sign and approve',
        optional: true,
        password: true,
      })
      .subscribe(({ reason, password }) =>
        this.run(
          this.session
            .prove(password)
            .pipe(switchMap(() => this.client.approve(id, version, reason))),
          'Approved and in force.',
        ),
      );
  }

  takeTheirs(theirs: AssessmentView): void {
    this.settle('', null);
    this.desk.show(theirs);
  }

  private saved({ id, version }: AssessmentView): Observable<AssessmentView> {
    return this.client.change(id, version, this.desk.body());
  }

  private run(request: Observable<AssessmentView>, said: string): void {
    this.busy.set(true);
    request.subscribe({
      next: (view) => {
        this.settle(said, null);
        this.desk.show(view);
      },
      error: (error: unknown) => this.refused(problemOf(error)),
    });
  }

  private refused(problem: Problem): void {
    const current = problem.status === 412 ? (problem.current as AssessmentView) : null;
    if (current && this.desk.hasUnsaved()) {
      this.settle('', null);
      this.theirs.set(current);
      return;
    }
    this.settle('', problem);
    if (current) this.desk.show(current);
    else showProblemOnForm(this.desk.form, problem);
  }

  private settle(said: string, problem: Problem | null): void {
    this.busy.set(false);
    this.said.set(said);
    this.problem.set(problem);
    this.theirs.set(null);
  }
}
