/** Ratio of two polynomials by Horner's rule, coefficients from the highest power down. */
export function polynomialRatio(
  x: number,
  numerator: readonly number[],
  denominator: readonly number[],
): number {
  return horner(x, numerator) / horner(x, denominator);
}

function horner(x: number, coefficients: readonly number[]): number {
  let sum = 0;
  for (const coefficient of coefficients) sum = sum * x + coefficient;
  return sum;
}
