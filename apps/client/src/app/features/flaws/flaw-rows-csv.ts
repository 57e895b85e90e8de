import type { FlawRow } from '@ligament/domain/contract/flaws';
import { csvText } from '../../shared/table/csv-text';

const HEADINGS = [
  'Flaw',
  'Unit',
  'Component',
  'Location',
  'Kind',
  'Face',
  'Mechanism',
  'Height [mm]',
  'Length [mm]',
  'Inspected on',
  'Verdict in force',
  'Remaining life [years]',
  'Inspect by',
  'Urgency',
  'State',
  'Open assessment',
] as const;

/** The list as it is shown, for a spreadsheet. */
export const flawRowsCsv = (rows: readonly FlawRow[]): string =>
  csvText(
    HEADINGS,
    rows.map((row) => [
      row.number,
      row.unitCode,
      row.tag,
      row.locationName,
      row.kind,
      row.face,
      row.mechanism,
      row.heightMm,
      row.lengthMm,
      row.inspectedOn,
      row.verdict ?? 'not assessed',
      row.lifeYears,
      row.dueOn,
      row.urgency,
      row.state,
      row.openAssessment,
    ]),
  );
