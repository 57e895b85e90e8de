import { FINDING_FIELDS, type FieldName } from './finding-fields';

export const LENGTH_UNITS = ['mm', 'cm', 'm', 'in', 'mil'] as const;
export type LengthUnit = (typeof LENGTH_UNITS)[number];

/** A column of the file: where it stands, what it says, what it is taken for. */
export interface ColumnMeaning {
  readonly index: number;
  readonly header: string;
  readonly field: FieldName | null;
  /** Unit named in the header; null when it names none. */
  readonly unit: LengthUnit | null;
}

const UNIT_WORDS: Readonly<Record<string, LengthUnit>> = {
  mm: 'mm',
  millimetre: 'mm',
  millimeter: 'mm',
  cm: 'cm',
  m: 'm',
  in: 'in',
  inch: 'in',
  inches: 'in',
  '"': 'in',
  mil: 'mil',
  mils: 'mil',
};

/** What each header cell means; a second column of the same meaning is left open for the inspector to decide. */
export function recogniseColumns(headers: readonly string[]): ColumnMeaning[] {
  const taken = new Set<string>();
  return headers.map((header, index) => {
    const { words, unit } = splitUnit(header);
    const field = meaningOf(words);
    const free = field !== null && !taken.has(field);
    if (free) taken.add(field);
    return { index, header: header.trim(), field: free ? field : null, unit };
  });
}

/** What a header cell would mean if no other column were taken for it. */
export const meaningOfHeader = (header: string): FieldName | null =>
  meaningOf(splitUnit(header).words);

/** How many cells of a line look like header words; used to find the header row. */
export const headerScore = (cells: readonly string[]): number =>
  cells.filter((cell) => meaningOfHeader(cell) !== null).length;

function meaningOf(words: string): FieldName | null {
  if (words === '') return null;
  const found = FINDING_FIELDS.find(
    ({ field, synonyms }) =>
      field.toLowerCase() === words || (synonyms as readonly string[]).includes(words),
  );
  return found?.field ?? null;
}

/** Header words in plain form and the unit in them: `Tiefe [mm]` → tiefe, mm; `height_mm` → height, mm. */
function splitUnit(header: string): { words: string; unit: LengthUnit | null } {
  const plain = header
    .normalize('NFKD')
    .replaceAll(/[\u0300-\u036f]/g, '')
    .toLowerCase()
    .replaceAll(/[()[\]_/.:\-,]+/g, ' ')
    .replaceAll(/\s+/g, ' ')
    .trim();
  const parts = plain.split(' ');
  const last = parts.at(-1) ?? '';
  const unit =
    parts.length > 1 && Object.hasOwn(UNIT_WORDS, last) ? (UNIT_WORDS[last] ?? null) : null;
  return { words: unit ? parts.slice(0, -1).join(' ') : plain, unit };
}
