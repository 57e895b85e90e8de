import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  linkedSignal,
  signal,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { SiteRulesVersion } from '@ligament/domain/contract/rules';
import { MECHANISMS, TECHNIQUES } from '@ligament/domain/contract/vocabulary';
import { BehaviorSubject, map, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { PageHeader } from '../../shared/page-header/page-header';
import { ChangedMeanwhile } from '../../shared/problem/changed-meanwhile';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { FieldError } from '../../shared/validation/field-error';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { type RulesForm, rulesForm, rulesOf } from './rules-form';
import { SiteRulesClient } from './site-rules-client';

/** Records a new version of the rules, starting from those in force. */
@Component({
  selector: 'app-record-site-rules',
  imports: [
    ReactiveFormsModule,
    RouterLink,
    MatButtonModule,
    PageHeader,
    ProblemNotice,
    ChangedMeanwhile,
    FailedState,
    LoadingState,
    FieldError,
  ],
  templateUrl: './record-site-rules.html',
  styleUrl: './record-site-rules.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RecordSiteRules {
  private readonly client = inject(SiteRulesClient);
  private readonly router = inject(Router);
  private readonly session = inject(Session);
  private readonly builder = inject(NonNullableFormBuilder);
  private readonly tries = new BehaviorSubject<void>(undefined);
  protected readonly crumbs = [
    { label: 'Site rules', link: '/site-rules' },
    { label: 'New version' },
  ];
  protected readonly mechanisms = MECHANISMS;
  protected readonly techniques = TECHNIQUES;
  protected readonly problem = signal<Problem | null>(null);
  protected readonly theirs = signal<SiteRulesVersion | null>(null);
  protected readonly busy = signal(false);
  protected readonly current = toSignal(
    this.tries.pipe(
      switchMap(() => loadable(this.client.read().pipe(map((read) => read.current)))),
    ),
    { initialValue: LOADING },
  );
  /** Filled once the rules in force are here. */
  protected readonly form = linkedSignal<RulesForm | null>(() => {
    const current = this.current();
    return current.state === 'ready' ? this.filledWith(current.value) : null;
  });
  private readonly today = computed(() =>
    new Intl.DateTimeFormat('en-CA', { timeZone: this.session.site()?.timeZone ?? 'UTC' }).format(
      new Date(),
    ),
  );

  protected record(form: RulesForm, seenNumber: number): void {
    form.markAllAsTouched();
    if (form.invalid) return;
    const { effectiveOn, reason } = form.getRawValue();
    this.busy.set(true);
    this.client.record(seenNumber, { rules: rulesOf(form), effectiveOn, reason }).subscribe({
      next: () => void this.router.navigateByUrl('/site-rules'),
      error: (error: unknown) => this.refused(form, problemOf(error)),
    });
  }

  protected mine(form: RulesForm) {
    return rulesOf(form);
  }

  protected takeTheirs(theirs: SiteRulesVersion): void {
    this.theirs.set(null);
    this.form.set(this.filledWith(theirs));
    this.again();
  }

  protected again(): void {
    this.tries.next();
  }

  private refused(form: RulesForm, problem: Problem): void {
    this.busy.set(false);
    const stale = problem.status === 412;
    this.theirs.set(stale ? (problem.current as SiteRulesVersion) : null);
    this.problem.set(stale ? null : problem);
    const errors = problem.errors.map((each) => ({
      ...each,
      field: each.field.replace(/^rules\./, ''),
    }));
    showProblemOnForm(form, { errors });
  }

  private filledWith({ rules }: SiteRulesVersion): RulesForm {
    return rulesForm(this.builder, rules, this.today());
  }
}
