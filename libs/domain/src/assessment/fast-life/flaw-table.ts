/** One surface flaw in a plate and the cycles that grow it; N and mm. */
export interface FatigueFlaw {
  readonly thicknessMm: number;
  /** Full width of the plate; Infinity when it is wide against the flaw. */
  readonly widthMm: number;
  readonly depthMm: number;
  readonly halfLengthMm: number;
  readonly membraneRangeMPa: number;
  /** Range of bending, above 0 where the flawed face is in tension. */
  readonly bendingRangeMPa: number;
  /** Range of K at which Kmax reaches the toughness, (1 − R) Kmat [MPa·√mm]. */
  readonly limitRangeMPaSqrtMm: number;
}

/** Many flaws, one list for each of their numbers. */
export type FlawTable = { readonly [K in keyof FatigueFlaw]: Float64Array };

export const FLAW_FIELDS = [
  'thicknessMm',
  'widthMm',
  'depthMm',
  'halfLengthMm',
  'membraneRangeMPa',
  'bendingRangeMPa',
  'limitRangeMPaSqrtMm',
] as const satisfies readonly (keyof FatigueFlaw)[];

/** A table with room for a number of flaws. */
export function flawTable(rows: number): FlawTable {
  const list = () => new Float64Array(rows);
  return {
    thicknessMm: list(),
    widthMm: list(),
    depthMm: list(),
    halfLengthMm: list(),
    membraneRangeMPa: list(),
    bendingRangeMPa: list(),
    limitRangeMPaSqrtMm: list(),
  };
}

/** Writes a flaw into a row of the table. */
export function putFlaw(table: FlawTable, row: number, flaw: FatigueFlaw): void {
  for (const field of FLAW_FIELDS) table[field][row] = flaw[field];
}

/** A table of given flaws. */
export function tableOf(flaws: readonly FatigueFlaw[]): FlawTable {
  const table = flawTable(flaws.length);
  flaws.forEach((flaw, row) => putFlaw(table, row, flaw));
  return table;
}
