import type { Degrees, MPa, Mm } from '../../units/quantity';
import { remoteStress, type RemoteLoad } from './remote-load';

/** An elliptical hole: half axes along x and y [mm]. */
export interface EllipticalHole {
  /** Half axis along x, A: across a load along y [mm]. */
  readonly across: Mm;
  /** Half axis along y, B [mm]. */
  readonly along: Mm;
}

/**
 * Peak factor of an elliptical hole at the end of the axis across the load: 1 + 2A/B − λ.
 * @param across half axis across the load, A [mm]
 * @param along half axis along the load, B [mm]
 * @param ratio stress far away along A over that along B, λ [-]
 * @returns stress at the end of A over the stress far away along B [-]
 * @validity B > 0; plate wide against the hole; the other end may govern once λ exceeds (1 + A/B)/(1 + B/A)
 * @source Inglis 1913, exact
 * @example inglisFactor(mm(2), mm(1), 0) // 5
 */
export const inglisFactor = (across: Mm, along: Mm, ratio: number): number =>
  1 + (2 * across) / along - ratio;

/**
 * Peak factor of a notch by its depth and the radius of its bottom: 1 + 2√(A/ρ).
 * @param depth depth of an edge notch, or half axis of a hole, A [mm]
 * @param rootRadius radius at the bottom, ρ [mm]
 * @returns peak stress over the stress far away [-]
 * @validity exact for an elliptical hole, ρ = B²/A; an edge notch is up to 2 % higher at A = ρ and tends to 1.12 times when sharp
 * @source Inglis 1913
 * @example notchFactor(mm(4), mm(1)) // 5
 */
export const notchFactor = (depth: Mm, rootRadius: Mm): number =>
  1 + 2 * Math.sqrt(depth / rootRadius);

/**
 * Stress along the edge of an elliptical hole, at the point (A cos η, B sin η):
 * Re[(P − (2D − mP)e)/(1 − m e)] − p with e = exp(−2iη), m = (A − B)/(A + B).
 * @param hole half axes A and B [mm]
 * @param load stress far away, ratio, direction, pressure on the edge p [MPa]
 * @param eta parametric angle of the point, η [°]
 * @returns stress along the edge [MPa]
 * @validity A > 0, B > 0; plate wide against the hole; elastic
 * @source Inglis 1913; Muskhelishvili's potentials, exact
 * @example inglisEdgeStress({ across: mm(2), along: mm(1) }, { stress: mpa(100), ratio: 0, angle: degrees(90), pressure: mpa(0) }, degrees(0)) // 500
 */
export function inglisEdgeStress(hole: EllipticalHole, load: RemoteLoad, eta: Degrees): MPa {
  const { across, along } = hole;
  const m = (across - along) / (across + along);
  const { xx, yy, xy } = remoteStress(load);
  // a pressure is the same as that tension far away, less that tension everywhere
  const sum = xx + yy + 2 * load.pressure;
  const [gr, gi] = [2 * (xx - yy) - m * sum, 4 * xy];
  const cosine = Math.cos((eta * Math.PI) / 90);
  const sine = Math.sin((eta * Math.PI) / 90);
  const [nr, ni] = [sum - gr * cosine - gi * sine, gr * sine - gi * cosine];
  const [dr, di] = [1 - m * cosine, m * sine];
  return ((nr * dr + ni * di) / (dr * dr + di * di) - load.pressure) as MPa;
}
