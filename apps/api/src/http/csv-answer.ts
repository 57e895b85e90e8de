import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';

export type CsvCell = string | number | boolean | null;

/** A spreadsheet runs text that begins so as a formula; an apostrophe in front makes it text again. */
const FORMULA_START = /^[=+\-@\t\r]/;

/** One line by RFC 4180. Text is kept from being run as a formula; numbers stay numbers. */
export const csvLine = (cells: readonly CsvCell[]): string =>
  `${cells.map(cellText).join(',')}\r\n`;

function cellText(cell: CsvCell): string {
  if (cell === null) return '';
  if (typeof cell !== 'string') return String(cell);
  const safe = FORMULA_START.test(cell) ? `'${cell}` : cell;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** Answers a download of rows that need not fit into memory. */
export async function answerCsv(
  response: Response,
  fileName: string,
  header: readonly string[],
  rows: AsyncIterable<readonly CsvCell[]> | Iterable<readonly CsvCell[]>,
): Promise<void> {
  response.status(200);
  response.setHeader('Content-Type', 'text/csv; charset=utf-8; header=present');
  response.setHeader(
    'Content-Disposition',
    `attachment; filename="${fileName.replaceAll(/[^\w.-]/g, '_')}"`,
  );
  await pipeline(Readable.from(lines(header, rows)), response);
}

async function* lines(
  header: readonly string[],
  rows: AsyncIterable<readonly CsvCell[]> | Iterable<readonly CsvCell[]>,
): AsyncGenerator<string> {
  // the mark at the start tells spreadsheet programs that this is UTF-8
  yield `\uFEFF${csvLine(header)}`;
  for await (const row of rows) yield csvLine(row);
}
