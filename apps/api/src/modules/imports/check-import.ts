import type { ImportColumn, ImportDecision, ImportRow } from '@ligament/domain/contract/imports';
import type { CandidateFinding, ImportContext } from '@ligament/domain/inspection/import-context';
import type { RowReading } from '@ligament/domain/inspection/read-row';
import { readTable, type TableReading } from '@ligament/domain/inspection/read-table';
import type { Database } from '../../db/database';
import { locationsOf } from '../components/component-of-site';
import type { ComponentRecord } from '../components/component.repository';
import { flawsOfLocation } from '../flaws/flaws-of-location';
import type { InspectionRecord } from '../inspections/inspection.repository';
import type { ImportRecord } from './import.repository';
import { readFile } from './read-file';

/** Flaws this near along a weld may be the same: the inspector then says so, or says that it is new [mm]. */
const NEAR_MM = 100;

export interface CheckedImport {
  readonly rows: readonly ImportRow[];
  readonly problems: TableReading['problems'];
}

/** Reads the kept bytes again with the mapping, answers and corrections as they stand, and checks every row. */
export async function checkImport(
  db: Database,
  found: {
    record: ImportRecord;
    inspection: InspectionRecord;
    component: ComponentRecord;
    bytes: Uint8Array;
  },
  today: string,
): Promise<CheckedImport> {
  const { record, inspection, component, bytes } = found;
  const { lines, reading } = readFile(bytes);
  const context = await contextOf(db, inspection, component, today);
  const below = correctedLines(lines, reading.headerRow, record);
  const table = readTable(below, record.mapping, record.reading.answers, context);
  const known = new Map<string, Awaited<ReturnType<typeof flawsOfLocation>>>();
  for (const locationId of new Set(
    table.rows.flatMap(({ finding }) => finding?.locationId ?? []),
  )) {
    known.set(locationId, await flawsOfLocation(db, locationId));
  }
  const rows = table.rows.map((row, index) =>
    importRow(row, below[index]?.cells ?? [], record, candidatesFor(row.finding, known)),
  );
  return { rows: refuseDoubleClaims(rows.map(refuseForeignFlaw)), problems: table.problems };
}

async function contextOf(
  db: Database,
  inspection: InspectionRecord,
  component: ComponentRecord,
  today: string,
): Promise<ImportContext> {
  return {
    tag: component.tag,
    reportNo: inspection.reportNo,
    wallMm: component.wallMm,
    insideDiameterMm: component.insideDiameterMm,
    locations: await locationsOf(db, component.id),
    inspectedOn: inspection.inspectedOn,
    today,
    scanSurface: inspection.scanSurface,
    heightErrorMm: inspection.heightErrorMm,
    lengthErrorMm: inspection.lengthErrorMm,
  };
}

function correctedLines(
  lines: readonly (readonly string[])[],
  headerRow: number,
  record: ImportRecord,
) {
  return lines.slice(headerRow).map((cells, index) => {
    const row = headerRow + index + 1;
    const corrections = record.corrections.filter((each) => each.row === row);
    const width = Math.max(
      cells.length,
      ...record.mapping.map((column: ImportColumn) => column.index + 1),
    );
    const padded = Array.from({ length: width }, (_, column) => cells[column] ?? '');
    for (const { column, value } of corrections) padded[column] = value;
    return { row, cells: padded };
  });
}

type Candidates = ImportRow['candidates'];

function candidatesFor(
  finding: CandidateFinding | null,
  known: ReadonlyMap<string, Awaited<ReturnType<typeof flawsOfLocation>>>,
): Candidates {
  if (!finding) return [];
  return (known.get(finding.locationId) ?? [])
    .map((flaw) => ({
      flawId: flaw.flawId,
      number: flaw.number,
      distanceMm: distance(finding, flaw),
      heightMm: flaw.heightMm,
      lengthMm: flaw.lengthMm,
      inspectedOn: flaw.inspectedOn,
    }))
    .sort((a, b) => (a.distanceMm ?? Infinity) - (b.distanceMm ?? Infinity));
}

interface Place {
  readonly axialMm: number | null;
  readonly circumferentialMm: number | null;
}

/** Distance along the weld, or around when no position along it is known. */
function distance(a: Place, b: Place): number | null {
  if (a.axialMm !== null && b.axialMm !== null) return Math.abs(a.axialMm - b.axialMm);
  if (a.circumferentialMm !== null && b.circumferentialMm !== null) {
    return Math.abs(a.circumferentialMm - b.circumferentialMm);
  }
  return null;
}

function importRow(
  { row, finding, problems }: RowReading,
  cells: readonly string[],
  record: ImportRecord,
  candidates: Candidates,
): ImportRow {
  const near = candidates.some(({ distanceMm }) => distanceMm === null || distanceMm <= NEAR_MM);
  const decided = record.decisions.find((each) => each.row === row);
  const decision: ImportDecision = {
    row,
    take: decided?.take ?? (finding !== null || problems.some(({ level }) => level !== 'note')),
    confirmed: decided?.confirmed ?? false,
    flaw: decided?.flaw ?? (near ? null : { kind: 'new' }),
  };
  const toConfirm = problems.some(({ level }) => level === 'hold' || level === 'check');
  return {
    row,
    cells: [...cells],
    corrected: record.corrections.filter((each) => each.row === row).map(({ column }) => column),
    finding,
    problems: [...problems],
    decision,
    ready: finding !== null && (!toConfirm || decision.confirmed) && decision.flaw !== null,
    candidates,
  };
}

const stopped = (row: ImportRow, message: string): ImportRow => ({
  ...row,
  ready: false,
  problems: [...row.problems, { row: row.row, field: null, original: '', level: 'stop', message }],
});

/** A row continues only a flaw of its own weld; a correction may have moved it to another. */
function refuseForeignFlaw(row: ImportRow): ImportRow {
  const { take, flaw } = row.decision;
  if (!take || !row.finding || flaw?.kind !== 'continues') return row;
  if (row.candidates.some(({ flawId }) => flawId === flaw.flawId)) return row;
  return stopped(
    row,
    `The chosen flaw does not lie in ${row.finding.locationName}. Choose one that does, or call this one new.`,
  );
}

/** Two rows of one file cannot both continue the same flaw. */
function refuseDoubleClaims(rows: readonly ImportRow[]): ImportRow[] {
  const claimed = new Map<string, number>();
  return rows.map((row) => {
    const target = row.decision.flaw;
    if (!row.decision.take || target?.kind !== 'continues') return row;
    const earlier = claimed.get(target.flawId);
    if (earlier === undefined) {
      claimed.set(target.flawId, row.row);
      return row;
    }
    return stopped(
      row,
      `Row ${earlier} continues the same flaw. Choose another, or call this one new.`,
    );
  });
}
