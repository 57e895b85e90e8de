import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type {
  changeImport,
  ImportAnswersBody,
  ImportColumn,
  ImportView,
} from '@ligament/domain/contract/imports';
import type { BodyOf } from '@ligament/domain/contract/route';
import {
  FACES,
  FLAW_KINDS,
  INDICATION_TYPES,
  ORIENTATIONS,
} from '@ligament/domain/contract/vocabulary';
import { FINDING_FIELDS } from '@ligament/domain/inspection/finding-fields';
import { LENGTH_UNITS } from '@ligament/domain/inspection/recognise-columns';

type Change = BodyOf<typeof changeImport>;

/** What was recognised of the file, its columns, and the questions that are asked once. */
@Component({
  selector: 'app-import-questions',
  templateUrl: './import-questions.html',
  styleUrl: './import-questions.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ImportQuestions {
  readonly view = input.required<ImportView>();
  readonly open = input(false);
  readonly changed = output<Change>();

  protected readonly fields = FINDING_FIELDS;
  protected readonly units = LENGTH_UNITS;
  protected readonly kinds = FLAW_KINDS;
  protected readonly faces = FACES;
  protected readonly orientations = ORIENTATIONS;
  protected readonly types = INDICATION_TYPES;
  protected readonly delimiter = computed(
    () =>
      ({ ',': 'comma', ';': 'semicolon', '\t': 'tab', '|': 'bar' })[
        this.view().reading.delimiter
      ] ?? this.view().reading.delimiter,
  );

  protected answer(name: keyof ImportAnswersBody, value: string): void {
    this.changed.emit({ answers: { [name]: value || null } });
  }

  protected map(
    column: ImportColumn,
    change: { readonly field?: string; readonly unit?: string },
  ): void {
    const field =
      FINDING_FIELDS.find((each) => each.field === change.field)?.field ??
      (change.field === '' ? null : column.field);
    const unit =
      LENGTH_UNITS.find((each) => each === change.unit) ??
      (change.unit === '' ? null : column.unit);
    const freed = this.view().mapping.filter(
      (each) => field !== null && each.field === field && each.index !== column.index,
    );
    this.changed.emit({
      mapping: [
        { index: column.index, field, unit },
        ...freed.map((each) => ({ index: each.index, field: null, unit: each.unit })),
      ],
    });
  }
}
