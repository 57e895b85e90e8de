import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { LiveAnnouncer } from '@angular/cdk/a11y';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { changeImport, ImportView } from '@ligament/domain/contract/imports';
import type { BodyOf } from '@ligament/domain/contract/route';
import { switchMap } from 'rxjs';
import { loadable, LOADING } from '../../../core/http/loadable';
import { type Problem, problemOf } from '../../../core/http/problem';
import { Session } from '../../../core/session/session';
import { Chip } from '../../../shared/chips/chip';
import { Ask } from '../../../shared/dialogs/ask';
import { PageHeader } from '../../../shared/page-header/page-header';
import { ProblemNotice } from '../../../shared/problem/problem-notice';
import { FailedState } from '../../../shared/states/failed-state';
import { LoadingState } from '../../../shared/states/loading-state';
import { InspectionsClient } from '../inspections-client';
import { ImportGrid } from './import-grid';
import { ImportQuestions } from './import-questions';

/** A file as it was read: what was recognised, the questions, every row with its problems, and the commit. */
@Component({
  selector: 'app-import-page',
  imports: [
    RouterLink,
    MatButtonModule,
    PageHeader,
    Chip,
    ProblemNotice,
    FailedState,
    LoadingState,
    ImportQuestions,
    ImportGrid,
  ],
  templateUrl: './import-page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ImportPage {
  readonly id = input.required<string>();

  private readonly client = inject(InspectionsClient);
  private readonly router = inject(Router);
  private readonly ask = inject(Ask);
  private readonly announcer = inject(LiveAnnouncer);
  private readonly session = inject(Session);
  private readonly tries = signal(0);
  private readonly changed = signal<ImportView | null>(null);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly busy = signal(false);
  protected readonly loaded = toSignal(
    toObservable(computed(() => ({ id: this.id(), tries: this.tries() }))).pipe(
      switchMap(({ id }) => loadable(this.client.readImport(id))),
    ),
    { initialValue: LOADING },
  );
  /** The import as last checked by the server. */
  protected readonly view = computed(() => {
    const loaded = this.loaded();
    return this.changed() ?? (loaded.state === 'ready' ? loaded.value : null);
  });
  protected readonly open = computed(
    () => this.view()?.state === 'preview' && this.session.can('imports.write'),
  );
  protected readonly readyToCommit = computed(() => {
    const { taken, ready } = this.view()?.summary ?? { taken: 0, ready: 0 };
    return taken > 0 && taken === ready;
  });

  constructor() {
    effect(() => {
      this.loaded();
      this.changed.set(null);
    });
  }

  protected change(body: BodyOf<typeof changeImport>): void {
    const view = this.view();
    if (!view) return;
    this.busy.set(true);
    this.client.changeImport(view.id, view.version, body).subscribe({
      next: (changed) => {
        this.busy.set(false);
        this.problem.set(null);
        this.changed.set(changed);
        void this.announcer.announce(
          `${changed.summary.ready} of ${changed.summary.taken} rows are ready.`,
        );
      },
      error: (error: unknown) => {
        this.busy.set(false);
        this.problem.set(problemOf(error));
      },
    });
  }

  protected commit(view: ImportView): void {
    const text = `${view.summary.taken} findings of report ${view.reportNo} are stored in one step, each with its flaw. Nothing is accepted until an engineer accepts the report.`;
    this.ask.confirm({ title: 'Commit the file?', text, action: 'Commit' }).subscribe(() => {
      this.busy.set(true);
      this.client.commitImport(view.id).subscribe({
        next: () => void this.router.navigate(['/inspections', view.inspectionId]),
        error: (error: unknown) => {
          this.busy.set(false);
          this.problem.set(problemOf(error));
        },
      });
    });
  }

  protected discard(view: ImportView): void {
    const text = 'The file stays with the inspection; no finding is stored.';
    this.ask.confirm({ title: 'Give up this import?', text, action: 'Give up' }).subscribe(() => {
      this.client.discardImport(view.id).subscribe({
        next: () => void this.router.navigate(['/inspections', view.inspectionId]),
        error: (error: unknown) => this.problem.set(problemOf(error)),
      });
    });
  }

  protected problemsAddress(view: ImportView): string {
    return this.client.problemsAddress(view.id);
  }

  protected again(): void {
    this.tries.update((each) => each + 1);
  }
}
