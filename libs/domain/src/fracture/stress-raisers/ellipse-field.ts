import { complex, multiply, reciprocal, squareRoot, type Complex } from '../../numerics/complex';
import type { StressField } from '../stress-state';
import type { EllipticalHole } from './inglis';
import { remoteStress, type RemoteLoad } from './remote-load';

/**
 * Stress around an elliptical hole under any stress far away, from two potentials on the circle the
 * ellipse is mapped to, z = (A + B)/2 (ζ + m/ζ), m = (A − B)/(A + B). With u = 1/ζ², n = 1/(1 − m u),
 * P = σxx + σyy and D = σxx − σyy + 2iτ far away:
 * σxx + σyy = Re[(P − (2D − mP)u) n], σyy − σxx + 2iτ = 2(z̄Φ′ + Ψ), Φ′ = 2(D − mP)/(A + B) n³/ζ³,
 * Ψ = −½[D̄ + u(−h + (3D − mh)u − mDu²)n²] n, h = P(1 + m²) − mD.
 * A = B is the circular hole, B = 0 the crack along x, A = 0 the crack along y.
 * @param hole half axes A along x and B along y, centre at the origin [mm]
 * @param load stress far away, ratio, direction, pressure on the edge [MPa]
 * @returns function from a point [mm] to its stress [MPa]
 * @validity on and outside the edge, but not at the tip of a crack; plate wide against the hole; elastic; a crack must stay open
 * @source Inglis 1913; Muskhelishvili, Some Basic Problems of the Mathematical Theory of Elasticity (from memory)
 * @example ellipseField({ across: mm(2), along: mm(1) }, { stress: mpa(100), ratio: 0, angle: degrees(90), pressure: mpa(0) })(2, 0, { xx: 0, yy: 0, xy: 0 }).yy // 500
 */
export function ellipseField({ across, along }: EllipticalHole, load: RemoteLoad): StressField {
  const { pressure } = load;
  const far = remoteStress(load);
  // a pressure is the same as that tension far away, less that tension everywhere
  const sum = far.xx + far.yy + 2 * pressure;
  const d = complex(far.xx - far.yy, 2 * far.xy);
  const size = across + along;
  const m = (across - along) / size;
  const g = complex(2 * d.re - m * sum, 2 * d.im);
  const k = complex((2 * (d.re - m * sum)) / size, (2 * d.im) / size);
  const h = complex(sum * (1 + m * m) - m * d.re, -m * d.im);
  const l = complex(3 * d.re - m * h.re, 3 * d.im - m * h.im);
  const [v, u, n, n2, w, phi] = [complex(), complex(), complex(), complex(), complex(), complex()];
  return (x, y, into) => {
    inverseOnCircle(x, y, (across - along) * size, size, v);
    multiply(v, v, u);
    n.re = 1 - m * u.re;
    n.im = -m * u.im;
    reciprocal(n, n);
    multiply(n, n, n2);
    const total = (sum - times(g, u)) * n.re + (g.re * u.im + g.im * u.re) * n.im;
    multiply(multiply(multiply(k, u, phi), v, phi), multiply(n2, n, w), phi);
    // −h + u (l − m D u), then times u n²
    w.re = l.re - m * times(d, u);
    w.im = l.im - m * (d.re * u.im + d.im * u.re);
    multiply(w, u, w);
    w.re -= h.re;
    w.im -= h.im;
    multiply(multiply(w, u, w), n2, w);
    w.re += d.re;
    w.im -= d.im;
    multiply(w, n, w);
    const apart = 2 * (x * phi.re + y * phi.im) - w.re;
    into.xx = (total - apart) / 2 - pressure;
    into.yy = (total + apart) / 2 - pressure;
    into.xy = x * phi.im - y * phi.re - w.im / 2;
    return into;
  };
}

/** Writes 1/ζ: of the two points that map to z, the one on or outside the circle. */
function inverseOnCircle(x: number, y: number, focus: number, size: number, into: Complex): void {
  into.re = x * x - y * y - focus;
  into.im = 2 * x * y;
  squareRoot(into, into);
  const side = into.re * x + into.im * y < 0 ? -1 : 1;
  into.re = (x + side * into.re) / size;
  into.im = (y + side * into.im) / size;
  reciprocal(into, into);
}

const times = (a: Complex, b: Complex): number => a.re * b.re - a.im * b.im;
