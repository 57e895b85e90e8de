import type { Degrees, MPa, Mm } from '../../units/quantity';
import type { RemoteLoad } from './remote-load';

/**
 * Peak factor of a circular hole in a wide plate: 3 − λ, at the ends of the diameter across the larger
 * stress. Independent of size and of the elastic constants.
 * @param ratio smaller over larger stress far away, λ [-]
 * @returns peak stress over the larger stress far away [-]
 * @validity −1 ≤ λ ≤ 1; plate wide against the hole
 * @source Kirsch 1898, exact
 * @example holePeakFactor(0.5) // 2.5
 */
export const holePeakFactor = (ratio: number): number => 3 - ratio;

/**
 * Stress along the edge of a circular hole: S[(1 + λ) − 2(1 − λ) cos 2(θ − β)] + P.
 * @param load stress far away S, ratio λ, direction β, pressure on the edge P [MPa]
 * @param theta where on the edge, from the x axis [°]
 * @returns stress along the edge [MPa]
 * @validity plate wide against the hole; elastic
 * @source Kirsch 1898, exact
 * @example holeEdgeStress({ stress: mpa(100), ratio: 0, angle: degrees(0), pressure: mpa(0) }, degrees(0)) // -100
 */
export function holeEdgeStress(load: RemoteLoad, theta: Degrees): MPa {
  const cosine = Math.cos(((theta - load.angle) * Math.PI) / 90);
  const around = 1 + load.ratio - 2 * (1 - load.ratio) * cosine;
  return (load.stress * around + load.pressure) as MPa;
}

/**
 * Stress across the ligament beside a circular hole, on the line across S:
 * S/2 [(1 + λ)(1 + q) + (1 − λ)(1 + 3q²)] + P q with q = (R/(R + x))².
 * @param radius radius of the hole, R [mm]
 * @param load stress far away S across the ligament, ratio λ, pressure on the edge P [MPa]
 * @param distance from the edge of the hole into the ligament, x [mm]
 * @returns stress across the ligament [MPa]
 * @validity x ≥ 0; plate wide against the hole; elastic
 * @source Kirsch 1898, exact
 * @example holeLigamentStress(mm(20), { stress: mpa(1), ratio: 1, angle: degrees(0), pressure: mpa(0) }, mm(1)) // 1.9070294785
 */
export function holeLigamentStress(
  radius: Mm,
  { stress, ratio, pressure }: RemoteLoad,
  distance: Mm,
): MPa {
  const q = (radius / (radius + distance)) ** 2;
  const across = (1 + ratio) * (1 + q) + (1 - ratio) * (1 + 3 * q * q);
  return ((stress / 2) * across + pressure * q) as MPa;
}

/**
 * Distance from the edge over which the excess of stress above that far away falls to a share of what it
 * is at the edge: 3(1 − λ)q² + (1 + λ)q = s(4 − 2λ), x = R(1/√q − 1).
 * @param radius radius of the hole, R [mm]
 * @param ratio smaller over larger stress far away, λ [-]
 * @param share of the excess that is left, s [-]
 * @returns decay length along the ligament [mm]
 * @validity −1 ≤ λ ≤ 1, 0 < s ≤ 1; no pressure on the edge
 * @source algebra of Kirsch's field, exact
 * @example holeDecayLength(mm(10), 1, 0.25) // 10
 */
export function holeDecayLength(radius: Mm, ratio: number, share: number): Mm {
  const right = share * (4 - 2 * ratio);
  const linear = 1 + ratio;
  const q = (2 * right) / (linear + Math.sqrt(linear * linear + 12 * (1 - ratio) * right));
  return (radius * (1 / Math.sqrt(q) - 1)) as Mm;
}

/**
 * Relative gradient of the stress at the edge, −σ′/σ = (7 − 5λ)/((3 − λ) R).
 * @param radius radius of the hole, R [mm]
 * @param ratio smaller over larger stress far away, λ [-]
 * @returns relative stress gradient at the edge [1/mm]
 * @validity −1 ≤ λ ≤ 1; no pressure on the edge
 * @source derivative of Kirsch's field, exact
 * @example holeGradient(mm(1), 0) // 2.3333333333
 */
export const holeGradient = (radius: Mm, ratio: number): number =>
  (7 - 5 * ratio) / ((3 - ratio) * radius);
