/** A number as it stands in a sentence: four significant figures, thousands apart, no needless zeros. */
export function number(value: number): string {
  if (!Number.isFinite(value)) return String(value);
  const rounded = Number(value.toPrecision(4));
  const size = Math.abs(rounded);
  if (size !== 0 && (size < 1e-3 || size >= 1e9)) return rounded.toExponential();
  const [whole = '0', part] = String(rounded).split('.');
  const spaced = whole.replace(/\B(?=(\d{3})+(?!\d))/g, '\u202f');
  return part ? `${spaced}.${part}` : spaced;
}
