import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  input,
  output,
  untracked,
} from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { PROVENANCES } from '@ligament/domain/units/provenance';
import { ProblemNotice } from '../problem/problem-notice';
import { FieldError } from '../validation/field-error';
import { showProblemOnForm } from '../validation/show-problem-on-form';
import type { RecordField } from './record-field';
import { type Checks, recordGroup, type RecordValue, recordValue } from './record-group';

interface ShownProblem {
  readonly title: string;
  readonly detail: string;
  readonly errors: readonly { readonly field: string; readonly message: string }[];
}

let forms = 0;

/** A form for a plain record: its fields, the contract's checks, where values come from, and why they change. */
@Component({
  selector: 'app-record-form',
  imports: [ReactiveFormsModule, MatButtonModule, ProblemNotice, FieldError],
  templateUrl: './record-form.html',
  styles: `
    .origin {
      display: grid;
      grid-template-columns: minmax(0, 2fr) minmax(0, 3fr);
      gap: 4px;
      margin-top: 4px;
    }
    .field {
      margin-bottom: 8px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RecordForm {
  readonly fields = input.required<readonly RecordField[]>();
  /** Checks by field, e.g. the shape of the contract's body. */
  readonly checks = input.required<Checks>();
  /** What the fields hold at first. */
  readonly start = input<RecordValue>({});
  readonly action = input('Save');
  /** A change of something recorded says why. */
  readonly asksReason = input(false);
  readonly problem = input<ShownProblem | null>(null);
  /** The body for the contract; every field has passed its check. */
  readonly saved = output<RecordValue>();
  readonly cancelled = output();

  protected readonly prefix = `record-${++forms}-`;
  protected readonly provenances = PROVENANCES;
  protected readonly group = computed(() =>
    recordGroup(this.fields(), this.checks(), this.start(), this.asksReason()),
  );

  constructor() {
    effect(() => {
      const problem = this.problem();
      if (problem) untracked(() => showProblemOnForm(this.group(), problem));
    });
  }

  protected save(): void {
    const group = this.group();
    group.markAllAsTouched();
    if (group.valid) this.saved.emit(recordValue(this.fields(), group));
  }
}
