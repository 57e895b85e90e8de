import type { LengthUnit } from './recognise-columns';

/** A number as the file gives it: value, what it is bounded by, and the unit in the cell. */
export interface NumberRead {
  readonly value: number;
  readonly qualifier: '=' | '<' | '>' | '~';
  readonly unit: LengthUnit | null;
}

export type NumberResult =
  | { readonly state: 'number'; readonly read: NumberRead }
  | { readonly state: 'missing' }
  | { readonly state: 'unreadable'; readonly why: string };

const MISSING = /^(|-+|–|—|n\/?a\.?|none|nil|\?+|tbd|k\.?\s?a\.?)$/i;
const UNITS: readonly (readonly [RegExp, LengthUnit])[] = [
  [/\s*mm$/i, 'mm'],
  [/\s*cm$/i, 'cm'],
  [/\s*mils?$/i, 'mil'],
  [/\s*(in|inch|inches|")$/i, 'in'],
  [/\s*m$/i, 'm'],
];
const QUALIFIERS: Readonly<Record<string, NumberRead['qualifier']>> = {
  '<': '<',
  '≤': '<',
  '>': '>',
  '≥': '>',
  '~': '~',
  '≈': '~',
};

/**
 * Reads one cell as a number; blanks and words for "no value" are missing, never 0. The decimal mark is decided once
 * for the whole file; a range gives its upper end, as the bounding one for a size.
 */
export function readNumber(cell: string, decimalMark: '.' | ','): NumberResult {
  let rest = cell.normalize('NFKC').trim();
  if (MISSING.test(rest)) return { state: 'missing' };
  const qualifier = QUALIFIERS[rest.charAt(0)] ?? '=';
  if (qualifier !== '=') rest = rest.slice(1).replace(/^=/, '').trim();
  const unit = UNITS.find(([pattern]) => pattern.test(rest));
  if (unit) rest = rest.replace(unit[0], '').trim();
  const range = /^(\d[\d.,]*)\s*(?:-|–|to|\.\.)\s*(\d[\d.,]*)$/.exec(rest);
  if (range) {
    const ends = [range[1], range[2]].map((end) =>
      asNumber(end ?? '', decimalMark, '<', unit?.[1] ?? null),
    );
    return ends.reduce((most, end) =>
      most.state === 'number' && end.state === 'number' && end.read.value <= most.read.value
        ? most
        : most.state === 'number'
          ? end
          : most,
    );
  }
  return asNumber(rest, decimalMark, qualifier, unit?.[1] ?? null);
}

/** Whether a cell such as `75,250` may be a decimal number or one with a thousands mark: 75.25 or 75250. */
export function mayBeThousands(cell: string, decimalMark: '.' | ','): boolean {
  const other = decimalMark === '.' ? ',' : '.';
  return new RegExp(`^\\D*[1-9]\\d{0,2}\\${other}\\d{3}\\D*$`).test(cell.trim());
}

function asNumber(
  digits: string,
  decimalMark: '.' | ',',
  qualifier: NumberRead['qualifier'],
  unit: LengthUnit | null,
): NumberResult {
  const other = decimalMark === '.' ? ',' : '.';
  const plain = digits.replaceAll(/[\s\u00a0\u202f']/g, '').replace('−', '-');
  const grouped = new RegExp(`^[+-]?\\d{1,3}(\\${other}\\d{3})+(\\${decimalMark}\\d+)?$`);
  if (plain.includes(other) && !grouped.test(plain)) {
    return {
      state: 'unreadable',
      why: `“${digits}” uses both marks, or a “${other}” that is not a thousands mark`,
    };
  }
  const normal = plain.replaceAll(other, '').replace(decimalMark, '.');
  if (!/^[+-]?(\d+(\.\d*)?|\.\d+)$/.test(normal))
    return { state: 'unreadable', why: `“${digits}” is not a number` };
  const value = Number(normal);
  return Number.isFinite(value) && Math.abs(value) < 1e9
    ? { state: 'number', read: { value, qualifier, unit } }
    : { state: 'unreadable', why: `“${digits}” is out of any range` };
}

/** Decimal mark of a file: a comma where commas stand between digits and never in the way of a decimal point. */
export function detectDecimalMark(cells: readonly string[]): {
  readonly mark: '.' | ',';
  /** Cells that speak for the comma and for the point. */
  readonly comma: number;
  readonly point: number;
} {
  const count = (...patterns: readonly RegExp[]) =>
    cells.filter((cell) => patterns.some((pattern) => pattern.test(cell.trim()))).length;
  const comma = count(
    /^[<>~≤≥]?\s*[+-]?(\d{1,3}(\.\d{3})+|\d+),\d{1,2}(\D|$)/,
    /^[+-]?\d{1,3}(\.\d{3})+,\d+$/,
  );
  const point = count(
    /^[<>~≤≥]?\s*[+-]?(\d{1,3}(,\d{3})+|\d+)\.\d{1,2}(\D|$)/,
    /^[+-]?\d{1,3}(,\d{3})+\.\d+$/,
  );
  return { mark: comma > point ? ',' : '.', comma, point };
}
