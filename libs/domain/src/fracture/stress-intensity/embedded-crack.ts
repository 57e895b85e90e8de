import { completeEllipticE } from '../../numerics/complete-elliptic';
import { legendreRule } from '../../numerics/gauss-legendre';
import type { Degrees, Mm, MPa, MPaSqrtMm } from '../../units/quantity';
import { angularFactor } from './shape-factor';

/**
 * Penny-shaped crack in an infinite body under tension: K = 2σ √(a/π).
 * @param stress tension far away, σ [MPa]
 * @param radius radius of the crack, a [mm]
 * @returns K [MPa·√mm]
 * @validity body large against the crack
 * @source Sneddon 1946, exact
 * @example pennyK(mpa(100), mm(5)) // 252.313252202
 */
export const pennyK = (stress: MPa, radius: Mm): MPaSqrtMm =>
  (2 * stress * Math.sqrt(radius / Math.PI)) as MPaSqrtMm;

const RULE = legendreRule(24);

/**
 * Penny-shaped crack opened by a stress that varies along its radius:
 * K = 2√(a/π) ∫₀^{π/2} p(a sin θ) sin θ dθ.
 * @param stressAt stress on the faces at a radius, p(r) [MPa]
 * @param radius radius of the crack, a [mm]
 * @returns K [MPa·√mm]
 * @validity body large against the crack; smooth stress, 24 Gauss points
 * @source Sneddon 1946, exact
 * @example pennyProfileK((r) => mpa(r * r), mm(1)) // 0.752252778064
 */
export function pennyProfileK(stressAt: (r: Mm) => MPa, radius: Mm): MPaSqrtMm {
  let sum = 0;
  for (const { node, weight } of RULE) {
    const sine = Math.sin((Math.PI / 4) * (node + 1));
    sum += weight * stressAt((radius * sine) as Mm) * sine;
  }
  return (2 * Math.sqrt(radius / Math.PI) * (Math.PI / 4) * sum) as MPaSqrtMm;
}

/**
 * Elliptical crack in an infinite body under tension: K = σ √(πa)/E(k) fφ for a ≤ c; the half axes change
 * places otherwise.
 * @param stress tension far away, σ [MPa]
 * @param a half height, a [mm]
 * @param c half length, c [mm]
 * @param angle parametric angle φ, 90 at the end of a [°]
 * @returns K [MPa·√mm]
 * @validity body large against the crack
 * @source Green and Sneddon 1950, Irwin 1962; exact
 * @example ellipseK(mpa(1), mm(1), mm(2), degrees(90)) // 1.46356057074
 */
export function ellipseK(stress: MPa, a: Mm, c: Mm, angle: Degrees): MPaSqrtMm {
  const slender = Math.min(a / c, c / a);
  const sine = Math.sin((angle * Math.PI) / 180);
  const shape = angularFactor(a, c, sine) / completeEllipticE(1 - slender * slender);
  return (stress * Math.sqrt(Math.PI * Math.min(a, c)) * shape) as MPaSqrtMm;
}
