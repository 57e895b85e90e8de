/** Moves rows of text apart so that none covers another, keeping their order and, where it can be, their places. */
export function spreadLabels(
  wanted: readonly number[],
  apart: number,
  within: { readonly from: number; readonly to: number },
): number[] {
  const order = wanted.map((_, i) => i).sort((a, b) => (wanted[a] ?? 0) - (wanted[b] ?? 0));
  const rows = [...wanted];
  let least = within.from;
  for (const i of order) {
    rows[i] = Math.max(rows[i] ?? least, least);
    least = (rows[i] ?? least) + apart;
  }
  let most = Math.max(within.to, within.from + apart * (wanted.length - 1));
  for (const i of [...order].reverse()) {
    rows[i] = Math.min(rows[i] ?? most, most);
    most = (rows[i] ?? most) - apart;
  }
  return rows;
}
