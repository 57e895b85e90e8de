import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  output,
  signal,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import type {
  changeImport,
  ImportColumn,
  ImportRow,
  ImportView,
} from '@ligament/domain/contract/imports';
import type { BodyOf } from '@ligament/domain/contract/route';
import { fieldNamed } from '@ligament/domain/inspection/finding-fields';
import { Chip } from '../../../shared/chips/chip';
import { Ask } from '../../../shared/dialogs/ask';
import { columnOfField, worstLevel } from './grid-words';

type Change = BodyOf<typeof changeImport>;

/** Rows shown at once; a longer file is shown in parts so that the page stays quick. */
const SHOWN = 200;

/** Every row of the file with its problems; cells are corrected in place, rows taken, confirmed or left out. */
@Component({
  selector: 'app-import-grid',
  imports: [MatButtonModule, Chip],
  templateUrl: './import-grid.html',
  styleUrl: './import-grid.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ImportGrid {
  readonly view = input.required<ImportView>();
  readonly open = input(false);
  readonly changed = output<Change>();

  private readonly ask = inject(Ask);
  protected readonly onlyProblems = signal(false);
  protected readonly from = signal(0);
  protected readonly columns = computed(() =>
    this.view().mapping.filter(({ field }) => field !== null),
  );
  private readonly kept = computed(() =>
    this.view().rows.filter((row) => !this.onlyProblems() || (row.decision.take && !row.ready)),
  );
  protected readonly rows = computed(() => this.kept().slice(this.from(), this.from() + SHOWN));
  protected readonly more = computed(() => this.kept().length > this.from() + SHOWN);
  protected readonly worst = worstLevel;
  protected readonly shown = SHOWN;

  protected label(column: ImportColumn): string {
    return fieldNamed(column.field ?? '')?.label ?? column.header;
  }

  protected problemOf(row: ImportRow, column: ImportColumn): boolean {
    return row.problems.some(({ field, level }) => field === column.field && level !== 'note');
  }

  protected cellOf(row: ImportRow, field: string | null): string {
    const column = columnOfField(this.view(), field);
    return column ? `cell-${row.row}-${column.index}` : `row-${row.row}`;
  }

  protected jump(id: string): void {
    document.getElementById(id)?.focus();
  }

  protected correct(row: ImportRow, column: ImportColumn, value: string): void {
    const before = row.cells[column.index] ?? '';
    if (value === before) return;
    const text = `Row ${row.row}, ${this.label(column)}: “${before || 'empty'}” becomes “${value || 'empty'}”. Both are kept.`;
    this.ask
      .reason({ title: 'Correct this cell', text, label: 'Why', action: 'Correct' })
      .subscribe(({ reason }) =>
        this.changed.emit({ corrections: [{ row: row.row, column: column.index, value, reason }] }),
      );
  }

  protected decide(row: ImportRow, change: Partial<ImportRow['decision']>): void {
    this.changed.emit({ decisions: [{ ...row.decision, ...change }] });
  }

  protected choose(row: ImportRow, value: string): void {
    const flaw =
      value === 'new'
        ? ({ kind: 'new' } as const)
        : value
          ? ({ kind: 'continues', flawId: value } as const)
          : null;
    this.decide(row, { flaw });
  }

  protected target(row: ImportRow): string {
    const { flaw } = row.decision;
    return flaw === null ? '' : flaw.kind === 'new' ? 'new' : flaw.flawId;
  }

  protected needsConfirming(row: ImportRow): boolean {
    return row.problems.some(({ level }) => level === 'hold' || level === 'check');
  }
}
