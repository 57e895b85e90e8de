import { componentBody, type ComponentBody } from '@ligament/domain/contract/components';
import type { RegisterPreview } from '@ligament/domain/contract/register-import';
import { readNumber } from '@ligament/domain/inspection/read-number';
import Papa from 'papaparse';
import { plainHeader, REGISTER_COLUMNS, type RegisterColumn } from './register-columns';

/** What the cells of a register table may refer to. */
export interface RegisterNames {
  readonly units: ReadonlyMap<string, string>;
  readonly materials: ReadonlyMap<string, string>;
  /** Tags already in the register, as `plainTag` spells them. */
  readonly tags: ReadonlySet<string>;
}

export interface RegisterRead {
  readonly preview: Omit<RegisterPreview, 'fileName' | 'csv'>;
  /** Components that can be added, in the order of the file. */
  readonly components: readonly ComponentBody[];
}

type Problem = RegisterPreview['rows'][number]['problems'][number];
const MOST_ROWS = 2000;

/** Reads a register table and checks every row by the contract of a component. */
export function readRegister(csv: string, names: RegisterNames): RegisterRead {
  const [{ cells: headers } = { cells: [] }, ...lines] = linesOf(csv);
  const missing = REGISTER_COLUMNS.filter(
    ({ header, optional }) => !optional && !headers.map(plainHeader).includes(header),
  );
  const problems = missing.map(({ header }) => `The column “${header}” is missing.`);
  if (lines.length === 0) problems.push('The table holds no row below its column names.');
  if (lines.length > MOST_ROWS)
    problems.push(`The table has more than ${MOST_ROWS} rows: split it.`);
  const seen = new Set<string>();
  const read =
    problems.length > 0
      ? []
      : lines.map(({ cells, row }) => readLine(cells, row, headers, names, seen));
  const known = new Set(REGISTER_COLUMNS.map(({ header }) => header));
  return {
    preview: {
      columns: headers.map((header) => ({ header, known: known.has(plainHeader(header)) })),
      rows: read.map(({ row }) => row),
      problems,
    },
    components: read.flatMap(({ component }) => component ?? []),
  };
}

interface Line {
  /** Line of the file at which it starts, counted from 1. */
  readonly row: number;
  readonly cells: readonly string[];
}

/** The lines of a table that hold something, each with its number: blank lines and line breaks in cells are counted. */
function linesOf(csv: string): Line[] {
  let row = 1;
  const lines: Line[] = [];
  for (const cells of Papa.parse<string[]>(csv).data) {
    if (cells.some((cell) => cell.trim() !== '')) lines.push({ row, cells });
    row += 1 + cells.join('').split(/\r\n|\r|\n/).length - 1;
  }
  return lines;
}

/** A tag in the spelling by which two are the same. */
export const plainTag = (tag: string): string => tag.toLowerCase();

function readLine(
  cells: readonly string[],
  row: number,
  headers: readonly string[],
  names: RegisterNames,
  seen: Set<string>,
): { row: RegisterPreview['rows'][number]; component?: ComponentBody } {
  const problems: Problem[] = [];
  const cell = (header: string) =>
    (cells[headers.findIndex((each) => plainHeader(each) === header)] ?? '').trim();
  const values = Object.fromEntries(
    REGISTER_COLUMNS.map((column) => [
      column.field,
      valueOf(column, cell(column.header), row, names, problems),
    ]),
  );
  const tag = cell('tag');
  const shown = { row, tag, description: cell('description') };
  if (names.tags.has(plainTag(tag)))
    return { row: { ...shown, state: 'already in the register', problems: [] } };
  if (seen.has(plainTag(tag)))
    problems.push({
      row,
      column: 'tag',
      original: tag,
      message: 'This tag stands in an earlier row of the file.',
    });
  seen.add(plainTag(tag));
  const parsed = componentBody.safeParse(values);
  if (!parsed.success) {
    for (const issue of parsed.error.issues) {
      const column = REGISTER_COLUMNS.find(({ field }) => field === issue.path[0])?.header ?? 'row';
      if (!problems.some((each) => each.column === column)) {
        problems.push({
          row,
          column,
          original: cell(column),
          message: issue.message.includes('expected one of')
            ? `“${cell(column)}” is not one of the words known here.${choices(column)}`
            : issue.message,
        });
      }
    }
  }
  return problems.length === 0 && parsed.success
    ? { row: { ...shown, state: 'new', problems }, component: parsed.data }
    : { row: { ...shown, state: 'cannot be taken', problems } };
}

function valueOf(
  column: RegisterColumn,
  text: string,
  row: number,
  names: RegisterNames,
  problems: Problem[],
): unknown {
  if (text === '' && column.optional) return column.fallback;
  const refuse = (message: string) => {
    problems.push({ row, column: column.header, original: text, message });
    return undefined;
  };
  switch (column.kind) {
    case 'text':
      return text;
    case 'number': {
      const read = readNumber(text, '.');
      return read.state === 'number'
        ? read.read.value
        : refuse('Give a number with a decimal point, in the unit of the column name.');
    }
    case 'unit':
      return (
        names.units.get(text) ??
        refuse(
          `There is no unit “${text}”. Known: ${[...names.units.keys()].join(', ') || 'none yet'}.`,
        )
      );
    case 'material':
      return (
        names.materials.get(text) ??
        refuse(`There is no material “${text}”. Add it under Materials first, or correct the name.`)
      );
  }
}

/** The words a column takes, where it takes only some. */
function choices(column: string): string {
  const field = REGISTER_COLUMNS.find(({ header }) => header === column)?.field;
  const shape: Readonly<Record<string, unknown>> = componentBody.shape;
  const part = field ? shape[field] : undefined;
  const options =
    typeof part === 'object' && part !== null && 'options' in part ? part.options : undefined;
  return Array.isArray(options) && typeof options[0] === 'string'
    ? ` Use one of: ${options.join(', ')}.`
    : '';
}
