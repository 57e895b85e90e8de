/**
 * The polynomial through points of different x, lowest degree first: Newton's divided differences, multiplied out.
 * One degree less than there are points.
 */
export function polynomialThrough(xs: readonly number[], ys: readonly number[]): readonly number[] {
  const differences = dividedDifferences(xs, ys);
  let powers: number[] = [];
  for (let i = xs.length - 1; i >= 0; i--) {
    const x = xs[i] ?? 0;
    const shifted = [0, ...powers];
    powers = shifted.map((p, k) => p - x * (powers[k] ?? 0));
    powers[0] = (powers[0] ?? 0) + (differences[i] ?? 0);
  }
  return powers;
}

function dividedDifferences(xs: readonly number[], ys: readonly number[]): readonly number[] {
  const found = [...ys];
  for (let order = 1; order < xs.length; order++) {
    for (let i = xs.length - 1; i >= order; i--) {
      const rise = (found[i] ?? 0) - (found[i - 1] ?? 0);
      found[i] = rise / ((xs[i] ?? 0) - (xs[i - order] ?? 0));
    }
  }
  return found;
}
