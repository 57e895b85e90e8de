/** A cell of an exported table. */
export type Cell = string | number | null | undefined;

/** Rows as CSV (RFC 4180, with a heading row and a byte order mark, so that spreadsheets read the units right). */
export function csvText(headings: readonly string[], rows: readonly (readonly Cell[])[]): string {
  return (
    '\uFEFF' + [headings, ...rows].map((row) => row.map(csvCell).join(',')).join('\r\n') + '\r\n'
  );
}

function csvCell(cell: Cell): string {
  if (cell === null || cell === undefined) return '';
  if (typeof cell === 'number') return Number.isFinite(cell) ? String(cell) : '';
  // a spreadsheet would run a text that begins like a formula
  const text = /^[=+\-@\t\r]/.test(cell) ? `'${cell}` : cell;
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
