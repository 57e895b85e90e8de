import type { CandidateFinding, ImportAnswers, ImportContext } from './import-context';
import { readPlace } from './read-place';
import { readShape } from './read-shape';
import { readSize } from './read-size';
import { readDate } from './read-date';
import type { ColumnMeaning } from './recognise-columns';
import { RowCells } from './row-cells';
import { ProblemList, type RowProblem } from './row-problem';

/** What a row of the file gives: a finding when nothing stops it, and every problem. */
export interface RowReading {
  readonly row: number;
  readonly finding: CandidateFinding | null;
  readonly problems: readonly RowProblem[];
}

/** Reads and checks one row against component, inspection and sense. It never throws, whatever the cells hold. */
export function readRow(
  row: number,
  cells: readonly string[],
  columns: readonly ColumnMeaning[],
  answers: ImportAnswers,
  context: ImportContext,
): RowReading {
  const problems = new ProblemList(row);
  const read = new RowCells(cells, columns, answers, problems);
  checkBelonging(read, context, problems);
  const place = readPlace(read, answers, context, problems);
  const size = readSize(read, context, problems);
  const weld = context.locations.find(({ id }) => id === place?.locationId)?.kind;
  const shape = readShape(read, answers, context, weld, size, problems);
  const indicationNo = read.text('indicationNo') || `row ${row}`;
  if (!read.text('indicationNo')) {
    problems.add(
      'check',
      'indicationNo',
      '',
      `No indication number: “row ${row}” is used. Confirm, or enter the report’s number.`,
    );
  }
  const whole = place && size && shape && !problems.all.some(({ level }) => level === 'stop');
  const finding = whole
    ? { indicationNo, ...place, ...size, ...shape, remarks: read.text('remarks').slice(0, 500) }
    : null;
  return { row, finding, problems: problems.all };
}

/** The row must be about this component and this inspection. */
function checkBelonging(read: RowCells, context: ImportContext, problems: ProblemList): void {
  const tag = read.text('componentTag');
  if (tag && tag !== context.tag) {
    const alike = plainTag(tag) === plainTag(context.tag);
    problems.add(
      alike ? 'check' : 'stop',
      'componentTag',
      tag,
      alike
        ? `“${tag}” is taken as ${context.tag}. Confirm that it is the same component.`
        : `This inspection is of ${context.tag}, the row says “${tag}”. The row is left out; import it with the inspection of that component, or correct the tag.`,
    );
  }
  const report = read.text('reportNo');
  if (report && plainTag(report) !== plainTag(context.reportNo)) {
    problems.add(
      'hold',
      'reportNo',
      report,
      `The row names report “${report}”, this inspection has report ${context.reportNo}. Confirm that it belongs here, or leave it out.`,
    );
  }
  const written = read.text('inspectionDate');
  const date = readDate(written);
  if (date.state === 'unreadable') problems.add('stop', 'inspectionDate', written, `${date.why}.`);
  if (date.state !== 'date') return;
  if (date.date > context.today) {
    problems.add(
      'stop',
      'inspectionDate',
      written,
      `${date.date} lies in the future. Correct the date.`,
    );
  } else if (context.inspectedOn && date.date !== context.inspectedOn) {
    problems.add(
      'hold',
      'inspectionDate',
      written,
      `The inspection is dated ${context.inspectedOn}, the row ${date.date}. Confirm that it belongs to this inspection, or correct one of them.`,
    );
  }
}

/** Tags compared without spaces, dashes and case. */
const plainTag = (tag: string): string =>
  tag
    .normalize('NFKC')
    .replaceAll(/[\s\-–—_./]/g, '')
    .toUpperCase();
