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
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import {
  type InspectionBody,
  inspectionBody,
  type InspectionView,
} from '@ligament/domain/contract/inspections';
import { FACES, INSPECTION_RESULTS, TECHNIQUES } from '@ligament/domain/contract/vocabulary';
import { of, switchMap } from 'rxjs';
import { type Problem, problemOf } from '../../core/http/problem';
import { Session } from '../../core/session/session';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';
import { FieldError } from '../../shared/validation/field-error';
import { fits } from '../../shared/validation/fits';
import { showProblemOnForm } from '../../shared/validation/show-problem-on-form';
import { InspectionsClient } from './inspections-client';

const shape = inspectionBody.shape;

/** Plans an inspection or records one; changes one that is not handed over yet. */
@Component({
  selector: 'app-inspection-form',
  imports: [
    ReactiveFormsModule,
    RouterLink,
    MatButtonModule,
    PageHeader,
    ProblemNotice,
    FieldError,
  ],
  templateUrl: './inspection-form.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class InspectionForm {
  /** The inspection to change; without it a new one is made. */
  readonly id = input<string>();
  /** Component of a new inspection, when it is known. */
  readonly component = input<string>();
  /** Re-inspection task it shall fulfil. */
  readonly task = input<string>();

  private readonly client = inject(InspectionsClient);
  private readonly router = inject(Router);
  private readonly person = inject(Session).user();
  protected readonly techniques = TECHNIQUES;
  protected readonly faces = FACES;
  protected readonly results = INSPECTION_RESULTS;
  protected readonly problem = signal<Problem | null>(null);
  protected readonly words = signal('');
  protected readonly chosen = signal('');
  private version = 0;

  protected readonly form = inject(NonNullableFormBuilder).group({
    reportNo: ['', fits(shape.reportNo)],
    revision: [0, fits(shape.revision)],
    technique: ['PAUT' as InspectionBody['technique']],
    procedureNo: ['', fits(shape.procedureNo)],
    plannedOn: [null as string | null],
    inspectedOn: [null as string | null],
    inspectorName: [
      this.person?.role === 'inspector' ? this.person.name : '',
      fits(shape.inspectorName),
    ],
    certificateNo: ['', fits(shape.certificateNo)],
    certificateValidUntil: [null as string | null],
    heightErrorMm: [null as number | null, fits(shape.heightErrorMm)],
    lengthErrorMm: [null as number | null, fits(shape.lengthErrorMm)],
    sizingErrorSource: ['', fits(shape.sizingErrorSource)],
    scanSurface: ['outside' as InspectionBody['scanSurface']],
    coveragePercent: [null as number | null, fits(shape.coveragePercent)],
    limitations: ['', fits(shape.limitations)],
    result: [null as InspectionBody['result']],
    reinspectionId: [null as string | null],
  });

  protected readonly components = toSignal(
    toObservable(this.words).pipe(switchMap((words) => this.client.components(words))),
    { initialValue: [] },
  );
  private readonly existing = toSignal(
    toObservable(this.id).pipe(switchMap((id) => (id ? this.client.read(id) : of(null)))),
    { initialValue: null },
  );
  protected readonly title = computed(() =>
    this.id() ? `Change ${this.existing()?.reportNo ?? 'inspection'}` : 'New inspection',
  );

  constructor() {
    effect(() => this.chosen.set(this.component() ?? ''));
    effect(() => this.form.controls.reinspectionId.setValue(this.task() ?? null));
    effect(() => {
      const inspection = this.existing();
      if (inspection) this.show(inspection);
    });
  }

  protected save(): void {
    this.form.markAllAsTouched();
    const id = this.id();
    if (!id && !this.chosen()) {
      this.problem.set({
        status: 0,
        title: 'Something is missing',
        detail: 'Choose the component.',
        code: '',
        errors: [],
      });
      return;
    }
    if (this.form.invalid) return;
    const body = this.body();
    const saved = id
      ? this.client.change(id, this.version, body)
      : this.client.add(this.chosen(), body);
    saved.subscribe({
      next: (inspection) => void this.router.navigate(['/inspections', inspection.id]),
      error: (error: unknown) => {
        const problem = problemOf(error);
        this.problem.set(problem);
        showProblemOnForm(this.form, problem);
      },
    });
  }

  private show(inspection: InspectionView): void {
    this.version = inspection.version;
    this.chosen.set(inspection.componentId);
    this.form.patchValue(inspection);
  }

  /** An emptied date field is no date. */
  private body(): InspectionBody {
    const value = this.form.getRawValue();
    return {
      ...value,
      plannedOn: value.plannedOn || null,
      inspectedOn: value.inspectedOn || null,
      certificateValidUntil: value.certificateValidUntil || null,
    };
  }
}
