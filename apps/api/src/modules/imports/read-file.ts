import { decodeText } from '@ligament/domain/inspection/decode-text';
import { detectHeader } from '@ligament/domain/inspection/detect-header';
import { detectDecimalMark } from '@ligament/domain/inspection/read-number';
import {
  headerScore,
  recogniseColumns,
  type ColumnMeaning,
} from '@ligament/domain/inspection/recognise-columns';
import type { ImportReading } from '@ligament/domain/contract/imports';
import Papa from 'papaparse';
import { unacceptable } from '../../http/failure';

/** A file as lines of cells, and how it was read. */
export interface FileRead {
  readonly reading: ImportReading;
  readonly lines: readonly (readonly string[])[];
  readonly columns: readonly ColumnMeaning[];
  readonly decimalMark: '.' | ',';
}

const MOST_LINES = 100_000;
const MOST_COLUMNS = 300;

/** Reads the bytes of an inspector's file; what is no text, or too large, is refused by name. */
export function readFile(bytes: Uint8Array): FileRead {
  const result = decodeText(bytes);
  if (result.state === 'refused') {
    throw unacceptable(
      'import.not-text',
      `This is ${result.what}, not a text file. Save the table as CSV (UTF-8) and upload that.`,
      'file',
    );
  }
  const { text, encoding, mark } = result.decoded;
  const parsed = Papa.parse<string[]>(text, {
    delimiter: delimiterOf(text),
    preview: MOST_LINES + 1,
  });
  const lines = withoutEmptyEnd(parsed.data);
  refuseSize(lines);
  const header = detectHeader(lines);
  const below = lines.slice(header + 1).flat();
  const { mark: decimalMark, comma, point } = detectDecimalMark(below);
  return {
    lines,
    columns: recogniseColumns(lines[header] ?? []),
    decimalMark,
    reading: {
      encoding,
      byteOrderMark: mark,
      delimiter: parsed.meta.delimiter,
      headerRow: header + 1,
      lines: lines.length,
      commaNumbers: comma,
      pointNumbers: point,
    },
  };
}

const DELIMITERS = [',', ';', '\t', '|'];
const FIRST_LINES = 12;

/** The delimiter under which most column names are words we know: decimal commas mislead a mere count. */
function delimiterOf(text: string): string {
  const scores = DELIMITERS.map((delimiter) => {
    const { data } = Papa.parse<string[]>(text, { delimiter, preview: FIRST_LINES });
    return Math.max(0, ...data.map(headerScore));
  });
  const best = Math.max(...scores);
  // no known word at all: the package's own guess, and the inspector maps the columns
  return best === 0 ? '' : (DELIMITERS[scores.indexOf(best)] ?? '');
}

function withoutEmptyEnd(lines: readonly string[][]): string[][] {
  const last = lines.findLastIndex((cells) => cells.some((cell) => cell.trim() !== ''));
  return lines.slice(0, last + 1);
}

function refuseSize(lines: readonly (readonly string[])[]): void {
  if (lines.length < 2) {
    throw unacceptable('import.empty', 'The file holds no line below its column names.', 'file');
  }
  if (lines.length > MOST_LINES) {
    throw unacceptable(
      'import.too-many-lines',
      `The file has more than ${MOST_LINES} lines. Split it.`,
      'file',
    );
  }
  if (lines.some((cells) => cells.length > MOST_COLUMNS)) {
    throw unacceptable(
      'import.too-many-columns',
      `A line has more than ${MOST_COLUMNS} columns. Is the delimiter right?`,
      'file',
    );
  }
}
