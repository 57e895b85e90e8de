import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  signal,
} from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { Router } from '@angular/router';
import { type MaterialBody, materialBody } from '@ligament/domain/contract/materials';
import { of, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import {
  type RecordFill,
  RecordForm,
  type SavedRecord,
} from '../../shared/record-form/record-form';
import type { RecordValue } from '../../shared/record-form/record-group';
import { LoadingState } from '../../shared/states/loading-state';
import { AskToughness } from '../../shared/toughness/ask-toughness';
import { MATERIAL_FIELDS } from './material-properties';
import { MaterialsClient } from './materials-client';
import { toughnessKnown, withToughness } from './toughness-of-material';

/** Adds a material, or changes one with a reason. */
@Component({
  selector: 'app-material-form',
  imports: [PageHeader, RecordForm, LoadingState, ProblemNotice],
  template: `
    <app-page-header
      [title]="material() ? 'Change ' + material()?.name : 'Add a material'"
      [crumbs]="[{ label: 'Materials', link: '/materials' }]"
    />
    @let shown = loaded();
    @switch (shown.state) {
      @case ('loading') {
        <app-loading what="the material" />
      }
      @case ('failed') {
        <app-problem-notice [problem]="shown.problem" />
      }
      @case ('ready') {
        @if (shown.value) {
          <p class="notice">
            Assessments already made keep the values they used; {{ shown.value.components }}
            components are made of this material.
          </p>
        }
        <section class="sheet">
          <app-record-form
            [fields]="fields"
            [checks]="checks"
            [start]="start()"
            [fill]="bySource"
            [asksReason]="shown.value !== null"
            [action]="shown.value ? 'Save the change' : 'Add the material'"
            [problem]="problem()"
            (saved)="save($event)"
            (cancelled)="leave(id())"
          />
        </section>
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MaterialForm {
  /** The material to change; without it a new one is made. */
  readonly id = input<string>();
  private readonly client = inject(MaterialsClient);
  private readonly toughness = inject(AskToughness);
  private readonly router = inject(Router);
  protected readonly fields = MATERIAL_FIELDS;
  protected readonly checks = materialBody.shape;
  protected readonly problem = signal<Problem | null>(null);
  protected readonly loaded = toSignal(
    toObservable(this.id).pipe(switchMap((id) => loadable(id ? this.client.read(id) : of(null)))),
    { initialValue: LOADING },
  );
  protected readonly material = computed(() => {
    const loaded = this.loaded();
    return loaded.state === 'ready' ? loaded.value : null;
  });

  protected readonly start = linkedSignal<RecordValue>(() => ({ ...this.material() }));
  protected readonly bySource: RecordFill = {
    label: 'Toughness by its source…',
    values: (held) => {
      this.toughness
        .ask(toughnessKnown(held))
        .subscribe((answer) =>
          this.start.update((at) => withToughness({ ...at, ...held }, answer)),
        );
      return 'Value, origin and temperature stand in the form once you use a value of the dialog.';
    },
  };

  protected save({ value, version }: SavedRecord): void {
    // every field has passed the contract's check in the form
    const body = value as MaterialBody & { readonly reason: string };
    const material = this.material();
    const saved = material ? this.client.change(material.id, version, body) : this.client.add(body);
    saved.subscribe({
      next: ({ id }) => this.leave(id),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected leave(id: string | undefined): void {
    void this.router.navigate(id ? ['/materials', id] : ['/materials']);
  }
}
