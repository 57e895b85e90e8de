import { legendreRule } from '../../numerics/gauss-legendre';

/** A stress along a line from a face, as a polynomial and in its linear part [MPa]. */
export interface WallFit {
  /** Mean over the line. */
  readonly membrane: number;
  /** Linear part with the same moment; positive when the face x = 0 is in tension. */
  readonly bending: number;
  /** σ(x) ≈ Σ cₙ (x/t)ⁿ, n = 0…4. */
  readonly coefficients: readonly [number, number, number, number, number];
  /** Largest distance between polynomial and stress along the line. */
  readonly largestDeviation: number;
}

// the nodes resolve a stress that falls within a twentieth of the line
const RULE = legendreRule(40);
const SAMPLES = 200;

// shifted Legendre polynomials in powers of x/t
const LEGENDRE: readonly (readonly number[])[] = [
  [1, 0, 0, 0, 0],
  [-1, 2, 0, 0, 0],
  [1, -6, 6, 0, 0],
  [-1, 12, -30, 20, 0],
  [1, -20, 90, -140, 70],
];

/**
 * Fit of a stress along a line by a polynomial of the fourth degree, least squares over the line: it keeps
 * the force and the moment of the stress exactly, so that its linear part is the linearised stress.
 * @param stressAt stress at a distance from the face, from [mm] to [MPa]
 * @param length length of the line, t [mm]
 * @returns membrane, bending, coefficients in x/t and largest deviation [MPa]
 * @validity smooth stress; look at the largest deviation before the polynomial is used
 * @source projection on Legendre polynomials; membrane (1/t)∫σ dx, bending (6/t²)∫σ(t/2 − x) dx
 * @example fitThroughWall((x) => 100 - 8 * x, 10).bending // 40
 */
export function fitThroughWall(stressAt: (x: number) => number, length: number): WallFit {
  const parts = [0, 1, 2, 3, 4].map((n) => (2 * n + 1) * projection(stressAt, length, n));
  const coefficient = (power: number) =>
    parts.reduce((sum, part, n) => sum + part * (LEGENDRE[n]?.[power] ?? 0), 0);
  const coefficients = [0, 1, 2, 3, 4].map(coefficient);
  const [c0 = 0, c1 = 0, c2 = 0, c3 = 0, c4 = 0] = coefficients;
  const at = (u: number) => c0 + u * (c1 + u * (c2 + u * (c3 + u * c4)));
  let largestDeviation = 0;
  for (let i = 0; i <= SAMPLES; i++) {
    const apart = Math.abs(at(i / SAMPLES) - stressAt((length * i) / SAMPLES));
    largestDeviation = Math.max(largestDeviation, apart);
  }
  return {
    membrane: parts[0] ?? 0,
    bending: -(parts[1] ?? 0),
    coefficients: [c0, c1, c2, c3, c4],
    largestDeviation,
  };
}

/** Mean over the line of the stress times the nth polynomial. */
function projection(stressAt: (x: number) => number, length: number, n: number): number {
  const [c0 = 0, c1 = 0, c2 = 0, c3 = 0, c4 = 0] = LEGENDRE[n] ?? [];
  return RULE.reduce((sum, { node, weight }) => {
    const u = (1 + node) / 2;
    const polynomial = c0 + u * (c1 + u * (c2 + u * (c3 + u * c4)));
    return sum + (weight / 2) * polynomial * stressAt(u * length);
  }, 0);
}
