import { numberText } from '../quantity/quantity-text';
import type { Cell } from '../table/csv-text';

/** The numbers of a drawing as a table: for a screen reader, for a spreadsheet, for anybody who wants the figure itself. */
export interface TwinTable {
  readonly columns: readonly TwinColumn[];
  readonly rows: readonly (readonly Cell[])[];
}

export interface TwinColumn {
  readonly label: string;
  readonly unit?: string;
  /** Decimals on the screen; the exported file keeps every digit. */
  readonly digits?: number;
}

/** Heading of a column with its unit. */
export const headingOf = (column: TwinColumn): string =>
  column.unit ? `${column.label} [${column.unit}]` : column.label;

/** A cell as it stands on the screen. */
export function cellText(cell: Cell, digits = 2): string {
  if (cell === null || cell === undefined || cell === '') return '—';
  if (typeof cell === 'string') return cell;
  return Number.isFinite(cell) ? numberText(cell, digits) : '—';
}
