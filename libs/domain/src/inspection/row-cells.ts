import type { FieldName } from './finding-fields';
import type { ImportAnswers } from './import-context';
import { mayBeThousands, readNumber, type NumberRead } from './read-number';
import type { ColumnMeaning, LengthUnit } from './recognise-columns';
import type { ProblemList } from './row-problem';
import { toMillimetres } from './to-millimetres';

/** The cells of one row by what they mean. */
export class RowCells {
  constructor(
    private readonly cells: readonly string[],
    private readonly columns: readonly ColumnMeaning[],
    private readonly answers: ImportAnswers,
    private readonly problems: ProblemList,
  ) {}

  /** Text of a field; empty when there is no such column. */
  text(field: FieldName): string {
    const column = this.columns.find((each) => each.field === field);
    return column ? (this.cells[column.index] ?? '').trim() : '';
  }

  /** Name of the field's column as the file gives it; empty when there is none. */
  header(field: FieldName): string {
    return this.columns.find((each) => each.field === field)?.header ?? '';
  }

  /** Unit of a field's column; null when its header names none. */
  headerUnit(field: FieldName): LengthUnit | null {
    return this.columns.find((each) => each.field === field)?.unit ?? null;
  }

  /** A number as the file gives it, problems told; undefined when missing or unreadable. */
  number(field: FieldName): NumberRead | undefined {
    const cell = this.text(field);
    const result = readNumber(cell, this.answers.decimalMark);
    if (result.state === 'number') {
      if (mayBeThousands(cell, this.answers.decimalMark)) {
        this.problems.add(
          'hold',
          field,
          cell,
          `“${cell}” is read as ${result.read.value}, its mark as one of thousands; it may be a decimal mark. Confirm, correct the cell, or choose the file’s decimal mark above.`,
        );
      }
      return result.read;
    }
    if (result.state === 'unreadable') {
      this.problems.add(
        'stop',
        field,
        cell,
        `${result.why}. The row is left out; correct the cell.`,
      );
    }
    return undefined;
  }

  /** A length in millimetres by the unit of the cell, of the header, or as answered for the file. */
  length(field: FieldName): (NumberRead & { readonly mm: number }) | undefined {
    const read = this.number(field);
    if (!read) return undefined;
    const headerUnit = this.headerUnit(field);
    if (read.unit && headerUnit && read.unit !== headerUnit) {
      const words = `The cell says ${read.unit}, its column ${headerUnit}. The cell’s own unit is used; confirm or correct it.`;
      this.problems.add('hold', field, this.text(field), words);
    }
    const unit = read.unit ?? headerUnit ?? this.answers.lengthUnit;
    if (!unit) {
      this.problems.add(
        'stop',
        field,
        this.text(field),
        'No unit is stated for this length. Choose the file’s unit above; it is never guessed.',
      );
      return undefined;
    }
    return { ...read, mm: toMillimetres(read.value, unit) };
  }
}
