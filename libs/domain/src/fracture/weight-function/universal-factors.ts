/**
 * Coefficients of the universal weight function at the deepest point, m = 2/√(2π(a − x)) Σ Mi (1 − x/a)^(i/2),
 * from the coefficients of uniform and linear stress; Mi of i = 0 is 1 and of i = 2 is 3.
 * @param degree i: 0, 1, 2 or 3 [-]
 * @param g0 K/(σ√(πa)) of uniform stress, G0 [-]
 * @param g1 the same of the stress σ x/a, G1 [-]
 * @returns coefficient Mi [-]
 * @validity mode I, an edge or surface crack; the two reference stresses come out exactly
 * @source Glinka and Shen 1991, in closed form
 * @example deepestCoefficient(1, 1.1215, 0.6820) // -0.69255472
 */
export function deepestCoefficient(degree: 0 | 1 | 2 | 3, g0: number, g1: number): number {
  const k = Math.PI / Math.SQRT2;
  if (degree === 0) return 1;
  if (degree === 1) return 2 * k * (3 * g1 - g0) - 24 / 5;
  return degree === 2 ? 3 : 6 * k * (g0 - 2 * g1) + 8 / 5;
}

/**
 * Coefficients of the universal weight function at the face, m = 2/√(πx) Σ Ni (x/a)^(i/2), N0 = 1.
 * @param degree i: 0, 1, 2 or 3 [-]
 * @param g0 K/(σ√(πa)) of uniform stress at that point, G0 [-]
 * @param g1 the same of the stress σ x/a, G1 [-]
 * @returns coefficient Ni [-]
 * @validity mode I, the end of a surface crack; the two reference stresses come out exactly
 * @source Glinka and Shen 1991, in closed form
 * @example faceCoefficient(2, 0.7, 0.16) // 4.63274424
 */
export function faceCoefficient(degree: 0 | 1 | 2 | 3, g0: number, g1: number): number {
  const k = Math.PI;
  if (degree === 0) return 1;
  if (degree === 1) return 3 * k * (2 * g0 - 5 * g1) - 8;
  return degree === 2 ? 15 * k * (3 * g1 - g0) + 15 : 3 * k * (3 * g0 - 10 * g1) - 8;
}

/** Degree of a stress (x/a)ⁿ. */
export type PowerDegree = 0 | 1 | 2 | 3 | 4;

// B(n + 1, 1/2), n = 0…4; B(n + 1, 3/2) is that over 2n + 3
const BETA_HALF = [2, 4 / 3, 16 / 15, 32 / 35, 256 / 315] as const;

/**
 * Gn of the stress (x/a)ⁿ at the deepest point from G0 and G1: the weight function integrated in closed form
 * (Beta functions).
 * @param degree n of the stress [-]
 * @param g0 K/(σ√(πa)) of uniform stress, G0 [-]
 * @param g1 the same of the stress σ x/a, G1 [-]
 * @returns coefficient Gn in K = σ Gn √(πa) [-]
 * @validity n = 0…4; from exact G0 and G1 within 1.7 % for an edge crack in a strip of α ≥ 0.1, 2.1 % below
 * @source Glinka and Shen 1991, integrated
 * @example deepestPowerFactor(2, 1.12152, 0.68148) // 0.520283323
 */
export function deepestPowerFactor(degree: PowerDegree, g0: number, g1: number): number {
  const n = degree;
  const sum =
    BETA_HALF[n] * (1 + deepestCoefficient(2, g0, g1) / (2 * n + 3)) +
    (deepestCoefficient(1, g0, g1) + deepestCoefficient(3, g0, g1) / (n + 2)) / (n + 1);
  return (Math.SQRT2 / Math.PI) * sum;
}

/**
 * Gn of the stress (x/a)ⁿ at the face from G0 and G1 there: the weight function integrated in closed form.
 * @param degree n of the stress [-]
 * @param g0 K/(σ√(πa)) of uniform stress at that point, G0 [-]
 * @param g1 the same of the stress σ x/a, G1 [-]
 * @returns coefficient Gn in K = σ Gn √(πa) [-]
 * @validity n = 0…4
 * @source Glinka and Shen 1991, integrated
 * @example facePowerFactor(2, 0.7, 0.16) // 0.076411805
 */
export function facePowerFactor(degree: PowerDegree, g0: number, g1: number): number {
  const n = degree;
  const sum =
    1 / (n + 0.5) +
    faceCoefficient(1, g0, g1) / (n + 1) +
    faceCoefficient(2, g0, g1) / (n + 1.5) +
    faceCoefficient(3, g0, g1) / (n + 2);
  return (2 / Math.PI) * sum;
}
