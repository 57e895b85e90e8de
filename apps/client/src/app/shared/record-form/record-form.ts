import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  input,
  linkedSignal,
  output,
  signal,
  untracked,
} from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { PROVENANCES } from '@ligament/domain/units/provenance';
import { ProblemNotice } from '../problem/problem-notice';
import { FieldError } from '../validation/field-error';
import { showProblemOnForm } from '../validation/show-problem-on-form';
import { type ChangedMeanwhile, mergeMeanwhile } from './merge-meanwhile';
import type { FieldValue, RecordField } from './record-field';
import { type Checks, recordGroup, type RecordValue, recordValue } from './record-group';

interface ShownProblem {
  readonly title: string;
  readonly detail: string;
  readonly errors: readonly { readonly field: string; readonly message: string }[];
  /** The record as it stands now, when somebody else changed it meanwhile. */
  readonly current?: unknown;
}

/** What is to be saved. */
export interface SavedRecord {
  /** The body for the contract; every field has passed its check. */
  readonly value: RecordValue;
  /** Version it is saved on: that of the record last shown, also by a refusal; 0 for a new record. */
  readonly version: number;
}

/** Fills fields from what others hold, e.g. stresses from a pressure. */
export interface RecordFill {
  readonly label: string;
  /** New values by field, or the reason why there are none. */
  readonly values: (held: RecordValue) => Readonly<Record<string, FieldValue>> | string;
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
  /** Offered beside the fields where some follow from others. */
  readonly fill = input<RecordFill | null>(null);
  readonly saved = output<SavedRecord>();
  readonly cancelled = output();

  protected readonly prefix = `record-${++forms}-`;
  protected readonly provenances = PROVENANCES;
  protected readonly group = computed(() =>
    recordGroup(this.fields(), this.checks(), this.start(), this.asksReason()),
  );

  /** The record as last shown: as it was opened, or as somebody else left it meanwhile. */
  private readonly seen = linkedSignal(() => this.start());
  protected readonly meanwhile = signal<readonly ChangedMeanwhile[]>([]);
  protected readonly filled = signal('');

  constructor() {
    effect(() => {
      const problem = this.problem();
      untracked(() => (problem ? this.show(problem) : this.meanwhile.set([])));
    });
  }

  private show(problem: ShownProblem): void {
    showProblemOnForm(this.group(), problem);
    if (problem.current === null || typeof problem.current !== 'object') return;
    const current = problem.current as RecordValue;
    const [before, now] = [this.formOf(this.seen()), this.formOf(current)];
    this.meanwhile.set(mergeMeanwhile(this.fields(), this.group(), before, now));
    this.seen.set(current);
  }

  private formOf(record: RecordValue) {
    return recordGroup(this.fields(), this.checks(), record, this.asksReason());
  }

  protected fillIn(fill: RecordFill): void {
    const group = this.group();
    const values = fill.values(recordValue(this.fields(), group));
    if (typeof values === 'string') {
      this.filled.set(values);
      return;
    }
    for (const [name, value] of Object.entries(values)) {
      group.controls[name]?.setValue(value);
      group.controls[name]?.markAsDirty();
    }
    this.filled.set('Filled in. Look at the values before you save.');
  }

  protected save(): void {
    const group = this.group();
    group.markAllAsTouched();
    if (!group.valid) return;
    const version = Number(this.seen()['version'] ?? 0);
    this.saved.emit({ value: recordValue(this.fields(), group), version });
  }
}
