/** Ratio of two polynomials by Horner's rule, coefficients from the highest power down. */
export function polynomialRatio(
  x: number,
  numerator: readonly number[],
  denominator: readonly number[],
): number {
  let above = numerator[0] as number;
  for (let i = 1; i < numerator.length; i++) above = above * x + (numerator[i] as number);
  let below = denominator[0] as number;
  for (let i = 1; i < denominator.length; i++) below = below * x + (denominator[i] as number);
  return above / below;
}
