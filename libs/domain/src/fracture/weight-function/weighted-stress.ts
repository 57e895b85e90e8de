import { legendreRule } from '../../numerics/gauss-legendre';

/** A stress over the crack's depth, x from the flawed face [mm] to the stress [MPa]. */
export type WallStressAt = (x: number) => number;

const RULE = legendreRule(32);

/** ∫₀¹ f dv. */
function unitIntegral(f: (v: number) => number): number {
  let sum = 0;
  for (const { node, weight } of RULE) sum += weight * f((node + 1) / 2);
  return sum / 2;
}

/**
 * K from any stress and a weight function m = 2/√(2π(a − x)) Σ Mi (1 − x/a)^(i/2): with x = a(1 − v²) nothing
 * singular is left, and Gauss's rule is exact for polynomials.
 * @param stress stress over the depth [MPa]
 * @param a crack depth, a [mm]
 * @param coefficients Mi, i = 0, 1, 2 … [-]
 * @returns stress intensity at the tip [MPa·√mm]; negative where the stress closes the crack
 * @validity a stress that is smooth over the depth
 * @source Bueckner 1970, Rice 1972: K = ∫ σ m dx
 * @example tipKOfStress((x) => 100, 4, [1, 0, 0, 0]) // 319.1538
 */
export function tipKOfStress(
  stress: WallStressAt,
  a: number,
  coefficients: readonly number[],
): number {
  const weighted = (v: number) => stress(a * (1 - v * v)) * powerSum(coefficients, v);
  return 4 * Math.sqrt(a / (2 * Math.PI)) * unitIntegral(weighted);
}

/**
 * K at the face from any stress and a weight function m = 2/√(πx) Σ Ni (x/a)^(i/2), with x = av².
 * @param stress stress over the depth [MPa]
 * @param a crack depth, a [mm]
 * @param coefficients Ni, i = 0, 1, 2 … [-]
 * @returns stress intensity at the end of the crack [MPa·√mm]; negative where the stress closes it
 * @validity a stress that is smooth over the depth
 * @source Glinka and Shen 1991: K = ∫ σ m dx
 * @example faceKOfStress((x) => 100, 4, [1, 0, 0, 0]) // 451.3517
 */
export function faceKOfStress(
  stress: WallStressAt,
  a: number,
  coefficients: readonly number[],
): number {
  const weighted = (v: number) => stress(a * v * v) * powerSum(coefficients, v);
  return 4 * Math.sqrt(a / Math.PI) * unitIntegral(weighted);
}

/**
 * K of a crack of length 2a in a large plate, the same pressure on both halves: m = 2/√(πa)/√(1 − (x/a)²), exact;
 * with x = a sin θ.
 * @param stress opening stress at the distance x from the middle [MPa]
 * @param a half length, a [mm]
 * @returns stress intensity of either tip [MPa·√mm]
 * @validity large plate, stress even about the middle and smooth
 * @source Tada, Paris and Irwin, The Stress Analysis of Cracks Handbook, from the point force
 * @example centreKOfStress((x) => 100, 4) // 354.4908
 */
export function centreKOfStress(stress: WallStressAt, a: number): number {
  const weighted = (v: number) => stress(a * Math.sin((Math.PI / 2) * v));
  return Math.sqrt(Math.PI * a) * unitIntegral(weighted);
}

function powerSum(coefficients: readonly number[], v: number): number {
  let sum = 0;
  for (let i = coefficients.length - 1; i >= 0; i--) sum = sum * v + (coefficients[i] ?? 0);
  return sum;
}
