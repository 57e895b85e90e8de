import type { Degrees, MPa, Mm } from '../../units/quantity';
import type { StressField } from '../stress-state';
import type { RemoteLoad } from './remote-load';

/** Stress at a point in the directions of its own radius [MPa]. */
export interface PolarStress {
  readonly radial: MPa;
  readonly tangential: MPa;
  readonly shear: MPa;
}

/**
 * Stress around a circular hole in a wide plate, in polar components: with q = (R/r)², mean and half
 * difference of the two stresses far away p = S(1 + λ)/2 and d = S(1 − λ)/2, ψ = θ − β,
 * σr = p(1 − q) + d(1 − 4q + 3q²) cos 2ψ − P q, σθ = p(1 + q) − d(1 + 3q²) cos 2ψ + P q,
 * τ = −d(1 + 2q − 3q²) sin 2ψ.
 * @param radius radius of the hole, R [mm]
 * @param load stress far away S, ratio λ, direction β, pressure on the edge P [MPa]
 * @param r distance from the centre [mm]
 * @param theta direction of the point, from the x axis [°]
 * @returns radial, tangential and shear stress [MPa]
 * @validity r ≥ R; plate wide against the hole; elastic
 * @source Kirsch 1898; biaxial by superposition; pressure by Lamé
 * @example kirschPolar(mm(10), { stress: mpa(100), ratio: 0, angle: degrees(0), pressure: mpa(0) }, mm(10), degrees(90)).tangential // 300
 */
export function kirschPolar(radius: Mm, load: RemoteLoad, r: Mm, theta: Degrees): PolarStress {
  const q = (radius / r) ** 2;
  const mean = (load.stress * (1 + load.ratio)) / 2;
  const half = (load.stress * (1 - load.ratio)) / 2;
  const twice = ((theta - load.angle) * Math.PI) / 90;
  const cosine = Math.cos(twice);
  return {
    radial: (mean * (1 - q) + half * (1 - 4 * q + 3 * q * q) * cosine - load.pressure * q) as MPa,
    tangential: (mean * (1 + q) - half * (1 + 3 * q * q) * cosine + load.pressure * q) as MPa,
    shear: (-half * (1 + 2 * q - 3 * q * q) * Math.sin(twice)) as MPa,
  };
}

/**
 * The same field in the axes of the plane, for maps: everything that does not change with the point is
 * worked out once.
 * @param radius radius of the hole, R, its centre at the origin [mm]
 * @param load stress far away S, ratio λ, direction β, pressure on the edge P [MPa]
 * @returns function from a point [mm] to its stress [MPa]
 * @validity r ≥ R; plate wide against the hole; elastic
 * @source Kirsch 1898
 * @example kirschField(mm(10), { stress: mpa(100), ratio: 0.5, angle: degrees(90), pressure: mpa(0) })(10, 0, { xx: 0, yy: 0, xy: 0 }).yy // 250
 */
export function kirschField(radius: Mm, load: RemoteLoad): StressField {
  const mean = (load.stress * (1 + load.ratio)) / 2;
  const half = (load.stress * (1 - load.ratio)) / 2;
  const dc = half * Math.cos((load.angle * Math.PI) / 90);
  const ds = half * Math.sin((load.angle * Math.PI) / 90);
  const { pressure } = load;
  const square = radius * radius;
  return (x, y, into) => {
    const r2 = x * x + y * y;
    const q = square / r2;
    const c2 = (x * x - y * y) / r2;
    const s2 = (2 * x * y) / r2;
    const along = dc * c2 + ds * s2;
    const pulled = (mean + pressure) * q;
    const radial = mean - pulled + (1 - 4 * q + 3 * q * q) * along;
    const tangential = mean + pulled - (1 + 3 * q * q) * along;
    const shear = -(1 + 2 * q - 3 * q * q) * (dc * s2 - ds * c2);
    const centre = (radial + tangential) / 2;
    const apart = (radial - tangential) / 2;
    into.xx = centre + apart * c2 - shear * s2;
    into.yy = centre - apart * c2 + shear * s2;
    into.xy = apart * s2 + shear * c2;
    return into;
  };
}
