import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { Router } from '@angular/router';
import { type ComponentBody, componentBody } from '@ligament/domain/contract/components';
import { forkJoin, of, switchMap } from 'rxjs';
import { loadable, LOADING } from '../../core/http/loadable';
import { type Problem, problemOf } from '../../core/http/problem';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { RecordForm, type SavedRecord } from '../../shared/record-form/record-form';
import type { RecordValue } from '../../shared/record-form/record-group';
import { LoadingState } from '../../shared/states/loading-state';
import { componentFields } from './component-fields';
import { RegisterClient } from './register-client';

/** Adds a component to the register, or changes one with a reason. */
@Component({
  selector: 'app-component-form',
  imports: [PageHeader, RecordForm, LoadingState, ProblemNotice],
  template: `
    <app-page-header [title]="title()" [crumbs]="[{ label: 'Register', link: '/register' }]" />
    @let shown = loaded();
    @switch (shown.state) {
      @case ('loading') {
        <app-loading what="the data sheet" />
      }
      @case ('failed') {
        <app-problem-notice [problem]="shown.problem" />
      }
      @case ('ready') {
        @if (shown.value.component) {
          <p class="notice">
            Assessments already approved keep the values they were computed with. After a change of
            pressure, wall or material, assess the flaws of this component again.
          </p>
        }
        <section class="sheet">
          <app-record-form
            [fields]="fields()"
            [checks]="checks"
            [start]="start()"
            [asksReason]="shown.value.component !== null"
            [action]="shown.value.component ? 'Save the change' : 'Add the component'"
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
export class ComponentForm {
  /** The component to change; without it a new one is made. */
  readonly id = input<string>();
  private readonly client = inject(RegisterClient);
  private readonly router = inject(Router);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly checks = componentBody.shape;

  protected readonly loaded = toSignal(
    toObservable(this.id).pipe(
      switchMap((id) =>
        loadable(
          forkJoin({
            units: this.client.units(),
            materials: this.client.materials(),
            component: id ? this.client.read(id) : of(null),
          }),
        ),
      ),
    ),
    { initialValue: LOADING },
  );
  private readonly ready = computed(() => {
    const loaded = this.loaded();
    return loaded.state === 'ready' ? loaded.value : null;
  });
  protected readonly fields = computed(() =>
    componentFields(
      (this.ready()?.units ?? []).map(({ id, code, name }) => ({
        value: id,
        label: `${code} ${name}`,
      })),
      (this.ready()?.materials ?? []).map(({ id, name }) => ({ value: id, label: name })),
    ),
  );
  protected readonly start = computed((): RecordValue => this.ready()?.component ?? {});
  protected readonly title = computed(() =>
    this.id() ? `Change ${this.ready()?.component?.tag ?? 'component'}` : 'Add a component',
  );

  protected save({ value, version }: SavedRecord): void {
    // every field has passed the contract's check in the form
    const body = value as ComponentBody & { readonly reason: string };
    const component = this.ready()?.component;
    const saved = component
      ? this.client.change(component.id, version, body)
      : this.client.add(body);
    saved.subscribe({
      next: ({ id }) => this.leave(id),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected leave(id: string | undefined): void {
    void this.router.navigate(id ? ['/register', id] : ['/register']);
  }
}
