import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  linkedSignal,
  signal,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import {
  addGrowthLaw,
  changeGrowthLaw,
  type GrowthLawView,
  listGrowthLaws,
  meetingPoint,
} from '@ligament/domain/contract/growth-laws';
import type { BodyOf } from '@ligament/domain/contract/route';
import { BehaviorSubject, switchMap } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';
import { loadable, LOADING, valueOf } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { Chart } from '../../shared/chart/chart';
import { Drawing } from '../../shared/drawing/drawing';
import { PageHeader } from '../../shared/page-header/page-header';
import { QuantityPipe } from '../../shared/quantity/quantity-pipe';
import { RecordForm, type SavedRecord } from '../../shared/record-form/record-form';
import { EmptyState } from '../../shared/states/empty-state';
import { FailedState } from '../../shared/states/failed-state';
import { LoadingState } from '../../shared/states/loading-state';
import { lawChart, lawTwin } from './law-chart';
import { formValueOf, LAW_CHECKS, lawBodyOf, lawFields } from './law-form-value';

/** The fatigue growth laws of the site, side by side, each with its source. */
@Component({
  selector: 'app-growth-law-list',
  imports: [
    MatButtonModule,
    PageHeader,
    Drawing,
    Chart,
    QuantityPipe,
    RecordForm,
    EmptyState,
    FailedState,
    LoadingState,
  ],
  templateUrl: './growth-law-list.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class GrowthLawList {
  private readonly api = inject(ApiClient);
  private readonly reload = new BehaviorSubject<null>(null);
  protected readonly session = inject(Session);
  protected readonly checks = LAW_CHECKS;
  protected readonly problem = signal<Problem | null>(null);
  /** The law whose form is open; null for a new one. */
  protected readonly open = signal<GrowthLawView | null | undefined>(undefined);

  protected readonly list = toSignal(
    this.reload.pipe(switchMap(() => loadable(this.api.call(listGrowthLaws)))),
    { initialValue: LOADING },
  );
  private readonly laws = computed(() => valueOf(this.list())?.rows ?? []);
  /** The law drawn out in the diagram; the first one until another is chosen. */
  protected readonly drawn = linkedSignal(() => this.laws()[0]?.id);
  protected readonly chart = computed(() => lawChart(this.laws(), this.drawn()));
  protected readonly twin = computed(() => lawTwin(this.laws()));
  protected readonly fields = computed(() => lawFields(this.open() === null));
  protected readonly start = computed(() => {
    const law = this.open();
    return law ? formValueOf(law) : {};
  });

  /** ΔK at which the two pieces of a law meet, if it has two. */
  protected meetsAt({ stages: [first, second] }: GrowthLawView): number | null {
    return first && second ? meetingPoint(first, second) : null;
  }

  protected edit(law: GrowthLawView | null | undefined): void {
    this.problem.set(null);
    this.open.set(law);
  }

  protected save({ value, version }: SavedRecord): void {
    const law = this.open();
    // every field has passed the contract's check in the form
    const body = lawBodyOf(value) as BodyOf<typeof addGrowthLaw> & { readonly reason: string };
    const saved = law
      ? this.api.call(changeGrowthLaw, {
          params: { id: law.id },
          version: version,
          body,
        })
      : this.api.call(addGrowthLaw, { body });
    saved.subscribe({
      next: () => {
        this.edit(undefined);
        this.again();
      },
      error: (error: unknown) => this.refused(problemOf(error)),
    });
  }

  /** A law as it stands now is shown piece by piece, as its form holds it. */
  private refused(problem: Problem): void {
    const current = problem.current as GrowthLawView | undefined;
    this.problem.set(current ? { ...problem, current: formValueOf(current) } : problem);
  }

  protected again(): void {
    this.reload.next(null);
  }
}
