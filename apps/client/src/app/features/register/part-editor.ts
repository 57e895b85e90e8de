import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  output,
  signal,
} from '@angular/core';
import type { ComponentView } from '@ligament/domain/contract/components';
import type { Observable } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';
import { type Problem, problemOf } from '../../core/http/problem';
import { RecordForm, type SavedRecord } from '../../shared/record-form/record-form';
import type { RecordValue } from '../../shared/record-form/record-group';
import { fillFromPressure } from './fill-from-pressure';
import { type Part, PART_CHECKS, PART_ROUTES, partFields, type PartKind } from './part-kinds';

/** The form of one location, load case or operating cycle. */
@Component({
  selector: 'app-part-editor',
  imports: [RecordForm],
  template: `
    <h3>{{ part() ? 'Change' : 'Add' }} {{ article() }}</h3>
    <app-record-form
      [fields]="fields()"
      [checks]="checks()"
      [start]="part() ?? {}"
      [asksReason]="part() !== null"
      [problem]="problem()"
      [fill]="fill()"
      (saved)="save($event)"
      (cancelled)="cancelled.emit()"
    />
  `,
  styles: ':host { display: block; padding: 12px 0; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PartEditor {
  readonly component = input.required<ComponentView>();
  readonly kind = input.required<PartKind>();
  readonly part = input<Part | null>(null);
  readonly saved = output();
  readonly cancelled = output();
  private readonly api = inject(ApiClient);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly fields = computed(() => partFields(this.kind(), this.component()));
  protected readonly checks = computed(() => PART_CHECKS[this.kind()]);
  protected readonly fill = computed(() =>
    this.kind() === 'load case' ? fillFromPressure(this.component()) : null,
  );
  protected readonly article = computed(() =>
    this.kind() === 'operating cycle' ? 'an operating cycle' : `a ${this.kind()}`,
  );

  protected save({ value, version }: SavedRecord): void {
    this.send(value, version).subscribe({
      next: () => this.saved.emit(),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  private send(value: RecordValue, version: number): Observable<unknown> {
    const part = this.part();
    // every field has passed the check of its own kind in the form, so the body is that kind's
    const body = value as never;
    const routes = PART_ROUTES[this.kind()];
    return part
      ? this.api.call(routes.change, {
          params: { id: part.id },
          version,
          body,
        })
      : this.api.call(routes.add, { params: { id: this.component().id }, body });
  }
}
