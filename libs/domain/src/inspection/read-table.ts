import type { ImportAnswers, ImportContext } from './import-context';
import { readRow, type RowReading } from './read-row';
import { meaningOfHeader, type ColumnMeaning } from './recognise-columns';
import type { RowProblem } from './row-problem';

/** A line of the file below its header. */
export interface TableLine {
  /** Line of the file, counted from 1. */
  readonly row: number;
  readonly cells: readonly string[];
}

export interface TableReading {
  readonly rows: readonly RowReading[];
  /** Problems of the file as a whole. */
  readonly problems: readonly RowProblem[];
}

/** Reads all lines below the header and checks them against each other. */
export function readTable(
  lines: readonly TableLine[],
  columns: readonly ColumnMeaning[],
  answers: ImportAnswers,
  context: ImportContext,
): TableReading {
  const seen = new Map<string, number>();
  const numbers = new Map<string, number>();
  const rows = lines.map((line) => {
    const blank = emptiness(line);
    if (blank) return leftOut(line, blank);
    const same = seen.get(line.cells.join('\u0001'));
    if (same !== undefined) {
      return {
        row: line.row,
        finding: null,
        problems: [problem(line.row, 'note', `Equal to row ${same}: read once.`)],
      };
    }
    seen.set(line.cells.join('\u0001'), line.row);
    return againstNumbers(readRow(line.row, line.cells, columns, answers, context), numbers);
  });
  return { rows, problems: [...missingColumns(columns), ...secondColumns(columns)] };
}

const problem = (
  row: number,
  level: RowProblem['level'],
  message: string,
  field: string | null = null,
): RowProblem => ({
  row,
  field,
  original: '',
  level,
  message,
});

const leftOut = (line: TableLine, why: string): RowReading => ({
  row: line.row,
  finding: null,
  problems: [problem(line.row, 'note', why)],
});

/** Blank lines, separators, and lines of totals or signatures are no findings. */
function emptiness({ cells }: TableLine): string | undefined {
  const filled = cells.filter((cell) => /[\p{L}\p{N}]/u.test(cell));
  if (filled.length === 0) return 'Blank line, left out.';
  const first = filled[0] ?? '';
  const footer = /^\s*(total|sum|signature|level\s+[i123]|date|name|unterschrift)/i.test(first);
  return filled.length <= 2 && footer
    ? `Looks like a footer (“${first.trim().slice(0, 40)}”), left out.`
    : undefined;
}

/** The same number in the same weld twice is a re-measurement or a mistake. */
function againstNumbers(reading: RowReading, numbers: Map<string, number>): RowReading {
  const { finding } = reading;
  if (!finding) return reading;
  const key = `${finding.locationId} ${finding.indicationNo}`;
  const earlier = numbers.get(key);
  if (earlier === undefined) {
    numbers.set(key, reading.row);
    return reading;
  }
  const words = `Indication ${finding.indicationNo} of ${finding.locationName} stands in row ${earlier} too, with other values. Leave one row out, or correct its number.`;
  return {
    ...reading,
    finding: null,
    problems: [
      ...reading.problems,
      { ...problem(reading.row, 'stop', words, 'indicationNo'), original: finding.indicationNo },
    ],
  };
}

/** Columns without which no row can become a finding. */
function missingColumns(columns: readonly ColumnMeaning[]): RowProblem[] {
  const has = (field: string) => columns.some((column) => column.field === field);
  const missing: RowProblem[] = [];
  if (!has('weld'))
    missing.push(
      problem(0, 'stop', 'No column is recognised as the weld or place: map it below.', 'weld'),
    );
  if (!has('length'))
    missing.push(
      problem(0, 'stop', 'No column is recognised as the length: map it below.', 'length'),
    );
  if (!has('height') && !(has('depthToTop') && has('depthToBottom'))) {
    missing.push(
      problem(
        0,
        'stop',
        'No column is recognised as the height (or as both depths): map it below.',
        'height',
      ),
    );
  }
  return missing;
}

/** Columns left unread because another one is taken for the same. */
function secondColumns(columns: readonly ColumnMeaning[]): RowProblem[] {
  return columns.flatMap(({ field, header }) => {
    const meant = field === null ? meaningOfHeader(header) : null;
    const taken = meant && columns.find((each) => each.field === meant);
    return taken
      ? problem(
          0,
          'note',
          `“${header}” is not read: “${taken.header}” is taken for the same. Map it below if it is the right one.`,
          meant,
        )
      : [];
  });
}
